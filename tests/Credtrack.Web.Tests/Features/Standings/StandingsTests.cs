using AngleSharp.Dom;
using Credtrack.Core.Catalogue;
using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Standings;

public sealed class StandingsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_reading_moves_the_standing_by_one_and_every_scan_says_why_it_does_not_count()
    {
        var world = await site.NewWorld();
        var counts = await world.Read(4);
        var poor = await world.Read(2);
        var waiting = await world.Waiting();
        await world.Returned("The apical view.");
        await world.Draft();
        using var trainee = await world.As(world.Trainee);
        await trainee.Opens("/standings");
        Assert.Equal($"/standings/{world.Trainee.Id}", trainee.Url);
        Assert.Contains("0 of 2 applications are met. 1 scan counts, 2 wait for a reading, and the nearest gap is 2 scans in Focused cardiac.", trainee.Text, StringComparison.Ordinal);
        Assert.Equal("counts", Line(trainee, counts)[0]);
        Assert.Equal(("does not count", $"image quality below 3; read by {world.Reader.Name}, quality 2 of 5"), (Line(trainee, poor)[0], Line(trainee, poor)[1]));
        Assert.Equal("pending", Line(trainee, waiting)[0]);
        Assert.Contains("returned: The apical view.", trainee.Text, StringComparison.Ordinal);
        Assert.Equal(4, trainee.Page.QuerySelectorAll(".scans li").Length);

        await site.Ask(async db =>
        {
            (await db.Scans.SingleAsync(s => s.Id == waiting.Id)).Read(world.Reader, world.Judgement(4), world.Now);
            return await db.SaveChangesAsync();
        });
        Assert.Contains("2 scans count, 1 waits for a reading", (await trainee.Opens("/standings")).Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Any_day_can_be_chosen_and_says_that_it_is_as_known_today()
    {
        var world = await site.NewWorld();
        await world.Read(4, world.Entry(at: world.Now.AddDays(-40)));
        using var trainee = await world.As(world.Trainee);
        await trainee.Opens($"/standings/{world.Trainee.Id}?asOf=2026-02-01");
        Assert.Contains("0 scans count, 1 waits for a reading", trainee.Text, StringComparison.Ordinal);
        Assert.Contains("Sun 1 Feb 2026, as known today", trainee.Text, StringComparison.Ordinal);
        Assert.Contains("0 scans count, 0 wait", (await trainee.Opens($"/standings/{world.Trainee.Id}?asOf=2026-01-01")).Text, StringComparison.Ordinal);
        foreach (var odd in new[] { "0001-01-01", "9999-12-31", "nonsense", "" })
            Assert.Equal(HttpStatusCode.OK, (await trainee.Opens($"/standings/{world.Trainee.Id}?asOf={odd}")).Status);
    }

    [Fact]
    public async Task The_numbers_on_the_page_are_those_of_the_evaluator_and_open_into_their_scans()
    {
        var world = await World.Build(site, Conditions);
        for (var n = 0; n < 6; n++)
            await world.Read(3 + n % 2, world.Entry(at: world.Now.AddDays(-n)) with { Setting = n % 2 == 1 ? Setting.Education : Setting.Clinical, Answers = Finding(world, "cardiac") });
        await world.Waiting(world.Entry("lung"));
        await world.Waiting(world.Entry("lung", at: world.Now.AddDays(-3)));
        var evidence = (await site.Ask(db => db.EvidenceOf([world.Trainee.Id])))[world.Trainee.Id].ToList();
        var standing = Standing.Of(RulesReader.Read(Conditions, "UTC").Rules!, evidence, [], new DateOnly(2026, 3, 1));
        using var trainee = await world.As(world.Trainee);
        await trainee.Opens($"/standings/{world.Trainee.Id}");
        var rows = trainee.Page.QuerySelectorAll("table tbody tr").Select(r => r.Children.Select(c => string.Join(' ', c.TextContent.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries))).ToList()).ToList();
        foreach (var (application, row) in standing.Applications.Zip(rows))
            Assert.Equal([$"{application.Counted}", $"{application.Pending}", $"{application.Excluded.Values.Sum()}"], row[2..5]);
        Assert.Equal(["All together", "1", "0"], rows[2][..3]);
        Assert.Equal("at least 50 % positive: 0 % of 3, not met", rows[0][6]);
        var (cardiac, together) = (standing.Applications[0], standing.Overall.Requirements[0]);
        foreach (var link in trainee.Page.QuerySelectorAll("tbody td a").Select(a => (Number: a.TextContent, Url: a.GetAttribute("href")!)).ToList())
        {
            // A share opens into the scans that match, a number of applications into their scans that count; every other value is a number of scans.
            var behind = link.Number.EndsWith('%') ? $"{cardiac.Requirements[1].Behind.Count}" : link.Url.Contains("overall", StringComparison.Ordinal) ? $"{together.Behind.Count}" : link.Number;
            Assert.Equal(behind, $"{(await trainee.Opens(link.Url)).Page.QuerySelectorAll(".scans li").Length}");
        }
    }

    [Fact]
    public async Task A_standing_is_found_only_by_its_trainee_and_those_of_the_programme()
    {
        var world = await site.NewWorld();
        await world.Read();
        var other = await site.NewWorld();
        foreach (var person in new[] { other.Trainee, other.Reader, other.Director, await world.Another("Tess", MembershipKind.Trainee), await world.Another("Cho", MembershipKind.Chair) })
        {
            using var visitor = await world.As(person);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/standings/{world.Trainee.Id}")).Status);
        }
        foreach (var person in new[] { world.Reader, world.Director, await world.Another("Cora", MembershipKind.Coordinator) })
        {
            using var visitor = await world.As(person);
            Assert.Contains($"Standing of {world.Trainee.Name}", (await visitor.Opens($"/standings/{world.Trainee.Id}")).Text, StringComparison.Ordinal);
            Assert.Contains(world.Trainee.Name, (await visitor.Opens("/standings")).Text, StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task Of_scans_in_another_programme_only_the_counts_are_shown()
    {
        var (here, there) = (await site.NewWorld(), await site.NewWorld());
        await site.Ask(async db =>
        {
            var trainee = await db.People.Include(p => p.Memberships).SingleAsync(p => p.Id == there.Trainee.Id);
            trainee.Join(here.Director, await db.Programmes.SingleAsync(p => p.Id == here.Programme.Id), MembershipKind.Trainee, here.Now);
            return await db.SaveChangesAsync();
        });
        var elsewhere = await there.Read();
        using var director = await here.As(here.Director);
        await director.Opens($"/standings/{there.Trainee.Id}?programme={here.Programme.Id}");
        Assert.Contains("1 scan counts", director.Text, StringComparison.Ordinal);
        Assert.Contains("1 scan is in the number but not listed: logged in other programmes", director.Text, StringComparison.Ordinal);
        Assert.DoesNotContain(elsewhere.Id.ToString(), director.Page.DocumentElement.OuterHtml, StringComparison.Ordinal);
        Assert.DoesNotContain(there.Programme.Name, director.Text, StringComparison.Ordinal);
        Assert.Equal(HttpStatusCode.NotFound, (await director.Opens($"/scans/{elsewhere.Id}")).Status);
    }

    [Fact]
    public async Task The_stored_result_of_a_reading_is_what_its_answers_say()
    {
        var world = await site.NewWorld();
        await world.Read(4, world.Entry() with { Answers = Finding(world, "cardiac") });
        foreach (var scan in await site.Ask(db => db.Scans.AsNoTracking().Where(s => s.Readings.Any()).ToListAsync()))
            Assert.All(scan.Readings, r => Assert.Equal(Credtrack.Core.Readings.Comparison.Together(ApplicationKind.Diagnostic, scan.Answers, r.Answers), r.Result));
    }

    [Theory]
    [InlineData("/standings/{0}", 9)]
    [InlineData("/standings", 7)]
    public async Task A_page_keeps_to_its_budget_of_queries_however_much_there_is(string url, int budget)
    {
        var world = await site.NewWorld();
        for (var more = 0; more < 7; more++) await world.Read();
        await world.Another("Tess", MembershipKind.Trainee);
        using var director = await world.As(world.Director);
        var asked = await site.Queries.During(() => director.Opens(string.Format(null, url, world.Trainee.Id)));
        Assert.Equal(HttpStatusCode.OK, director.Status);
        Assert.True(asked.Count <= budget, $"{asked.Count} queries:\n{string.Join("\n\n", asked)}");
    }

    private static Dictionary<string, Answer> Finding(World world, string code) => world.Site.Applications[code].Questions.ToDictionary(q => q.Code, _ => Answer.Yes);

    private static string[] Line(Visitor visitor, Scan scan)
    {
        var line = visitor.Page.QuerySelector($".scans a[href='/scans/{scan.Id}']")!.Closest("li")!;
        return [line.QuerySelector(".state span")!.TextContent, line.QuerySelector(".why")!.TextContent];
    }

    private const string Conditions = """
        {
          "format": "credtrack-rulebook/1", "name": "Conditions", "version": 1, "effective": "2026-01-01", "timeZone": "Europe/Dublin", "introductory": 1,
          "applications": [
            { "code": "cardiac", "introductory": 0, "caps": [{ "where": { "setting": ["education"] }, "max": 0, "label": "no teaching" }], "require": [{ "kind": "count", "min": 1 }, { "kind": "share", "where": { "positive": true }, "min": 0.5 }] },
            { "code": "lung", "require": [{ "kind": "count", "min": 2 }] }
          ],
          "overall": [{ "kind": "applications", "min": 1, "meeting": "own" }]
        }
        """;
}
