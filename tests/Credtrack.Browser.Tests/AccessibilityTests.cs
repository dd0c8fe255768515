using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;

namespace Credtrack.Browser.Tests;

/// <summary>Source of the rules: W3C, Web Content Accessibility Guidelines 2.0 to 2.2, levels A and AA, as axe-core checks them, and its own best practices.</summary>
public sealed class AccessibilityTests(Demonstration site)
{
    private static readonly AxeRunOptions Rules = new()
    {
        RunOnly = new() { Type = "tag", Values = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22a", "wcag22aa", "best-practice"] },
    };

    [Theory, MemberData(nameof(Place.Names), MemberType = typeof(Place))]
    public async Task Axe_finds_nothing_to_mend(string place)
    {
        await using var visitor = await Place.Reached(site, place);
        var found = new List<string>();
        foreach (var (width, scheme) in new[] { (390, ColorScheme.Light), (1280, ColorScheme.Dark) })
        {
            await visitor.Page.SetViewportSizeAsync(width, 900);
            await visitor.Page.EmulateMediaAsync(new() { ColorScheme = scheme });
            var answer = await visitor.Page.RunAxe(Rules);
            Assert.NotEmpty(answer.Passes);
            found.AddRange(from rule in answer.Violations from node in rule.Nodes select $"{width} {scheme} {rule.Id}: {node.Target} ({rule.Help})");
        }
        Assert.True(found.Count == 0, string.Join('\n', found));
    }
}
