using Credtrack.Core.Catalogue;
using Credtrack.Web.Tests.Features.Scans;

namespace Credtrack.Web.Tests.Features.Applications;

public sealed class ApplicationsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task Every_member_reads_the_catalogue_and_finds_nothing_to_press()
    {
        var world = await site.NewWorld();
        using var trainee = await (await world.As(world.Trainee)).Opens("/applications");
        Assert.Contains("Abdominal aorta", trainee.Text, StringComparison.Ordinal);
        await trainee.Opens(trainee.Page.QuerySelectorAll("tbody a").Single(a => a.TextContent == "Lung").GetAttribute("href")!);
        Assert.Contains("Lung sliding seen on both sides?", trainee.Text, StringComparison.Ordinal);
        Assert.Equal(["No", "Yes", "Yes", "Yes"], trainee.Page.QuerySelectorAll("[aria-label='Questions, table'] td").Select(td => td.TextContent));
        Assert.Contains("Founder listed Lung (lung) in the catalogue.", trainee.Text, StringComparison.Ordinal);
        Assert.Empty(trainee.Page.QuerySelectorAll("main button, main a[href$='/edit']"));
    }

    [Theory]
    [InlineData(MembershipKind.Trainee)]
    [InlineData(MembershipKind.Reader)]
    [InlineData(MembershipKind.Director)]
    [InlineData(MembershipKind.Chair)]
    public async Task Nobody_but_a_coordinator_comes_to_the_forms(MembershipKind kind)
    {
        var world = await site.NewWorld();
        using var visitor = await world.As(await world.Another("Nadia", kind));
        var id = site.Applications["renal"].Id;
        foreach (var url in new[] { "/applications/new", $"/applications/{id}/edit" }) Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens(url)).Status);
        foreach (var url in new[] { "/applications", $"/applications/{id}", $"/applications/{id}/retirements", $"/applications/{id}/reinstatements" })
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Posts(url)).Status);
        Assert.Equal(site.Applications["renal"].Version, (await site.Listed("renal")).Version);
    }

    [Fact]
    public async Task A_coordinator_of_any_programme_adds_a_diagnostic_application()
    {
        var world = await site.NewWorld();
        using var coordinator = await (await world.AsCoordinator()).Opens("/applications");
        await coordinator.Opens(coordinator.Page.QuerySelector("a[href='/applications/new?kind=Diagnostic']")!.GetAttribute("href")!);
        await coordinator.FillsDiaphragm("diaphragm").Fills("View 2", "Dome").Fills("Need of view 2", "Optional").Fills("Part 1", "left").Presses(Cataloguing.Add);
        Assert.Contains("Added to the catalogue", coordinator.Text, StringComparison.Ordinal);
        Assert.Contains("listed Diaphragm diaphragm (diaphragm) in the catalogue.", coordinator.Text, StringComparison.Ordinal);
        var added = await site.Listed("diaphragm");
        Assert.Equal((ApplicationKind.Diagnostic, 20, 85, 5000, 12_500), (added.Kind, added.DepthFromMm, added.DepthToMm, added.FrequencyFromKhz, added.FrequencyToKhz));
        Assert.Equal([new("zone-of-apposition", "Zone of apposition", ViewNeed.Required), new("dome", "Dome", ViewNeed.Optional)], added.Views);
        Assert.Equal([new("thickening-normal", "Thickening normal?", Answer.No)], added.Questions);
        Assert.Equal(["left"], added.Subtypes);
    }

    [Fact]
    public async Task A_procedure_begins_with_its_target_and_its_questions_have_no_positive_answer()
    {
        var world = await site.NewWorld();
        using var coordinator = await (await world.AsCoordinator()).Opens("/applications/new?kind=Procedure");
        Assert.Equal("Target reached?", coordinator.Typed("Question 1"));
        Assert.Empty(coordinator.Page.QuerySelectorAll("[name$='.Positive']"));
        await coordinator.Fills("Code", "drain").Fills("Name", "Drain").Fills("Usual transducer", "linear").Fills("Depth from cm", "1").Fills("Depth to cm", "8").Fills("Frequency from MHz", "5").Fills("Frequency to MHz", "12")
            .Fills("View 1", "Pocket").Fills("Question 1", "").Fills("Question 2", "Bleeding?").Presses(Cataloguing.Add);
        Assert.Equal(["Say what is asked; this question cannot go."], coordinator.Faults());
        await coordinator.Fills("Question 1", "Is the drain in?").Presses(Cataloguing.Add);
        Assert.Equal((ApplicationKind.Procedure, "target-reached Is the drain in? ", "bleeding Bleeding? "), ((await site.Listed("drain")).Kind, Told(await site.Listed("drain"), 0), Told(await site.Listed("drain"), 1)));
    }

    [Fact]
    public async Task Whatever_is_wrong_is_named_at_its_field_and_nothing_typed_is_lost()
    {
        var world = await site.NewWorld();
        using var coordinator = await (await world.AsCoordinator()).Opens("/applications/new");
        await coordinator.Presses(Cataloguing.Add);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, coordinator.Status);
        Assert.Equal(Sorted(
            "Write the code in small letters, digits and single hyphens, such as arrest-echo, within 40 characters.", "Give the application a name.", "Name the usual transducer, such as: curved or linear.",
            "Give the depth in cm, a number such as 3 or 12.5.", "Give the depth in cm, a number such as 3 or 12.5.", "Give the frequency in MHz, a number such as 3 or 12.5.", "Give the frequency in MHz, a number such as 3 or 12.5.",
            "Name at least one view that is required, or a group of which one suffices.", "Ask at least one question that has a positive answer: it gives a scan its result."), coordinator.Faults().Order());

        await coordinator.FillsDiaphragm("lung").Fills("Name", "LUNG").Fills("Depth from cm", "deep").Fills("Frequency to MHz", "5").Fills("View 1", "").Fills("View 2", "Dome").Fills("Need of view 2", "OneOf")
            .Fills("Question 2", "thickening NORMAL?").Fills("Part 1", "Left side").Presses(Cataloguing.Add);
        Assert.Equal(Sorted(
            "Another application has this code; a retired one keeps its own too.", "Another application of the catalogue bears this name; choose another one.", "Give the depth in cm, a number such as 3 or 12.5.", "Give a frequency greater than the one it starts from.",
            "Name the group of which one view suffices, such as heart.", "This question is already there; ask each one once.", "Write the part in small letters, digits and single hyphens, such as long-bone, within 40 characters."), coordinator.Faults().Order());
        // The emptied row is gone, the one after it has moved up with all that was typed into it.
        Assert.Equal(("Dome", "OneOf", "deep", "No", "Left side"), (coordinator.Typed("View 1"), coordinator.Typed("Need of view 1"), coordinator.Typed("Depth from cm"), coordinator.Typed("Positive answer 1"), coordinator.Typed("Part 1")));
    }

    [Fact]
    public async Task More_rows_come_without_script_and_keep_what_was_typed()
    {
        var world = await site.NewWorld();
        using var coordinator = await (await world.AsCoordinator()).Opens("/applications/new");
        var rows = coordinator.Page.QuerySelectorAll("#views li").Length;
        await coordinator.Fills("View 2", "Dome").Fills("Depth to cm", "wrong").Presses("Add another view");
        Assert.Equal((HttpStatusCode.OK, rows + 2, 0), (coordinator.Status, coordinator.Page.QuerySelectorAll("#views li").Length, coordinator.Faults().Count));
        Assert.Equal(("", "Dome", "wrong"), (coordinator.Typed("View 1"), coordinator.Typed("View 2"), coordinator.Typed("Depth to cm")));
        rows = coordinator.Page.QuerySelectorAll("#questions li").Length;
        await coordinator.Presses("Add another question");
        Assert.Equal(rows + 1, coordinator.Page.QuerySelectorAll("#questions li").Length);
        await coordinator.Fills("Part 1", "left").Presses("Add another part");
        Assert.Equal("left", coordinator.Typed("Part 1"));
    }

    [Theory]
    [InlineData("twin-code", "another name")]
    [InlineData("another-code", "Diaphragm twin-name")]
    public async Task Of_two_who_add_the_same_at_once_the_later_is_told_and_keeps_what_was_typed(string code, string name)
    {
        var world = await site.NewWorld();
        var typed = code == "twin-code" ? "twin-code" : "twin-name";
        using var coordinator = await (await world.AsCoordinator()).Opens("/applications/new");
        var rival = await world.Another("Cem", MembershipKind.Coordinator);
        site.Rival.ActsBeforeNextSave(() => site.Ask(async db =>
        {
            db.Add(Application.Add(rival, code, ApplicationKind.Diagnostic, Cataloguing.EntryOf(site.Applications["lung"]) with { Name = name }, [], world.Now));
            return await db.SaveChangesAsync();
        }));
        await coordinator.FillsDiaphragm(typed).Presses(Cataloguing.Add);
        Assert.Equal((HttpStatusCode.Conflict, "Zone of apposition", $"Diaphragm {typed}"), (coordinator.Status, coordinator.Typed("View 1"), coordinator.Typed("Name")));
        await coordinator.Presses(Cataloguing.Add);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, coordinator.Status);
        Assert.Single(coordinator.Faults());
    }

    [Theory]
    [InlineData("/applications", 4)]
    [InlineData("/applications?page=2", 4)]
    [InlineData("/applications/{0}", 4)]
    [InlineData("/applications/new", 3)]
    [InlineData("/applications/{0}/edit", 4)]
    public async Task A_page_keeps_to_its_budget_of_queries(string url, int budget)
    {
        var world = await site.NewWorld();
        using var coordinator = await world.AsCoordinator();
        var asked = await site.Queries.During(() => coordinator.Opens(string.Format(null, url, site.Applications["efast"].Id)));
        Assert.Equal(HttpStatusCode.OK, coordinator.Status);
        Assert.True(asked.Count <= budget, $"{asked.Count} queries:\n{string.Join("\n\n", asked)}");
    }

    private static IEnumerable<string> Sorted(params IEnumerable<string> faults) => faults.Order();

    private static string Told(Application application, int n) => $"{application.Questions[n].Code} {application.Questions[n].Text} {application.Questions[n].Positive}";
}
