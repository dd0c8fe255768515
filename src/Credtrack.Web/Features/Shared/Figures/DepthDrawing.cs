using System.Globalization;

namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>
/// The depth column and, with x and y exchanged, the depth row. It hangs from the skin line: what counts is solid, what waits is hatched,
/// the required count is a notch, and what lies beyond is pale. Nothing leaves the viewBox: what is deeper than the drawing is cut.
/// </summary>
public sealed class DepthDrawing
{
    private const double Skin = 3, ColumnWidth = 100, RowWidth = 288, ColumnBeyond = 30, RowBeyond = 25;
    private readonly Depth depth;
    private readonly DepthUnit unit;
    private readonly bool row;
    private readonly double scan, near, breadth, far;
    private readonly Drawing drawing;

    private DepthDrawing(Depth depth, DepthUnit unit, bool row)
    {
        (this.depth, this.unit, this.row, drawing) = (depth, unit, row, new Drawing(row));
        (scan, near, breadth) = row ? (unit.Row, 15, 16) : (unit.Column, 12, 20);
        far = depth.Required + (row ? RowBeyond : ColumnBeyond) / scan;
    }

    public static string Column(Depth depth, DepthUnit unit) => new DepthDrawing(depth, unit, row: false).Drawn();

    public static string Row(Depth depth, DepthUnit unit) => new DepthDrawing(depth, unit, row: true).Drawn();

    private double Rim => near + breadth;
    private double Filled => Math.Min(depth.Counting, far);
    private double Ended => Math.Min(depth.Counting + depth.Waiting, far);
    private double Height => row ? Rim + 25 : At(far) + 6;

    private double At(double scans) => Skin + scans * scan;

    // The order is the order of painting: later parts lie over earlier ones, the skin line over all.
    private string Drawn()
    {
        Track();
        Ticks();
        Counting();
        Waiting();
        OverCap();
        Stall();
        Notch();
        drawing.Rect(0, 0, Skin, row ? Height : ColumnWidth, "fig-skin");
        var (key, width) = ($"{Svg.Escape(depth.Key)}-{(row ? 'r' : 'c')}", row ? RowWidth : ColumnWidth);
        return $"<svg class=\"fig is-{(row ? "row" : "column")}\" viewBox=\"0 0 {Svg.Number(width)} {Svg.Number(Height)}\" width=\"{Svg.Number(width)}\" height=\"{Svg.Number(Height)}\" role=\"img\" aria-labelledby=\"{key}-t {key}-d\">"
            + $"<title id=\"{key}-t\">{Svg.Escape(depth.Name)}</title><desc id=\"{key}-d\">{Svg.Escape(depth.Said)}</desc>{drawing}</svg>";
    }

    private void Track()
    {
        drawing.Rect(At(0), near, depth.Required * scan, breadth, "fig-track");
        foreach (var side in new[] { near + .5, Rim - .5 }) drawing.Line("fig-faint", false, (At(depth.Required), side), (At(far), side));
    }

    private void Ticks() => drawing.Strokes("fig-tick",
        from n in Enumerable.Range(1, (int)far / unit.Tick)
        let scans = n * unit.Tick
        select (At(scans), near - 7 - (scans % unit.LongTick == 0 ? 5 : 0), near - 2));

    private void Counting()
    {
        drawing.Rect(At(0), near, Math.Min(depth.Counting, depth.Required) * scan, breadth, "fig-solid");
        drawing.Rect(At(depth.Required), near + .5, (Filled - depth.Required) * scan, breadth - 1, "fig-over");
        if (depth.Counting <= far) return;
        foreach (var (kind, back) in new[] { ("fig-cut", 12), ("fig-rim", 9.5), ("fig-rim", 14.5) })
            drawing.Line(kind, false, (At(far) - back - 3, near - 2), (At(far) - back + 3, Rim + 2));
    }

    private void Waiting()
    {
        var length = (Ended - Filled) * scan;
        drawing.Hatch(At(Filled), near + .5, length, breadth - 1);
        drawing.Rect(At(Filled), near + .5, length - .5, breadth - 1, "fig-rim");
    }

    private void OverCap()
    {
        var end = Math.Min(depth.Counting + depth.Waiting + depth.OverCap, far);
        if (end > Ended) drawing.Line("fig-shadow", false, (At(Ended), near + 3), (At(end), near + 3));
    }

    private void Stall()
    {
        if (!depth.Stalled) return;
        foreach (var bar in new[] { -2, 3 }) drawing.Line("fig-mark", false, (At(Ended) + bar, Rim + 3), (At(Ended) + bar, Rim + 13));
    }

    private void Notch()
    {
        var (here, number) = (At(depth.Required), depth.Required.ToString(CultureInfo.InvariantCulture));
        drawing.Line("fig-mark", false, (here, near), (here, Rim));
        // Close under the skin the triangle would leave the drawing, and its number the space under the line.
        drawing.Line(depth.Met ? "fig-notch" : "fig-notch open", true, (here, Rim), (Math.Max(0, here - 5), Rim + 8), (here + 5, Rim + 8));
        if (row) drawing.Text(here + 8, Rim + 11, number);
        else drawing.Text(Rim + 12, Math.Max(Skin + 10.5, here + 4.5), number);
    }
}
