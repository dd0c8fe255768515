namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>The small column of the cohort sheet: 36 x 40, every notch at the same depth, without ticks. Readers pass over it: the words stand beside it.</summary>
public static class CellDrawing
{
    private const double Length = 32, Breadth = 12, Beyond = 7, End = Length + Beyond;

    public static string Of(Depth depth)
    {
        var drawing = new Drawing(row: false);
        var scan = Length / Math.Max(1, depth.Required);
        var counted = depth.Counting <= depth.Required ? depth.Counting * scan : Length + Math.Clamp((depth.Counting - depth.Required) * scan, 3, Beyond);
        if (depth.Required == 0) counted = depth.Counting == 0 ? 0 : End;
        var ended = Math.Min(counted + depth.Waiting * scan, End);

        drawing.Rect(0, 0, Length, Breadth, "fig-track");
        drawing.Rect(0, 0, Math.Min(counted, Length), Breadth, "fig-solid");
        drawing.Rect(Length, .5, counted - Length, Breadth - 1, "fig-over");
        drawing.Hatch(counted, .5, ended - counted, Breadth - 1, step: 4);
        drawing.Rect(counted, .5, ended - counted - .5, Breadth - 1, "fig-rim");
        if (depth.Stalled) foreach (var bar in new[] { 0, 4 }) drawing.Line("fig-mark", false, (Math.Clamp(ended - 2, 4, 20) + bar, 15), (Math.Clamp(ended - 2, 4, 20) + bar, 25));
        drawing.Line("fig-mark", false, (Length, 0), (Length, Breadth));
        drawing.Line(depth.Met ? "fig-notch" : "fig-notch open", true, (Length, 12), (Length - 4, 18), (Length + 4, 18));
        return Svg.Hidden(36, 40, drawing.ToString(), "fig cell");
    }
}
