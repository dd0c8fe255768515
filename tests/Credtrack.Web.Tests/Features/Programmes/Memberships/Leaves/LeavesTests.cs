namespace Credtrack.Web.Tests.Features.Programmes.Memberships.Leaves;

public sealed class LeavesTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_leave_is_noted_shown_and_told()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        var page = await world.MembershipOf(world.Trainee);
        await Notes("2026-04-01", "2026-04-14");
        Assert.Equal(page, cora.Url);
        Assert.Contains("Wed 1 Apr 2026 to Tue 14 Apr 2026", cora.Text, StringComparison.Ordinal);
        Assert.EndsWith("is away from " + world.Programme.Name + " from 2026-04-01 to 2026-04-14.", (await world.Facts(world.Trainee.Id))[^1], StringComparison.Ordinal);
        await Notes("2026-04-14", "2026-04-20");
        Assert.Equal([$"{world.Trainee.Name} is already away on some of these days."], cora.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));
        Assert.Equal("2026-04-20", cora.Typed("Last day away"));
        await Notes("", "2026-04-20");
        Assert.Equal(["Give the first day away."], cora.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));

        async Task Notes(string first, string last)
        {
            await cora.Opens($"{page}/leaves/new");
            await cora.Fills("First day away", first).Fills("Last day away", last).Presses("Note it");
        }
    }

    [Fact]
    public async Task Only_trainees_have_leaves_here()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        Assert.Equal(HttpStatusCode.NotFound, (await cora.Opens($"{await world.MembershipOf(world.Reader)}/leaves/new")).Status);
    }
}
