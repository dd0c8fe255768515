using Credtrack.Web.Plumbing;

namespace Credtrack.Web.Tests.Plumbing;

public sealed class VerbTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Theory]
    [InlineData(null, null, "button", "press main")]
    [InlineData(null, "", "button", "press")]
    [InlineData(null, "grave", "button", "press grave")]
    [InlineData("~/scans/new", null, "a", "press")]
    [InlineData("~/scans/new", "main", "a", "press main")]
    public void A_verb_is_a_button_or_a_link_with_its_look(string? href, string? look, string tag, string kind)
    {
        var verb = Tags.Written(new Verb { View = new Tags(site.Services, new Typed()).View, Href = href, Look = look }, "Go").Children.Single();
        Assert.Equal((tag, kind, href?[1..]), (verb.LocalName, verb.ClassName, verb.GetAttribute("href")));
    }

    [Fact]
    public void A_refused_verb_is_its_reason()
    {
        var verb = Tags.Written(new Verb { View = new Tags(site.Services, new Typed()).View, Href = "~/scans", WhyNot = "It is sealed." }, "Go").Children.Single();
        Assert.Equal(("p", "why-not note", "It is sealed.", null), (verb.LocalName, verb.ClassName, verb.TextContent, verb.GetAttribute("href")));
    }

    [Fact]
    public async Task The_open_place_is_marked_in_the_navigation()
    {
        var world = await site.NewWorld();
        using var trainee = await world.As(world.Trainee);
        foreach (var (url, current) in new[] { ("/scans", "page"), ($"/scans/{(await world.Draft()).Id}", "true"), ("/no/such/page", null) })
        {
            await trainee.Opens(url);
            Assert.Equal(current, trainee.Page.QuerySelector("nav.sites a[href='/scans']")!.GetAttribute("aria-current"));
        }
    }

    [Fact]
    public async Task The_stylesheet_is_asked_for_by_what_it_holds_and_finds_its_fonts()
    {
        using var stranger = site.Visitor();
        await stranger.Opens("/sign-in");
        var sheet = stranger.Page.QuerySelector("link[rel=stylesheet]")!.GetAttribute("href")!;
        Assert.Matches(@"^/credtrack\.\w+\.css$", sheet);
        Assert.Equal(HttpStatusCode.OK, (await stranger.Opens(sheet)).Status);
        await stranger.Opens("/fonts/atkinson-hyperlegible-next-latin-wght-normal.woff2");
        Assert.Equal((HttpStatusCode.OK, "font/woff2"), (stranger.Status, stranger.Response.Content.Headers.ContentType?.MediaType));
    }
}
