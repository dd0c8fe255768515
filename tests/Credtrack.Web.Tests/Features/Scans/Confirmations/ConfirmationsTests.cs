using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Scans.Confirmations;

public sealed class ConfirmationsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_yes_from_home_makes_direct_supervision_count()
    {
        var world = await World.Build(site, OnlyDirect);
        var scan = await ReadByAnother(world);
        using var supervisor = await world.As(world.Reader);
        Assert.Contains("1 scan names you as direct supervisor.", supervisor.Text, StringComparison.Ordinal);
        Assert.Equal([$"{world.Trainee.Name}Focused cardiacSun 1 Mar 2026, 11:00"], supervisor.Page.QuerySelectorAll(".rows li > span").Select(s => s.TextContent));
        using var trainee = await world.As(world.Trainee);
        Assert.Contains("0 scans count", (await trainee.Opens("/standings")).Text, StringComparison.Ordinal);
        Assert.Equal("Not yet; until then it counts as read later", await Confirmed(trainee, scan));

        await Answers(supervisor, "Confirm");
        Assert.Contains("Supervision confirmed", supervisor.Text, StringComparison.Ordinal);
        Assert.DoesNotContain("names you as direct supervisor", supervisor.Text, StringComparison.Ordinal);
        Assert.Contains("1 scan counts", (await trainee.Opens("/standings")).Text, StringComparison.Ordinal);
        Assert.Equal("Yes", await Confirmed(trainee, scan));
        Assert.Contains($"{world.Reader.Name} confirmed having supervised this scan at the bedside.", trainee.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_no_lowers_it_and_the_history_says_so()
    {
        var world = await World.Build(site, OnlyDirect);
        var scan = await world.Waiting(world.Entry(supervisor: world.Reader));
        using var supervisor = await world.As(world.Reader);
        await Answers(supervisor, "I was not there");
        Assert.DoesNotContain("names you as direct supervisor", supervisor.Text, StringComparison.Ordinal);
        await world.With(scan, s => s.Read(world.Reader, world.Judgement() with { AtMost = Supervision.Direct }, world.Now));
        using var trainee = await world.As(world.Trainee);
        Assert.Contains("0 scans count", (await trainee.Opens("/standings")).Text, StringComparison.Ordinal);
        Assert.Equal("No: the person named was not there; it counts as read later", await Confirmed(trainee, scan));
        Assert.Contains($"{world.Reader.Name} said not to have been at the bedside", trainee.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_scan_that_a_no_leaves_without_a_reader_comes_back_to_its_trainee()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting(world.Entry(supervisor: world.Reader));
        await world.With(scan, s => s.TakeOut(world.Reader, s.Pictures[0], "A name can be read.", world.Now));
        using var supervisor = await world.As(world.Reader);
        Assert.Contains("1 scan waits for your reading", supervisor.Text, StringComparison.Ordinal);
        await Answers(supervisor, "I was not there");
        Assert.Contains("Nothing waits for your reading.", supervisor.Text, StringComparison.Ordinal);
        using var trainee = await world.As(world.Trainee);
        Assert.Contains("Attach a picture, or name who supervised at the bedside", trainee.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_second_of_two_answers_is_told_that_there_is_one()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting(world.Entry(supervisor: world.Reader));
        using var first = await world.As(world.Reader);
        using var second = await world.As(world.Reader);
        using var raced = await world.As(world.Reader);
        site.Rival.ActsBeforeNextSave(() => Answers(first, "Confirm"));
        await Answers(raced, "I was not there");
        Assert.Equal(HttpStatusCode.Conflict, raced.Status);
        await Answers(second, "I was not there");
        Assert.Equal(HttpStatusCode.Conflict, second.Status);
        Assert.Contains("You have answered for this scan already.", second.Text, StringComparison.Ordinal);
        Assert.True(Assert.Single((await site.Kept(scan.Id))!.Confirmations).WasThere);
    }

    [Fact]
    public async Task Nobody_answers_for_another()
    {
        var world = await site.NewWorld();
        var (scan, other) = (await world.Waiting(world.Entry(supervisor: world.Reader)), await world.Another("Rhea", MembershipKind.Reader));
        using var reader = await world.As(other);
        Assert.DoesNotContain("names you as direct supervisor", reader.Text, StringComparison.Ordinal);
        using var supervisor = await world.As(world.Reader);
        supervisor.Page.QuerySelector("form[action$=confirmations]")!.SetAttribute("action", $"/scans/{(await world.Waiting()).Id}/confirmations");
        await Answers(supervisor, "Confirm");
        Assert.Equal(HttpStatusCode.Conflict, supervisor.Status);
        Assert.Contains("Only the person named as direct supervisor answers for it.", supervisor.Text, StringComparison.Ordinal);
        foreach (var person in new[] { world.Trainee, world.Director })
        {
            using var visitor = await world.As(person);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Sends($"/scans/{scan.Id}/confirmations", new FormUrlEncodedContent([]))).Status);
        }
    }

    [Fact]
    public async Task The_list_is_short_and_asks_the_same_few_questions_however_many_there_are()
    {
        var world = await site.NewWorld();
        await world.Waiting(world.Entry(supervisor: world.Reader));
        using var supervisor = await world.As(world.Reader);
        var few = await site.Queries.During(() => supervisor.Opens("/"));
        for (var n = 0; n < 24; n++) await world.Waiting(world.Entry(supervisor: world.Reader, at: world.Now.AddHours(-2 - n)));
        var many = await site.Queries.During(() => supervisor.Opens("/"));
        Assert.Contains("25 scans name you as direct supervisor.", supervisor.Text, StringComparison.Ordinal);
        Assert.Equal(20, supervisor.Page.QuerySelectorAll("form[action$=confirmations]").Length);
        Assert.Equal(few.Count, many.Count);
        Assert.True(many.Count <= 6, $"{many.Count} queries:\n{string.Join("\n\n", many)}");
    }

    private static Task<Visitor> Answers(Visitor supervisor, string words) =>
        supervisor.Presses(supervisor.Page.QuerySelectorAll("form[action$=confirmations] button").OfType<AngleSharp.Html.Dom.IHtmlButtonElement>().First(b => b.TextContent.StartsWith(words, StringComparison.Ordinal)));

    private static async Task<string> Confirmed(Visitor visitor, Scan scan) => (await visitor.Opens($"/scans/{scan.Id}")).Page.QuerySelectorAll("dt").Single(t => t.TextContent == "Supervision confirmed").NextElementSibling!.TextContent;

    private static async Task<Scan> ReadByAnother(World world)
    {
        var (scan, other) = (await world.Waiting(world.Entry(supervisor: world.Reader)), await world.Another("Rhea", MembershipKind.Reader));
        return await world.With(scan, s => s.Read(other, world.Judgement() with { AtMost = Supervision.Direct }, world.Now));
    }

    private const string OnlyDirect = """
        {
          "format": "credtrack-rulebook/1", "name": "Supervised", "version": 1, "effective": "2026-01-01", "timeZone": "Europe/Dublin",
          "counting": { "supervision": ["direct"] },
          "applications": [{ "code": "cardiac", "require": [{ "kind": "count", "min": 3 }] }]
        }
        """;
}
