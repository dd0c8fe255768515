namespace Credtrack.Web.Tests.Features.Home;

public sealed class HomeTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_trainee_is_told_what_is_to_be_done()
    {
        var world = await site.NewWorld();
        await world.Draft();
        await world.Returned("The apical view.");
        await world.Waiting();
        using var trainee = await world.As(world.Trainee);
        Assert.Contains("1 scan was returned to you to mend. 1 draft waits for you to submit. 1 scan waits for a reading, and the nearest gap is 2 scans in Lung.", trainee.Text, StringComparison.Ordinal);
        Assert.Equal(["returned", "draft"], trainee.Page.QuerySelectorAll(".rows .state span").Select(s => s.TextContent));
    }

    [Fact]
    public async Task A_reader_is_told_how_many_wait_and_since_when()
    {
        var world = await site.NewWorld();
        await world.Waiting();
        using var reader = await world.As(world.Reader);
        Assert.Contains("1 scan waits for your reading, the oldest since Sun 1 Mar 2026.", reader.Text, StringComparison.Ordinal);
        Assert.NotNull(reader.Page.QuerySelector("main a[href='/readings']"));
    }

    [Theory]
    [InlineData(MembershipKind.Director)]
    [InlineData(MembershipKind.Coordinator)]
    public async Task Who_leads_a_programme_is_told_how_it_stands(MembershipKind kind)
    {
        var world = await site.NewWorld();
        await world.Waiting();
        using var leader = await world.As(await world.Another("Lee", kind));
        Assert.Contains($"{world.Programme.Name} has 1 trainee; 1 scan waits for a reading, the oldest since Sun 1 Mar 2026.", leader.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Who_is_in_no_programme_is_told_so()
    {
        var world = await site.NewWorld();
        using var nobody = await world.As(await world.Another("Nobody"));
        Assert.Contains("You are in no programme at present.", nobody.Text, StringComparison.Ordinal);
        Assert.Equal(HttpStatusCode.NotFound, (await nobody.Opens("/scans")).Status);
    }

    [Fact]
    public async Task Home_keeps_to_its_budget_of_queries()
    {
        var world = await site.NewWorld();
        for (var more = 0; more < 5; more++) await world.Returned();
        using var trainee = await world.As(world.Trainee);
        var asked = await site.Queries.During(() => trainee.Opens("/"));
        Assert.True(asked.Count <= 11, $"{asked.Count} queries:\n{string.Join("\n\n", asked)}");
    }
}
