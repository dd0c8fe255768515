using System.Globalization;
using System.Text;
using System.Text.Encodings.Web;

namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>The few words of SVG that every figure is written with. One unit is one CSS pixel at a root of 16 px.</summary>
public static class Svg
{
    /// <summary>One decimal at most, the same on every machine; a tie goes to the even neighbour and minus nought is nought.</summary>
    public static string Number(double value) =>
        (Math.Round(value, 1, MidpointRounding.ToEven) + 0.0).ToString("0.#", CultureInfo.InvariantCulture);

    public static string Escape(string words) => HtmlEncoder.Default.Encode(words);

    /// <summary>A drawing that readers pass over, because its words stand beside it.</summary>
    public static string Hidden(double width, double height, string shapes, string? kind = null) =>
        $"<svg{(kind is null ? "" : $" class=\"{kind}\"")} viewBox=\"0 0 {Number(width)} {Number(height)}\" width=\"{Number(width)}\" height=\"{Number(height)}\" aria-hidden=\"true\">{shapes}</svg>";

    /// <summary>Strokes of 45 degrees cut to the rectangle, as the d of one path: no pattern, so no id, and right in print and in forced colours.</summary>
    public static string Hatch(double x, double y, double width, double height, double step = 5)
    {
        var strokes = new StringBuilder();
        for (var c = step / 2; c < width + height; c += step)
        {
            var (x1, y1) = c <= width ? (x + c, y) : (x + width, y + c - width);
            var (x2, y2) = c <= height ? (x, y + c) : (x + c - height, y + height);
            strokes.Append(CultureInfo.InvariantCulture, $"M{Number(x1)} {Number(y1)}L{Number(x2)} {Number(y2)}");
        }
        return strokes.ToString();
    }
}
