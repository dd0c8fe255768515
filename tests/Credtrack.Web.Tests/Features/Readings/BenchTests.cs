using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Readings;

public sealed class BenchTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task The_oldest_submission_comes_first_and_later_leads_to_the_next()
    {
        var world = await site.NewWorld();
        var older = await world.Waiting();
        site.Clock.Now = site.Clock.Now.AddHours(1);
        var newer = await world.Waiting();
        using var reader = await world.As(world.Reader);
        await reader.Opens("/readings");
        Assert.Contains($"/scans/{older.Id}/", reader.Url, StringComparison.Ordinal);
        Assert.Contains("1 of 2;", reader.Page.QuerySelector(".bench-top")!.TextContent, StringComparison.Ordinal);
        await reader.Opens(reader.Page.GetElementById("later")!.GetAttribute("href")!);
        Assert.Contains($"/scans/{newer.Id}/", reader.Url, StringComparison.Ordinal);
        Assert.Contains("2 of 2;", reader.Page.QuerySelector(".bench-top")!.TextContent, StringComparison.Ordinal);
        Assert.Contains($"/scans/{older.Id}/", reader.Page.GetElementById("later")!.GetAttribute("href"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_empty_bench_says_what_will_be_here()
    {
        var world = await site.NewWorld();
        await world.Draft();
        await world.Returned();
        await world.Read();
        using var reader = await world.As(world.Reader);
        Assert.Contains("Nothing waits for you", (await reader.Opens("/readings")).Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Ones_own_scans_and_those_of_other_programmes_are_not_on_the_bench()
    {
        var world = await site.NewWorld();
        await (await site.NewWorld()).Waiting();
        var both = await world.Another("Bo", MembershipKind.Trainee, MembershipKind.Reader);
        await site.Ask(async db =>
        {
            var own = Scan.Log(both, world.Programme, Guid.CreateVersion7(world.Now), world.Entry(), null, world.Now);
            own.Attach(both, site.Still, world.Now);
            own.Submit(both, world.Now);
            db.Add(own);
            return await db.SaveChangesAsync();
        });
        using var reader = await world.As(both);
        Assert.Contains("Nothing waits for you", (await reader.Opens("/readings")).Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task After_a_reading_the_next_scan_is_ready_and_the_one_just_read_is_a_link_away()
    {
        var world = await site.NewWorld();
        var (read, next) = (await world.Read(), await world.Waiting());
        using var reader = await world.As(world.Reader);
        await reader.Opens($"/readings?read={read.Id}");
        Assert.Contains($"/scans/{next.Id}/", reader.Url, StringComparison.Ordinal);
        Assert.NotNull(reader.Page.QuerySelector($"a[href='/scans/{read.Id}']"));
    }

    [Fact]
    public async Task The_bench_keeps_to_its_budget_of_queries()
    {
        var world = await site.NewWorld();
        var first = await world.Waiting();
        for (var more = 0; more < 6; more++) await world.Waiting();
        using var reader = await world.As(world.Reader);
        var asked = await site.Queries.During(() => reader.Opens($"/scans/{first.Id}/readings/new"));
        Assert.True(asked.Count <= 5, $"{asked.Count} queries:\n{string.Join("\n\n", asked)}");
    }
}
