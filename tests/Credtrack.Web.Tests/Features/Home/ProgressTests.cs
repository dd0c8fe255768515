using Credtrack.Web.Tests.Features.Cohorts;
using Credtrack.Web.Tests.Features.Grants;

namespace Credtrack.Web.Tests.Features.Home;

public sealed class ProgressTests(RunningSite site) : IClassFixture<RunningSite>, IDisposable
{
    private readonly DateTimeOffset start = site.Clock.Now;

    public void Dispose() => site.Clock.Now = start;

    [Fact]
    public async Task A_director_proposes_for_who_is_ready_and_then_signs()
    {
        var world = await site.NewWorld();
        for (var n = 0; n < 3; n++) await world.Read();
        using var director = await world.As(world.Director);
        Assert.Contains("1 trainee is ready, in 1 application. Nobody has stalled.", director.Text, StringComparison.Ordinal);
        var scans = director.Page.QuerySelector("section[aria-labelledby=ready] a.line")!;
        Assert.Equal("3 of 3 count: Focused cardiac of " + world.Trainee.Name, Cohorting.Words(scans));
        await director.Opens(director.Page.QuerySelectorAll("main a").Single(a => a.TextContent.StartsWith("Propose a grant", StringComparison.Ordinal)).GetAttribute("href")!);
        await director.Presses("Propose it");
        await director.Opens("/");
        Assert.Contains("1 proposal waits for your signature. Nobody new is ready.", director.Text, StringComparison.Ordinal);
        Assert.Null(director.Page.QuerySelector("#ready"));
        var sign = director.Page.QuerySelector("section[aria-labelledby=sign] a.press")!.GetAttribute("href")!;
        Assert.Contains("1 proposal waits for your signature.", (await director.Opens("/grants")).Text, StringComparison.Ordinal);
        Assert.Contains("What exactly you sign", (await director.Opens(sign)).Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_coordinator_sees_who_is_ready_and_signs_nothing()
    {
        var world = await site.NewWorld();
        for (var n = 0; n < 3; n++) await world.Read();
        await world.Proposed(await world.Trainee("Tess", "year 3"));
        using var coordinator = await world.As(await world.Another("Cora", MembershipKind.Coordinator));
        Assert.Contains("1 trainee is ready, in 1 application.", coordinator.Text, StringComparison.Ordinal);
        Assert.Contains("1 proposed grant waits to be signed.", coordinator.Text, StringComparison.Ordinal);
        Assert.Null(coordinator.Page.QuerySelector("#sign"));
        Assert.All(coordinator.Page.QuerySelectorAll("section[aria-labelledby=ready] a"), a => Assert.StartsWith("/standings/", a.GetAttribute("href"), StringComparison.Ordinal));
    }

    [Fact]
    public async Task What_was_declined_or_ended_is_ready_again_and_what_stands_is_not()
    {
        var world = await site.NewWorld();
        for (var n = 0; n < 3; n++) await world.Read();
        await world.Declined();
        using var director = await world.As(world.Director);
        Assert.NotNull(director.Page.QuerySelector("#ready"));
        var (grant, _) = await world.Signed();
        Assert.Null((await director.Opens("/")).Page.QuerySelector("#ready"));
        await world.End(grant);
        Assert.NotNull((await director.Opens("/")).Page.QuerySelector("#ready"));
    }

    [Fact]
    public async Task Who_stalls_is_whom_the_cohort_sheet_says_and_the_trainees_are_as_many()
    {
        var world = await site.NewWorld();
        await world.Trainee("Stella", "year 1", first: new(2026, 1, 1));
        await world.Trainee("Sven", "year 2", first: new(2026, 1, 20));
        await world.Trainee("Lena", "year 2", new(2026, 1, 1), new(2026, 2, 10));
        await world.Waiting();
        await world.Waiting(world.Entry("lung"));
        using var director = await world.As(world.Director);
        Assert.Contains("2 trainees have stalled.", director.Text, StringComparison.Ordinal);
        var here = director.Stalled();
        var sheet = director.Page.QuerySelectorAll("main a").Single(a => a.TextContent == "3 trainees").GetAttribute("href")!;
        Assert.Equal(here, (await director.Opens(sheet)).Stalled());
        Assert.Equal(3, director.Names().Count);
        await director.Opens("/");
        await director.Opens(director.Page.QuerySelectorAll("main a").Single(a => a.TextContent == "2 scans").GetAttribute("href")!);
        Assert.Contains("2 of 2 shown.", director.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_changed_within_a_month_stands_beside_the_month_before()
    {
        var world = await site.NewWorld();
        for (var n = 0; n < 3; n++) await world.Read();
        await world.Waiting();
        await world.Draft();
        await world.Withdrawn(await world.Waiting());
        using var director = await world.As(world.Director);
        Assert.Equal(
        [
            "Scans submitted 4 0 4 more", "Readings given 3 0 3 more", "Applications newly met 1 0 1 more, by 1 trainee",
        ], Changed(director));
        Assert.Contains("Since Sun 1 Feb 2026", director.Text, StringComparison.Ordinal);
        site.Clock.Now = start.AddDays(40);
        using var later = await world.As(world.Director);
        Assert.Equal(["Scans submitted 0 4 4 fewer", "Readings given 0 3 3 fewer", "Applications newly met 0 1 1 fewer"], Changed(later));
    }

    [Fact]
    public async Task Overdue_readings_are_said_to_those_who_lead_and_to_the_reader()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        site.Clock.Now = start.AddDays(7).AddMinutes(-1);
        using (var intime = await world.As(world.Reader)) Assert.DoesNotContain("longer than 7 days", intime.Text, StringComparison.Ordinal);
        site.Clock.Now = start.AddDays(7).AddMinutes(1);
        await world.Waiting(world.Entry(at: world.Now.AddHours(-1)));
        using (var reader = await world.As(world.Reader)) Assert.Contains("2 scans wait for your reading, the oldest since Sun 1 Mar 2026. 1 has waited longer than 7 days.", reader.Text, StringComparison.Ordinal);
        using var coordinator = await world.As(await world.Another("Cora", MembershipKind.Coordinator));
        Assert.Contains("1 scan has waited longer than 7 days.", coordinator.Text, StringComparison.Ordinal);
        var line = Assert.Single(coordinator.Page.QuerySelectorAll("section[aria-labelledby=late] li"));
        Assert.Contains("Waits since Sun 1 Mar 2026", line.TextContent, StringComparison.Ordinal);
        Assert.Equal($"/scans/{scan.Id}", line.QuerySelector("a")!.GetAttribute("href"));
    }

    [Fact]
    public async Task A_leaders_home_asks_as_many_queries_for_many_as_for_few()
    {
        var world = await site.NewWorld();
        await world.Read();
        await world.Opened(await world.Read());
        await world.Proposed();
        using var director = await world.As(world.Director);
        var few = await site.Queries.During(() => director.Opens("/"));
        await world.Many(70);
        var many = await site.Queries.During(() => director.Opens("/"));
        Assert.Contains("71 trainees", director.Text, StringComparison.Ordinal);
        Assert.True(few.Count == many.Count && many.Count <= 22, $"{few.Count} and {many.Count} queries:\n{string.Join("\n\n", many)}");
    }

    private static IEnumerable<string> Changed(Visitor visitor) => visitor.Page.QuerySelectorAll("section[aria-labelledby=changed] tbody tr").Select(Cohorting.Words);
}
