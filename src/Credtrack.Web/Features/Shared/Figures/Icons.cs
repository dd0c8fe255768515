namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>The brand mark, the signs of notices, the probe on a file field and the drawing of an empty list. Each stands beside its words.</summary>
public static class Icons
{
    public static string Of(IconName name) => name switch
    {
        IconName.Brand => Svg.Hidden(24, 24,
            """<rect class="fig-skin" width="24" height="3"/><rect class="fig-solid" x="5" y="3" width="8" height="11"/>"""
            + $"""<path class="fig-hatch" d="{Svg.Hatch(5.5, 14, 7, 7, 3.5)}"/><path class="fig-rim" d="M5.5 14V21.5H12.5V14"/>"""
            + """<path class="fig-notch" d="M13 21L20 17V25Z" transform="translate(1 -4)"/>"""),
        IconName.Note => Svg.Hidden(20, 20, """<circle class="fig-mark" cx="10" cy="10" r="8.5"/><path class="fig-mark" d="M10 9V15M10 5.2V7"/>"""),
        IconName.Bad => Svg.Hidden(20, 20,
            """<path d="M10 2L19 18H1Z" fill="none" stroke="currentColor" stroke-width="1.75" stroke-linejoin="round"/><path d="M10 7.5V12.5M10 14.2V16" fill="none" stroke="currentColor" stroke-width="1.75"/>"""),
        IconName.Probe => Svg.Hidden(24, 24, """<path class="fig-mark" d="M9 4L4 20M15 4L20 20M9 4H15M4 20Q12 23 20 20M12 9V16M8.5 12.5H15.5"/>"""),
        IconName.Empty => Svg.Hidden(96, 56,
            """<rect class="fig-skin" width="96" height="3"/><path class="fig-faint" d="M20.5 3V52M40.5 3V52M60.5 3V52M80.5 3V52"/><path class="fig-notch open" d="M40 40l8 -5v10Z"/>"""),
        _ => throw new ArgumentOutOfRangeException(nameof(name), name, "There is no such icon."),
    };
}
