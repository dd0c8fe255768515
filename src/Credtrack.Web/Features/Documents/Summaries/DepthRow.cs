using System.Globalization;
using PdfSharp.Drawing;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>
/// The depth row in greys: it grows to the right from the skin line. What counts is solid up to the required count, which is a notch; what
/// lies beyond is pale. One scan is equally long in every row of a document, so that lengths compare by eye.
/// </summary>
internal sealed class DepthRow(Sheet sheet, SummaryLine line, int required, double scan)
{
    public const double Height = 35;
    private const double Skin = 3, Near = 9, Breadth = 11, Beyond = 36, Tick = 5, LongTick = 25;
    private double x, y;

    private double Rim => y + Near + Breadth;
    private double Far => Math.Max(At(required) + Beyond, At(required * 1.25));

    /// <summary>The length of one scan, in points, at which the deepest requirement still leaves room for what is beyond and for its number.</summary>
    public static double Scan(Sheet sheet, IEnumerable<int> required) =>
        Math.Min(6, (sheet.MatterWidth - Skin - Beyond - 24) / (1.25 * Math.Max(1, required.DefaultIfEmpty(1).Max())));

    public void Draw()
    {
        (x, y) = (Sheet.Matter, sheet.Y);
        var words = $"{line.Application}: {line.Counted.ToString(CultureInfo.InvariantCulture)} count, {required.ToString(CultureInfo.InvariantCulture)} required.";
        sheet.Figure(words, new XRect(x, y, sheet.MatterWidth, Height - 5), () =>
        {
            Body();
            Ticks();
            Notch();
            sheet.Pen.DrawRectangle(Ink.Dark.Brush(), x, y, Skin, Height - 5);
        });
        sheet.Y += Height;
    }

    private double At(double scans) => x + Skin + scans * scan;

    private void Body()
    {
        var (top, filled) = (y + Near, Math.Min(At(line.Counted), Far));
        sheet.Pen.DrawRectangle(Ink.Track.Brush(), At(0), top, At(required) - At(0), Breadth);
        foreach (var side in new[] { top + .3, Rim - .3 }) sheet.Pen.DrawLine(Ink.Hairline.Pen(), At(0), side, Far, side);
        if (line.Counted > 0) sheet.Pen.DrawRectangle(Ink.Solid.Brush(), At(0), top, At(Math.Min(line.Counted, required)) - At(0), Breadth);
        if (line.Counted > required) sheet.Pen.DrawRectangle(Ink.Faint.Pen(), Ink.Over.Brush(), At(required), top + .3, filled - At(required), Breadth - .6);
        if (At(line.Counted) <= Far) return;
        // Deeper than the drawing: cut, in paper between two strokes.
        foreach (var (pen, back) in new[] { (Ink.Paper.Pen(4), 9), (Ink.Faint.Pen(), 7), (Ink.Faint.Pen(), 11) })
            sheet.Pen.DrawLine(pen, Far - back - 2, Rim + 1, Far - back + 2, top - 1);
    }

    private void Ticks()
    {
        // So many scans that ticks would touch: only the long ones stay.
        var step = Tick * scan < 3 ? LongTick : Tick;
        for (var n = step; At(n) <= Far; n += step)
            sheet.Pen.DrawLine(Ink.Second.Pen(.5), At(n), y + Near - 2 - (n % LongTick == 0 ? 6 : 3), At(n), y + Near - 2);
    }

    private void Notch()
    {
        var here = At(required);
        XPoint[] notch = [new(here, Rim), new(Math.Max(x, here - 3.5), Rim + 6), new(here + 3.5, Rim + 6)];
        sheet.Pen.DrawLine(Ink.Dark.Pen(1.4), here, y + Near, here, Rim);
        // Filled only if every condition of the application is met, not the count alone.
        if (line.Unmet.Any()) sheet.Pen.DrawPolygon(Ink.Dark.Pen(.8), notch);
        else sheet.Pen.DrawPolygon(Ink.Dark.Brush(), notch, XFillMode.Winding);
        sheet.Write(here + 7, Rim, $"{required.ToString(CultureInfo.InvariantCulture)} required", Style.NoteStrong);
    }
}
