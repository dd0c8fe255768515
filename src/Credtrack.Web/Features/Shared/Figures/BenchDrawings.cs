using System.Globalization;
using System.Text;

namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>What the reading bench draws besides images: the place in the queue, and the strip over answers that are still closed.</summary>
public static class BenchDrawings
{
    private const int Most = 20, Box = 8, Apart = 9, Skin = 3;

    /// <summary>
    /// A box for each study, solid if it has been passed, the notch under the present one; at most 20, a window around it.
    /// The skin line stands where the queue begins; where the window cuts the queue off, a dotted line says so.
    /// </summary>
    /// <param name="position">The present study, from 1 to length.</param>
    /// <param name="length">Studies in the queue, 1 or more.</param>
    public static string Queue(int position, int length)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(position, 1);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(position, length);
        var shown = Math.Min(length, Most);
        var first = Math.Clamp(position - Most / 2, 1, length - shown + 1);
        var shapes = new StringBuilder();
        foreach (var study in Enumerable.Range(first, shown))
            shapes.Append(CultureInfo.InvariantCulture, $"<rect class=\"{(study < position ? "fig-solid" : "fig-track")}\" x=\"{Left(study)}\" y=\"3\" width=\"{Box}\" height=\"{Box}\"/>");
        shapes.Append(CultureInfo.InvariantCulture, $"<rect class=\"fig-rim\" x=\"{Left(position)}.5\" y=\"3.5\" width=\"7\" height=\"7\"/><path class=\"fig-notch\" d=\"M{Left(position) + Box / 2} 11l-5 7h10Z\"/>");
        shapes.Append(first == 1 ? "<rect class=\"fig-skin\" width=\"3\" height=\"18\"/>" : "<path class=\"fig-faint\" d=\"M1.5 0V18\"/>");
        var width = Skin + shown * Apart + 7;
        if (first + shown <= length) shapes.Append(CultureInfo.InvariantCulture, $"<path class=\"fig-faint\" d=\"M{width - 5}.5 0V18\"/>");
        return Svg.Hidden(width, 18, shapes.ToString());

        int Left(int study) => Skin + (study - first) * Apart;
    }

    /// <summary>A hatched strip under the skin line. Nothing lies under it: the answers are not in the page.</summary>
    public static string Closed() => Svg.Hidden(448, 15,
        $"<path class=\"fig-hatch\" d=\"{Svg.Hatch(.5, 3, 447, 11.5, 6)}\"/><path class=\"fig-rim\" d=\"M.5 3V14.5H447.5V3\"/><rect class=\"fig-skin\" width=\"448\" height=\"3\"/>");
}
