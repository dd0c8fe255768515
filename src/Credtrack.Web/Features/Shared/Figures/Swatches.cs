namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>A swatch of 12 x 12 for each kind. It never stands without its word, so readers pass over it.</summary>
public static class Swatches
{
    private const string Faint = """<rect class="fig-faint" x=".5" y=".5" width="11" height="11"/>""";
    private static readonly string Hatched = $"""<path class="fig-hatch" d="{Svg.Hatch(.5, .5, 11, 11, 4)}"/><rect class="fig-rim" x=".5" y=".5" width="11" height="11"/>""";

    public static string Of(SwatchKind kind) => Svg.Hidden(12, 12, kind switch
    {
        SwatchKind.Solid => """<rect class="fig-solid" width="12" height="12"/>""",
        SwatchKind.Hatch => Hatched,
        SwatchKind.None => """<path class="fig-mark" d="M1.5 1.5h9v9h-9Z"/><path class="fig-mark" d="M2 10L10 2"/>""",
        SwatchKind.Draft => Faint,
        SwatchKind.Over => """<rect class="fig-over" x=".5" y=".5" width="11" height="11"/>""",
        SwatchKind.Track => """<rect class="fig-track" width="12" height="12"/>""",
        SwatchKind.Met => """<path class="fig-notch" d="M1 6L11 1V11Z"/>""",
        SwatchKind.Unmet => """<path class="fig-notch open" d="M1 6L11 1V11Z"/>""",
        SwatchKind.Stall => """<path class="fig-mark" d="M1 4H11M1 8.5H11"/>""",
        SwatchKind.Back => Hatched + """<path class="fig-mark" d="M6 12V1M2 5L6 1L10 5"/>""",
        SwatchKind.Gone => Faint + """<path class="fig-mark" d="M0 6H12"/>""",
        SwatchKind.Shadow => """<path class="fig-shadow" d="M6 0V12"/>""",
        SwatchKind.Ticks => """<path class="fig-tick" d="M2 1H10M6 4.5H10M6 8H10M2 11.5H10"/>""",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "There is no such swatch."),
    });
}
