using System.Globalization;
using System.Text.RegularExpressions;
using Credtrack.Web.Tests.Laws;

namespace Credtrack.Web.Tests.Features.Shared;

/// <summary>Contrast of the colours in the stylesheet itself: text by WCAG 2.2, 1.4.3 (4.5 to 1), marks and borders by 1.4.11 (3 to 1).</summary>
public sealed partial class ContrastTests
{
    private static readonly string Css = File.ReadAllText(Path.Combine(Sources.Root, "src/Credtrack.Web/wwwroot/credtrack.css"));
    private static readonly Dictionary<string, Dictionary<string, string>> Looks = ReadLooks();

    [Theory]
    [InlineData("ink", "paper", 4.5)]
    [InlineData("ink", "air", 4.5)]
    [InlineData("ink", "well", 4.5)]
    [InlineData("ink-2", "paper", 4.5)]
    [InlineData("ink-2", "air", 4.5)]
    [InlineData("ink-2", "well", 4.5)]
    [InlineData("accent", "paper", 4.5)]
    [InlineData("accent", "air", 4.5)]
    [InlineData("accent", "well", 4.5)]
    [InlineData("on-accent", "accent", 4.5)]
    [InlineData("paper", "ink", 4.5)]
    [InlineData("alert", "paper", 4.5)]
    [InlineData("alert", "air", 4.5)]
    [InlineData("edge", "paper", 3)]
    [InlineData("edge", "well", 3)]
    [InlineData("edge", "air", 3)]
    [InlineData("accent", "accent-well", 3)]
    [InlineData("focus", "paper", 3)]
    [InlineData("focus", "well", 3)]
    public void A_pair_of_colours_can_be_told_apart_in_every_look(string over, string ground, double needed) => Assert.All(Looks, look =>
        Assert.True(Contrast(look.Value[over], look.Value[ground]) >= needed, $"{over} on {ground}, {look.Key}: {Contrast(look.Value[over], look.Value[ground]):F2}"));

    [Fact]
    public void Browsers_without_light_dark_get_the_same_light_colours()
    {
        var fallback = Plain().Matches(Css[Css.IndexOf("@layer tokens {", StringComparison.Ordinal)..Css.IndexOf("@supports", StringComparison.Ordinal)]).ToDictionary(m => m.Groups[1].Value, m => m.Groups[2].Value);
        Assert.Equal(Looks["light"].OrderBy(t => t.Key), fallback.OrderBy(t => t.Key));
    }

    // The two ends and one grey of the scale: 21 is the definition's largest value; #767676 on white is 4.54, from memory.
    [Theory]
    [InlineData("#000000", "#ffffff", 21)]
    [InlineData("#767676", "#ffffff", 4.54)]
    [InlineData("#4b2a8f", "#4b2a8f", 1)]
    public void The_ratio_is_that_of_the_definition(string one, string other, double ratio) => Assert.Equal(ratio, Contrast(one, other), 0.005);

    private static Dictionary<string, Dictionary<string, string>> ReadLooks()
    {
        var pairs = Paired().Matches(Css);
        var bench = pairs.ToDictionary(m => m.Groups[1].Value, m => m.Groups[3].Value);
        foreach (Match token in Plain().Matches(Bench().Match(Css).Value)) bench[token.Groups[1].Value] = token.Groups[2].Value;
        return new()
        {
            ["light"] = pairs.ToDictionary(m => m.Groups[1].Value, m => m.Groups[2].Value),
            ["dark"] = pairs.ToDictionary(m => m.Groups[1].Value, m => m.Groups[3].Value),
            ["bench"] = bench,
        };
    }

    // WCAG 2.2, definitions of contrast ratio and of relative luminance.
    private static double Contrast(string one, string other)
    {
        var (a, b) = (Luminance(one), Luminance(other));
        return (Math.Max(a, b) + .05) / (Math.Min(a, b) + .05);
    }

    private static double Luminance(string colour) => .2126 * Linear(colour[1..3]) + .7152 * Linear(colour[3..5]) + .0722 * Linear(colour[5..7]);

    private static double Linear(string part)
    {
        var value = int.Parse(part, NumberStyles.HexNumber, CultureInfo.InvariantCulture) / 255.0;
        return value <= .04045 ? value / 12.92 : Math.Pow((value + .055) / 1.055, 2.4);
    }

    [GeneratedRegex(@"--([\w-]+):\s*light-dark\((#[0-9a-f]{6}), (#[0-9a-f]{6})\)")]
    private static partial Regex Paired();

    [GeneratedRegex(@"--([\w-]+):\s*(#[0-9a-f]{6})")]
    private static partial Regex Plain();

    [GeneratedRegex(@"\.look-bench \{[^}]*\}")]
    private static partial Regex Bench();
}
