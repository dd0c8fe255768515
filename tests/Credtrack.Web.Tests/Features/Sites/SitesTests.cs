namespace Credtrack.Web.Tests.Features.Sites;

public sealed class SitesTests : IClassFixture<SitesTests.ItsOwnSite>
{
    private readonly ItsOwnSite site;

    public SitesTests(ItsOwnSite site) => this.site = site;

    // The one site of an installation is changed here, so these tests have one to themselves and go one after the other.
    public sealed class ItsOwnSite : RunningSite;

    [Fact]
    public async Task An_administrator_changes_what_holds_for_all_and_the_ledger_says_it()
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        await ada.Opens("/");
        await ada.Opens(ada.Page.QuerySelector("nav.sites a[href^='/sites/']")!.GetAttribute("href")!);
        Assert.Equal(("Test site", "Europe/Dublin", "7"), (ada.Typed("Name of the institution"), ada.Typed("Time zone"), ada.Typed("A reading is late after days")));
        var asked = await site.Queries.During(() => ada.Opens(ada.Url));
        Assert.Equal(4, asked.Count);
        await ada.Fills("Whom outsiders ask", "Credentialing office, 01 555 0100").Fills("A reading is late after days", "10").Presses("Save");
        Assert.Equal(HttpStatusCode.OK, ada.Status);
        Assert.Contains("changed the site: contact from none to Credentialing office, 01 555 0100; days until a reading is late from 7 to 10.", ada.Text, StringComparison.Ordinal);
        using var stranger = await site.Visitor().Opens("/documents/checks");
        Assert.Contains("Questions about what it says: Test site, Credentialing office, 01 555 0100.", stranger.Text, StringComparison.Ordinal);
        await ada.Fills("Whom outsiders ask", "").Fills("A reading is late after days", "7").Presses("Save");
        Assert.Null((await site.Ask(db => db.Sites.SingleAsync())).Contact);
    }

    [Theory]
    [InlineData("Name of the institution", "", "Give the site a name.")]
    [InlineData("A reading is late after days", "0", "Give a number of days from 1 to 90.")]
    [InlineData("A reading is late after days", "", "Give a number of days from 1 to 90.")]
    public async Task What_is_wrong_is_said_and_the_rest_stays_typed(string label, string value, string why)
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        await ada.Opens(await Address());
        await ada.Fills("Whom outsiders ask", "kept").Fills(label, value).Presses("Save");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, ada.Status);
        Assert.Equal([why], ada.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));
        Assert.Equal("kept", ada.Typed("Whom outsiders ask"));
        Assert.Null((await site.Ask(db => db.Sites.SingleAsync())).Contact);
    }

    [Fact]
    public async Task Of_two_at_once_the_second_sees_how_it_is_now_and_keeps_what_was_typed()
    {
        var world = await site.NewWorld();
        var person = await world.Administrator();
        using var one = await world.As(person);
        using var other = await world.As(person);
        foreach (var ada in new[] { one, other }) await ada.Opens(await Address());
        await one.Fills("A reading is late after days", "12").Presses("Save");
        await other.Fills("A reading is late after days", "13").Presses("Save");
        Assert.Equal(HttpStatusCode.Conflict, other.Status);
        Assert.Equal("13", other.Typed("A reading is late after days"));
        await other.Fills("A reading is late after days", "7").Presses("Save");
        Assert.Equal(7, (await site.Ask(db => db.Sites.SingleAsync())).LateAfterDays);
    }

    [Fact]
    public async Task Nobody_else_finds_it()
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        await ada.Opens(await Address());
        foreach (var person in new[] { world.Trainee, world.Reader, world.Director, await world.Coordinator() })
        {
            using var visitor = await world.As(person);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens(await Address())).Status);
            Assert.Null((await visitor.Opens("/")).Page.QuerySelector("nav.sites a[href^='/sites/']"));
        }
    }

    private async Task<string> Address() => $"/sites/{await site.Ask(db => db.Sites.Select(s => s.Id).SingleAsync())}/edit";
}
