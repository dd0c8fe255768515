namespace Credtrack.Web.Tests.Features.Sessions;

public sealed class SessionsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_copied_cookie_is_worth_nothing_once_its_owner_has_signed_out()
    {
        var world = await site.NewWorld();
        using var reader = await world.As(world.Reader);
        using var thief = reader.Copied();
        Assert.Equal("/scans", (await thief.Opens("/scans")).Url);
        await reader.Opens("/");
        await reader.Presses("Sign out");
        Assert.StartsWith("/sign-in", (await thief.Opens("/scans")).Url, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_membership_that_has_ended_opens_nothing_at_the_next_request_also_with_a_copied_cookie()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var reader = await world.As(world.Reader);
        using var thief = reader.Copied();
        Assert.Equal(HttpStatusCode.OK, (await thief.Opens($"/scans/{scan.Id}")).Status);
        using var coordinator = await world.As(await world.Coordinator());
        await coordinator.Opens(await world.MembershipOf(world.Reader));
        await coordinator.Presses("End it now"); // it began today
        foreach (var url in new[] { $"/scans/{scan.Id}", "/scans", "/readings", $"/scans/{scan.Id}/readings/new", $"/scans/{scan.Id}/pictures/{scan.Pictures[0].Id}" })
        {
            Assert.Equal(HttpStatusCode.NotFound, (await reader.Opens(url)).Status);
            Assert.Equal(HttpStatusCode.NotFound, (await thief.Opens(url)).Status);
        }
    }

    [Fact]
    public async Task It_ends_by_itself_after_twelve_hours_however_busy()
    {
        var world = await site.NewWorld();
        using var reader = await world.As(world.Reader);
        var start = site.Clock.Now;
        for (var minutes = 45; minutes < 12 * 60; minutes += 45)
        {
            site.Clock.Now = start.AddMinutes(minutes);
            Assert.Equal("/sessions", (await reader.Opens("/sessions")).Url);
        }
        site.Clock.Now = start.AddHours(12);
        await reader.Opens("/sessions");
        site.Clock.Now = start;
        Assert.StartsWith("/sign-in", reader.Url, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Left_alone_for_an_hour_it_is_over()
    {
        var world = await site.NewWorld();
        using var reader = await world.As(world.Reader);
        var start = site.Clock.Now;
        site.Clock.Now = start.AddMinutes(61);
        await reader.Opens("/sessions");
        site.Clock.Now = start;
        Assert.StartsWith("/sign-in", reader.Url, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_page_lists_ones_own_in_few_questions()
    {
        var world = await site.NewWorld();
        using var reader = await world.As(world.Reader);
        using var director = await world.As(world.Director);
        for (var more = 0; more < 3; more++) (await world.As(world.Reader)).Dispose();
        var asked = await site.Queries.During(() => reader.Opens("/sessions"));
        Assert.Equal(4, asked.Count);
        Assert.Equal(4, reader.Page.QuerySelectorAll("ol.rows li").Length);
        Assert.Single(reader.Page.QuerySelectorAll("ol.rows li"), l => l.TextContent.Contains("This browser", StringComparison.Ordinal));
        Assert.Contains(World.AddressOf(world.Reader), reader.Text, StringComparison.Ordinal);
    }
}
