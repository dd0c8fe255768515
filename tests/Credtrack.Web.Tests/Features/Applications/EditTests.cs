using Credtrack.Core.Catalogue;
using Credtrack.Web.Tests.Features.Scans;

namespace Credtrack.Web.Tests.Features.Applications;

public sealed class EditTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_changed_text_is_the_same_question_and_an_emptied_row_goes()
    {
        var world = await site.NewWorld();
        using var coordinator = await world.Edits("aorta");
        await coordinator.Fills("View 1", "Transverse, top").Fills("View 2", "").Fills("View 5", "Lengthwise").Fills("Need of view 5", "Required").Fills("View 6", "Transverse, middle").Fills("Need of view 6", "Optional")
            .Fills("Question 1", "Outer diameter 4 cm or more?").Fills("Question 2", "").Fills("Question 3", "Dissection flap?").Fills("Positive answer 3", "Yes")
            .Fills("Note", "").Fills("Depth to cm", "18").Fills("Part 1", "proximal").Presses(Cataloguing.Keep);
        Assert.Contains("Changes kept", coordinator.Text, StringComparison.Ordinal);
        Assert.Contains("changed the application: depth in mm from 80 to 160, now 80 to 180; another note; view “Transverse, middle” removed; view “Transverse, proximal” now “Transverse, top”, required; view “Long axis” now “Lengthwise”, required; "
            + "view “Transverse, middle” added, optional; question “Iliac artery 1.5 cm or more?” removed; question “Outer diameter 3 cm or more?” now “Outer diameter 4 cm or more?”, positive with yes; question “Dissection flap?” added, positive with yes; part proximal added.", coordinator.Text, StringComparison.Ordinal);
        var aorta = await site.Listed("aorta");
        // A view that was removed and added is another one.
        Assert.Equal(["trans-proximal", "trans-distal", "bifurcation", "long", "transverse-middle"], aorta.Views.Select(v => v.Code));
        Assert.Equal([new("wide", "Outer diameter 4 cm or more?", Answer.Yes), new("dissection-flap", "Dissection flap?", Answer.Yes)], aorta.Questions);
        Assert.Null(aorta.Note);
    }

    [Fact]
    public async Task A_new_text_does_not_come_by_the_code_of_what_was_removed()
    {
        var world = await site.NewWorld();
        using var coordinator = await world.Edits("bowel");
        var first = site.Applications["bowel"].Questions[0];
        await coordinator.Fills("Question 1", "").Fills($"Question {site.Applications["bowel"].Questions.Count + 1}", first.Code).Fills($"Positive answer {site.Applications["bowel"].Questions.Count + 1}", "Yes").Presses(Cataloguing.Keep);
        Assert.Equal($"{first.Code}-2", (await site.Listed("bowel")).Questions[^1].Code);
    }

    [Fact]
    public async Task A_form_sent_back_untouched_changes_nothing()
    {
        var world = await site.NewWorld();
        foreach (var code in new[] { "efast", "arrest-echo", "msk", "cvc" })
        {
            using var coordinator = await world.Edits(code);
            await coordinator.Presses(Cataloguing.Keep);
            Assert.Equal((HttpStatusCode.OK, $"/applications/{site.Applications[code].Id}"), (coordinator.Status, coordinator.Url));
            Assert.Equal(site.Applications[code].Version, (await site.Listed(code)).Version);
        }
    }

    [Fact]
    public async Task Of_two_changes_the_later_sees_how_it_is_now_and_keeps_what_was_typed()
    {
        var world = await site.NewWorld();
        using var slow = await world.Edits("biliary");
        using var fast = await world.Edits("biliary");
        await fast.Fills("Question 1", "Any stones?").Presses(Cataloguing.Keep);
        await slow.Fills("Question 2", "Wall of 5 mm or more?").Fills("Question 6", "Sludge?").Fills("Depth to cm", "17,5").Presses(Cataloguing.Keep);
        Assert.Equal(HttpStatusCode.Conflict, slow.Status);
        Assert.Contains("Someone else changed this while you had it open.", slow.Text, StringComparison.Ordinal);
        Assert.Contains("Any stones?", slow.Page.QuerySelector("[aria-labelledby=now]")!.TextContent, StringComparison.Ordinal);
        Assert.Equal(("Stones?", "Wall of 5 mm or more?", "Sludge?", "17,5"), (slow.Typed("Question 1"), slow.Typed("Question 2"), slow.Typed("Question 6"), slow.Typed("Depth to cm")));
        await slow.Presses(Cataloguing.Keep);
        Assert.Equal(("Stones?", "Wall of 5 mm or more?", "stones wall fluid murphy duct-wide sludge", 175), ((await site.Listed("biliary")).Questions[0].Text, (await site.Listed("biliary")).Questions[1].Text,
            string.Join(' ', (await site.Listed("biliary")).Questions.Select(q => q.Code)), (await site.Listed("biliary")).DepthToMm));
    }

    [Fact]
    public async Task What_was_retired_meanwhile_is_not_changed_and_what_was_typed_stays()
    {
        var world = await site.NewWorld();
        using var coordinator = await world.Edits("gastric");
        await world.Behind("gastric", (application, by) => application.Retire(by, world.Now));
        await coordinator.Fills("Name", "Stomach").Presses(Cataloguing.Keep);
        Assert.Equal((HttpStatusCode.Conflict, "Stomach"), (coordinator.Status, coordinator.Typed("Name")));
        Assert.Equal($"{site.Applications["gastric"].Name} is retired; bring it back before you change it.", coordinator.Page.QuerySelector(".why-not")!.TextContent);
        Assert.Equal(site.Applications["gastric"].Name, (await site.Listed("gastric")).Name);
    }

    [Fact]
    public async Task Markup_is_shown_as_it_was_written_and_turning_marks_are_refused()
    {
        var world = await site.NewWorld();
        const string markup = "<script>alert('x')</script> & \"quoted\" {{7*7}}";
        using var coordinator = await world.Edits("ocular");
        await coordinator.Fills("Question 1", $"{markup}?").Fills("View 1", markup).Fills("Note", "turned \u202e here").Presses(Cataloguing.Keep);
        Assert.Equal(["This text holds a character that cannot be seen (U+202E). Type it anew here instead of pasting it."], coordinator.Faults());
        await coordinator.Fills("Note", markup).Presses(Cataloguing.Keep);
        Assert.Equal(HttpStatusCode.OK, coordinator.Status);
        using var trainee = await world.As(world.Trainee);
        foreach (var url in new[] { $"/applications/{site.Applications["ocular"].Id}", "/scans/new?application=ocular" })
        {
            await trainee.Opens(url);
            Assert.Contains(markup, trainee.Text, StringComparison.Ordinal);
            Assert.Empty(trainee.Page.QuerySelectorAll("script:not([src])"));
        }
    }

    // The columns of lists hold 8000 characters, also those of the scan with the answers in them.
    [Theory]
    [InlineData("x")]
    [InlineData("\"")]
    [InlineData("Ж")]
    [InlineData("🫀")]
    public async Task The_largest_application_fits_whatever_it_is_written_in(string letter)
    {
        var world = await site.NewWorld();
        await world.Behind("testicular", (application, by) => application.Change(by, Largest(letter, site.Applications["testicular"]), [], world.Now));
        var testicular = await site.Listed("testicular");
        var scan = await world.Waiting(world.Entry() with { Application = testicular, ViewsShown = [.. testicular.Views.Select(v => v.Code)], Answers = testicular.Questions.ToDictionary(q => q.Code, _ => Answer.Unclear) });
        foreach (var (column, table, id) in new[] { ("Views", "Applications", testicular.Id), ("Questions", "Applications", testicular.Id), ("Views", "Scans", scan.Id), ("Answers", "Scans", scan.Id) })
        {
            var sql = $"SELECT {column} AS Value FROM {table} WHERE Id = {{0}}";
            Assert.InRange((await site.Ask(db => db.Database.SqlQueryRaw<string>(sql, id).SingleAsync())).Length, 1000, 8000);
        }
        Assert.Equal(testicular.Questions.Select(q => q.Text), (await site.Kept(scan.Id))!.Answers.Select(a => a.Text));
    }

    private static ApplicationEntry Largest(string letter, Application of) => Cataloguing.EntryOf(of) with
    {
        Views = [.. Enumerable.Range(10, ApplicationEntry.Most).Select(n => new View($"{new string('a', 38)}{n}", Long(letter, ApplicationEntry.LongestView, n), ViewNeed.OneOf, Long(letter, ApplicationEntry.LongestGroup, 10)))],
        Questions = [.. Enumerable.Range(10, ApplicationEntry.Most).Select(n => new Question($"{new string('a', 38)}{n}", Long(letter, ApplicationEntry.LongestQuestion, n), Answer.Yes))],
    };

    private static string Long(string letter, int length, int n) => n + string.Concat(Enumerable.Repeat(letter, (length - 2) / (letter.Length == 1 ? 1 : 12)));
}
