namespace Credtrack.Web.Tests.Features.Programmes.Memberships.Leaves.Withdrawals;

public sealed class WithdrawalsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_leave_is_taken_back_and_its_fact_stays()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"{await world.MembershipOf(world.Trainee)}/leaves/new");
        await cora.Fills("First day away", "2026-04-01").Fills("Last day away", "2026-04-14").Presses("Note it");
        await cora.Presses("Take it back");
        Assert.DoesNotContain("Wed 1 Apr 2026 to", cora.Text, StringComparison.Ordinal);
        Assert.EndsWith("took back that " + world.Trainee.Name + " is away from 2026-04-01 to 2026-04-14.", (await world.Facts(world.Trainee.Id))[^1], StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_coordinator_of_another_programme_finds_none()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"{await world.MembershipOf(world.Trainee)}/leaves/new");
        await cora.Fills("First day away", "2026-04-01").Fills("Last day away", "2026-04-14").Presses("Note it");
        var action = cora.Page.QuerySelector("form[action*='/leaves/']")!.GetAttribute("action")!;
        using var stranger = await other.As(await other.Coordinator());
        await stranger.Opens("/");
        stranger.Page.QuerySelector("form[action='/sign-out']")!.SetAttribute("action", action);
        Assert.Equal(HttpStatusCode.NotFound, (await stranger.Presses("Sign out")).Status);
    }
}
