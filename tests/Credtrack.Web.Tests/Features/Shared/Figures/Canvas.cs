using System.Globalization;
using System.Text.RegularExpressions;
using System.Xml.Linq;

namespace Credtrack.Web.Tests.Features.Shared.Figures;

/// <summary>A drawing read back: its size, and every place that a rectangle, a path or a word reaches.</summary>
internal sealed partial class Canvas
{
    // Digits of 13 px, weight 500, in the shipped font: 8.22 px wide and 9 px high, measured in Chromium.
    private const double Digit = 8.22, Tall = 9;

    private Canvas(XElement svg)
    {
        var box = Numbers((string)svg.Attribute("viewBox")!);
        (Width, Height, Places) = (box[2], box[3], [.. svg.Descendants().SelectMany(Reached)]);
    }

    public double Width { get; }
    public double Height { get; }
    public IReadOnlyList<(string What, double X, double Y)> Places { get; }

    public static Canvas Of(string svg) => new(XElement.Parse(svg));

    private static IEnumerable<(string, double, double)> Reached(XElement shape)
    {
        double Of(string name) => shape.Attribute(name) is { } number ? double.Parse(number.Value, CultureInfo.InvariantCulture) : 0;
        var what = $"{shape.Name.LocalName} {(string?)shape.Attribute("class")}";
        return shape.Name.LocalName switch
        {
            "rect" => [(what, Of("x"), Of("y")), (what, Of("x") + Of("width"), Of("y") + Of("height"))],
            "text" => [(what, Of("x"), Of("y") - Tall), (what, Of("x") + Digit * shape.Value.Length, Of("y"))],
            "path" => Path((string)shape.Attribute("d")!).Select(p => (what, p.X, p.Y)),
            _ => [],
        };
    }

    // Our drawings use the absolute M, L, H, V and Z only; anything else is an error of this reader.
    private static IEnumerable<(double X, double Y)> Path(string d)
    {
        var (x, y) = (0.0, 0.0);
        foreach (Match step in Step().Matches(d))
        {
            var to = Numbers(step.Groups[2].Value);
            (x, y) = step.Groups[1].Value switch
            {
                "M" or "L" => (to[0], to[1]),
                "H" => (to[0], y),
                "V" => (x, to[0]),
                "Z" => (x, y),
                var other => throw new InvalidDataException($"A path goes by {other}."),
            };
            yield return (x, y);
        }
    }

    private static double[] Numbers(string words) =>
        [.. words.Split(' ', StringSplitOptions.RemoveEmptyEntries).Select(n => double.Parse(n, CultureInfo.InvariantCulture))];

    [GeneratedRegex("([A-Za-z])([^A-Za-z]*)")]
    private static partial Regex Step();
}
