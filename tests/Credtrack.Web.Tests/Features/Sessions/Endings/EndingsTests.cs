namespace Credtrack.Web.Tests.Features.Sessions.Endings;

public sealed class EndingsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task One_ends_a_sign_in_elsewhere_and_stays_here()
    {
        var world = await site.NewWorld();
        using var lost = await world.As(world.Reader);
        using var here = await world.As(world.Reader);
        await here.Opens("/sessions");
        await here.Presses("End it");
        Assert.Equal("/sessions", here.Url);
        Assert.Single(here.Page.QuerySelectorAll("ol.rows li"));
        Assert.StartsWith("/sign-in", (await lost.Opens("/scans")).Url, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Nobody_ends_anothers()
    {
        var world = await site.NewWorld();
        using var reader = await world.As(world.Reader);
        using var lost = await world.As(world.Director);
        using var director = await world.As(world.Director);
        await director.Opens("/sessions");
        var theirs = await site.Ask(db => db.Sessions.Where(s => s.AccountId == world.Reader.Id).Select(s => s.Id).SingleAsync());
        director.Page.QuerySelector("form[action*='endings']")!.SetAttribute("action", $"/sessions/{theirs}/endings");
        Assert.Equal(HttpStatusCode.NotFound, (await director.Presses("End it")).Status);
        Assert.Equal("/scans", (await reader.Opens("/scans")).Url);
    }
}
