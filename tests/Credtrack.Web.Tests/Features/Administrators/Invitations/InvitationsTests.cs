namespace Credtrack.Web.Tests.Features.Administrators.Invitations;

public sealed class InvitationsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task Another_administrator_sends_a_link_for_a_new_password_to_the_own_address()
    {
        var world = await site.NewWorld();
        var forgetful = await world.Administrator("Fergus");
        using var ada = await world.As(await world.Administrator());
        await ada.Opens("/administrators");
        await ada.Presses((AngleSharp.Html.Dom.IHtmlButtonElement)ada.Page.QuerySelector($"form[action='/administrators/{forgetful.Id}/invitations'] button")!);
        Assert.Equal("/administrators", ada.Url);
        using var again = site.Visitor();
        await again.Opens(Letters.LinkIn(Letters.AllTo(site, World.AddressOf(forgetful)).First()));
        await again.Chooses(Staffing.NewPassword);
        Assert.Equal("/sign-in", again.Url);
    }

    [Fact]
    public async Task Who_is_no_administrator_gets_none_and_makes_none()
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        using var director = await world.As(world.Director);
        foreach (var visitor in new[] { ada, director })
        {
            await visitor.Opens("/");
            visitor.Page.QuerySelector("form[action='/sign-out']")!.SetAttribute("action", $"/administrators/{world.Reader.Id}/invitations");
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Presses("Sign out")).Status);
        }
    }
}
