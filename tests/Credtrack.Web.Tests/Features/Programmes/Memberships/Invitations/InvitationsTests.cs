using Microsoft.AspNetCore.Hosting;

namespace Credtrack.Web.Tests.Features.Programmes.Memberships.Invitations;

public sealed class InvitationsTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string HandOver = "Shown to me once, to hand over", Way = "How the link to choose a password gets there";

    [Fact]
    public async Task A_new_password_goes_by_mail_to_the_persons_own_address()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"{await world.MembershipOf(world.Director)}/invitations/new");
        await cora.Presses("Make the link");
        Assert.Equal(await world.MembershipOf(world.Director), cora.Url);
        using var director = site.Visitor();
        var letter = Letters.To(site, World.AddressOf(world.Director));
        Assert.DoesNotContain(Letters.LinkIn(letter), cora.Page.DocumentElement.OuterHtml, StringComparison.Ordinal);
        await director.Opens(Letters.LinkIn(letter));
        await director.Chooses(Staffing.NewPassword);
        Assert.Equal("/", (await director.SignsInWith(World.AddressOf(world.Director), Staffing.NewPassword)).Url);
    }

    [Fact]
    public async Task A_coordinator_never_sees_a_link_with_which_to_become_somebody_who_signs()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"{await world.MembershipOf(world.Director)}/invitations/new");
        Assert.DoesNotContain(HandOver, cora.Text, StringComparison.Ordinal);
        cora.Page.QuerySelector("form.stack")!.InnerHtml += "<input type='hidden' name='Form.Delivery' value='Shown'>";
        await cora.Presses("Make the link");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, cora.Status);
        Assert.Contains("This person has a password already: a new link goes to their own address, or an administrator hands it over.", cora.Text, StringComparison.Ordinal);
        using var ada = await world.As(await world.Administrator());
        await ada.Opens($"{await world.MembershipOf(world.Director)}/invitations/new");
        await ada.Chooses(Way, HandOver).Presses("Make the link");
        Assert.NotNull(ada.Page.QuerySelector("code.key"));
    }

    [Fact]
    public async Task A_link_that_the_mail_server_does_not_take_is_shown_instead_of_lost()
    {
        using var cut = new CutOff();
        var world = await cut.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"{world.People()}/new");
        await cora.Fills("Name", "Tess").Fills("E-mail address", "tess@tests.example").Fills("Membership", "Trainee").Presses("Save and invite");
        using var tess = cut.Visitor();
        await tess.Opens(new Uri(cora.Page.QuerySelector("code.key")!.TextContent).PathAndQuery);
        Assert.Contains("For Tess", tess.Text, StringComparison.Ordinal);
    }

    // Nothing listens on the port of discarded packets.
    private sealed class CutOff : RunningSite
    {
        protected override void ConfigureWebHost(IWebHostBuilder builder)
        {
            base.ConfigureWebHost(builder);
            builder.UseSetting("Mail:Host", "127.0.0.1").UseSetting("Mail:Port", "9");
        }
    }
}
