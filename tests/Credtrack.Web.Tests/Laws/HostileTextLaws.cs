using System.Text.Json;
using System.Text.RegularExpressions;
using AngleSharp.Dom;
using AngleSharp.Html.Dom;

namespace Credtrack.Web.Tests.Laws;

/// <summary>
/// Every form that a person can come to is sent with texts that mean harm or break things. None may be our fault (500), and wherever such a text
/// comes out again it is text: nothing of it becomes a part of the page.
/// </summary>
public sealed partial class HostileTextLaws(RunningSite site) : IClassFixture<RunningSite>
{
    // The words are kept short enough for every field, so that they are saved and come out elsewhere.
    private const string Mark = "hostile";
    private const string Markup = "'\"><b hostile><img hostile src=x onerror=alert(1)></b><script hostile>1</script>";

    // The kinds that OWASP's cheat sheet on cross-site scripting lists (from memory), texts that databases and terminals trip over, and formulas.
    private static readonly string[] Texts =
    [
        Markup, "</textarea></title></style><svg hostile onload=alert(1)><a hostile href=javascript:alert(1)>a</a>", "&lt;b hostile&gt; {{7*7}}${7*7}@(7*7) '; DROP TABLE Scans; -- ..\\..\\etc %00%0d%0aSet-Cookie:hostile=1", "=cmd|' /C calc'!A0",
        "a\0b", "a\u001B[31mred", "evil\u202Etxt.exe", "\u2066hidden\u2069", "\uFFFD\uD83D", "😀 👩‍⚕️ ﷽ Z̸̧̛a̷͔l̵g̶o", "  ", new('x', 100_000),
    ];

    private readonly HashSet<string> sent = [];
    private int number;

    [Fact]
    public async Task Whatever_is_typed_anywhere_stays_text_everywhere()
    {
        var world = await site.NewWorld();
        await world.Draft();
        for (var n = 0; n < 3; n++) await world.Waiting(world.Entry(supervisor: n == 0 ? world.Reader : null));
        await world.Returned(Markup);
        for (var n = 0; n < 3; n++) await world.Read();
        await Features.Grants.Granting.Proposed(world);
        var people = new[] { world.Trainee, world.Reader, world.Director, await world.Coordinator(), await world.Administrator() };
        string[] texts = [.. Texts, .. Identifying()];
        foreach (var person in people) await Crawl(person, async (visitor, button) => await Send(visitor, button, texts));
        var shown = 0;
        foreach (var person in people) shown += await Crawl(person, (_, _) => Task.CompletedTask);
        Assert.True(sent.Count >= 25, $"forms sent: {string.Join('\n', sent)}");
        Assert.True(shown >= 15, $"hostile text came out as text on {shown} pages only");
    }

    [Fact]
    public async Task So_it_is_before_anybody_is_signed_in_and_where_a_password_is_chosen()
    {
        using var empty = new Commands.InviteTests.Empty();
        var printed = new StringWriter();
        await Web.Commands.Invite.Run(["--administrator"], printed, TextWriter.Null, empty.Services);
        var link = new Uri(printed.ToString().Split('\n').Single(line => line.Contains("http", StringComparison.Ordinal)).Trim()).PathAndQuery;
        using var stranger = empty.Visitor();
        foreach (var text in Texts.Concat(Identifying()))
        {
            await stranger.Opens("/sign-in");
            await stranger.Fills("E-mail address", text).Fills("Password", text).Presses("Sign in");
            Assert.True(IsPage(stranger) && !stranger.Url.Equals("/", StringComparison.Ordinal), text);
            Harmless(stranger);
            await stranger.Opens(link);
            if (stranger.Status == HttpStatusCode.Gone) break;
            await stranger.Fills("Name of the institution", text).Fills("Time zone", "Europe/Dublin").Fills("Your name", text).Fills("Your e-mail address", "ada@tests.example").Fills("Password", Staffing.NewPassword).Fills("The same password again", Staffing.NewPassword).Presses("Set up");
            Assert.True(IsPage(stranger), text);
            Harmless(stranger);
        }
        Assert.Contains(Markup, await empty.Ask(db => db.Sites.Select(s => s.Name).ToListAsync()), StringComparer.Ordinal); // the first of the texts is a name like another
        await stranger.SignsInWith("ada@tests.example", Staffing.NewPassword);
        Assert.True(Harmless(stranger));
    }

    /// <summary>What names a patient, as clinicians type it; invented examples, in a file of their own beside this one. A few together, as they fit into any field.</summary>
    private static string[] Identifying()
    {
        using var file = JsonDocument.Parse(File.ReadAllText(Path.Combine(Sources.Root, "tests/Credtrack.Web.Tests/Laws/phi-strings.json")));
        return [.. file.RootElement.GetProperty("pos").EnumerateArray().Select(pair => pair[0].GetString()!).Chunk(6).Select(few => string.Join("; ", few))];
    }

    /// <summary>Goes to every page that can be reached, the first few of each shape, and tells on how many of them hostile words stood.</summary>
    private async Task<int> Crawl(Person person, Func<Visitor, IHtmlButtonElement, Task> press)
    {
        using var visitor = site.Visitor();
        await visitor.SignsIn(person.Id);
        var (todo, seen, shapes, shown) = (new Queue<string>(["/"]), new HashSet<string>(), new Dictionary<string, int>(), 0);
        while (todo.TryDequeue(out var url))
        {
            if (!seen.Add(url) || (shapes[Shape(url)] = shapes.GetValueOrDefault(Shape(url)) + 1) > 3) continue;
            await visitor.Opens(url);
            if (!IsPage(visitor)) continue;
            if (Harmless(visitor)) shown++;
            foreach (var link in visitor.Page.QuerySelectorAll("[href], [src]").Select(e => e.GetAttribute("href") ?? e.GetAttribute("src")!).Where(l => l.StartsWith('/')).ToList()) todo.Enqueue(link);
            for (var n = 0; n < Buttons(visitor).Count; n++)
            {
                await press(visitor, Buttons(visitor)[n]);
                await visitor.Opens(url);
                if (!IsPage(visitor)) break;
            }
        }
        return shown;
    }

    private async Task Send(Visitor visitor, IHtmlButtonElement button, string[] texts)
    {
        var (url, form) = (visitor.Url, $"{Shape(button.Form!.Action)} {button.TextContent.Trim()}");
        var words = button.TextContent.Trim();
        if (!sent.Add(form)) return;
        var hasText = button.Form.QuerySelectorAll("textarea, input[type=text]").Length > 0;
        foreach (var text in hasText ? texts : texts[..1])
        {
            if (visitor.Status != HttpStatusCode.UnprocessableEntity) await visitor.Opens(url); // else the form is there again
            if (Buttons(visitor).FirstOrDefault(b => b.TextContent.Trim() == words && $"{Shape(b.Form!.Action)} {words}" == form) is not { } again) return;
            Fill(again.Form!, text);
            await visitor.Presses(again);
            Assert.True(visitor.Status is HttpStatusCode.OK or HttpStatusCode.Conflict or HttpStatusCode.UnprocessableEntity or HttpStatusCode.NotFound or HttpStatusCode.Gone or HttpStatusCode.RequestEntityTooLarge or HttpStatusCode.TooManyRequests, $"{form} with “{text[..Math.Min(40, text.Length)]}”: {visitor.Status}");
            if (IsPage(visitor)) Harmless(visitor);
        }
    }

    // All that a page asks for beside its texts is given, so that what is typed is saved where it may be.
    private void Fill(IHtmlFormElement form, string text)
    {
        foreach (var area in form.QuerySelectorAll<IHtmlTextAreaElement>("textarea")) area.Value = text;
        foreach (var select in form.QuerySelectorAll<IHtmlSelectElement>("select").Where(s => string.IsNullOrEmpty(s.Value))) select.Value = select.Options.Select(o => o.Value).FirstOrDefault(v => v.Length > 0) ?? "";
        foreach (var radios in form.QuerySelectorAll<IHtmlInputElement>("input[type=radio]").GroupBy(r => r.Name).Where(g => g.All(r => !r.IsChecked))) radios.First().IsChecked = true;
        foreach (var input in form.QuerySelectorAll<IHtmlInputElement>("input"))
        {
            if (input.Type == "checkbox") input.IsChecked = true;
            else if (input.Type == "password") input.Value = World.Password;
            else if (input.Type == "date" && string.IsNullOrEmpty(input.Value)) input.Value = "2026-03-02";
            else if (input.GetAttribute("inputmode") == "email") input.Value = $"h{number++}@tests.example";
            else if (input.GetAttribute("inputmode") is "decimal" or "numeric" || input.Type is "number" or "datetime-local") continue;
            else if (input.Type == "text") input.Value = text;
            else if (input.Type == "file" && input.GetAttribute("accept")?.Contains("image", StringComparison.Ordinal) == true) input.Files!.Add(new AttachedFile(Stills.Png(shade: 40)));
        }
    }

    /// <summary>Nothing of a text has become an element; true if hostile words stand on the page as words.</summary>
    private static bool Harmless(Visitor visitor)
    {
        var page = visitor.Page;
        Assert.True(page.QuerySelector($"[{Mark}]") is null, $"{visitor.Url}: {page.QuerySelector($"[{Mark}]")?.OuterHtml}");
        Assert.True(page.QuerySelectorAll("script:not([src]), [onerror], [onload], [style], a[href^='javascript']").Length == 0, $"{visitor.Url}: something that runs");
        Assert.False(visitor.Response.Headers.TryGetValues("Set-Cookie", out var cookies) && cookies.Any(c => c.StartsWith(Mark, StringComparison.Ordinal)));
        return page.Body!.TextContent.Contains($"<b {Mark}>", StringComparison.Ordinal);
    }

    private static bool IsPage(Visitor visitor)
    {
        Assert.True((int)visitor.Status < 500, $"{visitor.Url}: {visitor.Status}");
        return visitor.Response.Content.Headers.ContentType?.MediaType == "text/html" && visitor.Page.QuerySelector("main") is not null;
    }

    private static List<IHtmlButtonElement> Buttons(Visitor visitor) =>
        [.. visitor.Page.QuerySelectorAll("button").OfType<IHtmlButtonElement>().Where(b => b.Form is not null && b.TextContent.Trim() is not ("Sign out" or "End it") && !b.Form.Action.Contains("/passwords", StringComparison.Ordinal))];

    private static string Shape(string url) => Values().Replace(Ids().Replace(new Uri(new Uri("http://site"), url).PathAndQuery, "{id}"), "=…");

    [GeneratedRegex("[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}")]
    private static partial Regex Ids();

    [GeneratedRegex("=[^&#]*")]
    private static partial Regex Values();
}
