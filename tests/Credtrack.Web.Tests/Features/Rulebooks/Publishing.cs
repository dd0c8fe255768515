namespace Credtrack.Web.Tests.Features.Rulebooks;

/// <summary>How a director or coordinator goes about the next version.</summary>
internal static class Publishing
{
    public const string Text = "Rulebook as JSON", Look = "Look at what it says", File = "JSON file";

    public static readonly string Stricter = World.TestRules.Replace("\"min\": 3 }]", "\"min\": 5 }]", StringComparison.Ordinal);

    public static async Task<Visitor> WritesTheNextVersion(this World world, Person by) => await (await world.As(by)).Opens($"/rulebooks/new?programme={world.Programme.Id}");

    /// <summary>What the summary says; each line leads to a field of the page.</summary>
    public static IReadOnlyList<string> Told(this Visitor visitor)
    {
        var lines = visitor.Page.QuerySelectorAll(".notice.bad li").ToList();
        Assert.All(lines, line => Assert.NotNull(visitor.Page.QuerySelector(line.QuerySelector("a")!.GetAttribute("href")!)));
        return [.. lines.Select(l => l.TextContent)];
    }

    public static Task<string[]> TextsOf(this World world) =>
        world.Site.Ask(db => db.Rulebooks.Where(r => r.ProgrammeId == world.Programme.Id).OrderBy(r => r.Edition).Select(r => r.Text).ToArrayAsync());
}
