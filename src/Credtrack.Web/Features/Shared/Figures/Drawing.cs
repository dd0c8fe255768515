using System.Globalization;
using System.Text;

namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>One drawing, two ways: a column that goes down or a row that goes to the right. It is told (along, across) and writes (x, y).</summary>
public sealed class Drawing(bool row)
{
    private readonly StringBuilder shapes = new();

    /// <summary>Nothing is written where nothing could be seen: without length or width there is no rectangle.</summary>
    public void Rect(double along, double across, double length, double breadth, string kind)
    {
        var (x, y, width, height) = row ? (along, across, length, breadth) : (across, along, breadth, length);
        if (width > 0 && height > 0)
            shapes.Append(CultureInfo.InvariantCulture, $"<rect class=\"{kind}\" x=\"{Svg.Number(x)}\" y=\"{Svg.Number(y)}\" width=\"{Svg.Number(width)}\" height=\"{Svg.Number(height)}\"/>");
    }

    public void Line(string kind, bool closed, params ReadOnlySpan<(double Along, double Across)> points)
    {
        var places = new List<string>(points.Length);
        foreach (var (along, across) in points) places.Add($"{Svg.Number(row ? along : across)} {Svg.Number(row ? across : along)}");
        Path(kind, $"M{string.Join('L', places)}{(closed ? "Z" : "")}");
    }

    public void Hatch(double along, double across, double length, double breadth, double step = 5)
    {
        if (length > 0) Path("fig-hatch", row ? Svg.Hatch(along, across, length, breadth, step) : Svg.Hatch(across, along, breadth, length, step));
    }

    /// <summary>Strokes across, from one place to another, at each of the depths: the ticks of a scale.</summary>
    public void Strokes(string kind, IEnumerable<(double Along, double From, double To)> strokes) => Path(kind, string.Concat(strokes.Select(s => row
        ? $"M{Svg.Number(s.Along)} {Svg.Number(s.From)}V{Svg.Number(s.To)}"
        : $"M{Svg.Number(s.From)} {Svg.Number(s.Along)}H{Svg.Number(s.To)}")));

    /// <summary>Words are never turned, so they are placed by x and y.</summary>
    public void Text(double x, double y, string words) =>
        shapes.Append(CultureInfo.InvariantCulture, $"<text class=\"fig-text\" x=\"{Svg.Number(x)}\" y=\"{Svg.Number(y)}\">{Svg.Escape(words)}</text>");

    public override string ToString() => shapes.ToString();

    private void Path(string kind, string d) => shapes.Append(CultureInfo.InvariantCulture, $"<path class=\"{kind}\" d=\"{d}\"/>");
}
