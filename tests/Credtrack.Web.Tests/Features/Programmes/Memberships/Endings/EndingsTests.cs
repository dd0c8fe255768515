namespace Credtrack.Web.Tests.Features.Programmes.Memberships.Endings;

public sealed class EndingsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task One_button_ends_a_membership_of_today_at_once()
    {
        var world = await site.NewWorld();
        var person = await world.Coordinator();
        using var cora = await world.As(person);
        await cora.Opens(await world.MembershipOf(world.Reader));
        await cora.Presses("End it now");
        Assert.Contains("ended on that day. It is over.", cora.Text, StringComparison.Ordinal);
        Assert.Contains($"{person.Name} ended at once that {world.Reader.Name} is a Reader of {world.Programme.Name}.", cora.Text, StringComparison.Ordinal);
        using var reader = await world.As(world.Reader);
        Assert.Equal(HttpStatusCode.NotFound, (await reader.Opens("/readings")).Status);
    }

    [Fact]
    public async Task The_last_coordinator_who_can_sign_in_stays_and_others_find_no_button()
    {
        var world = await site.NewWorld();
        var person = await world.Coordinator();
        var invited = await world.Another("Ina", MembershipKind.Coordinator);
        await site.Ask(async db =>
        {
            (await db.Users.SingleAsync(a => a.Id == invited.Id)).PasswordHash = null;
            return await db.SaveChangesAsync();
        });
        using var ada = await world.As(await world.Administrator());
        await ada.Opens(await world.MembershipOf(person));
        Assert.Contains("The last coordinator stays: make somebody else one first, who has chosen a password.", ada.Text, StringComparison.Ordinal);
        using var director = await world.As(world.Director);
        await director.Opens(await world.MembershipOf(world.Reader));
        Assert.Empty(director.Page.QuerySelectorAll("form[action$='/endings']"));
        director.Page.QuerySelector("form[action='/sign-out']")!.SetAttribute("action", $"{await world.MembershipOf(world.Reader)}/endings");
        Assert.Equal(HttpStatusCode.Conflict, (await director.Presses("Sign out")).Status);
    }
}
