namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>The short row for lists: 120 x 21, every notch at the same place. Readers pass over it: the words stand beside it.</summary>
public static class ShortDrawing
{
    private const double Skin = 3, Length = 84, Beyond = 24;

    public static string Of(Depth depth)
    {
        var drawing = new Drawing(row: true);
        var scan = Length / Math.Max(1, depth.Required);
        var required = depth.Required * scan;
        var counted = Math.Min(depth.Counting * scan, Length + Beyond);
        var ended = Math.Min((depth.Counting + depth.Waiting) * scan, Length + Beyond);

        drawing.Rect(Skin, 4, Length, 10, "fig-track");
        drawing.Rect(Skin, 4, Math.Min(counted, required), 10, "fig-solid");
        drawing.Rect(Skin + required, 4.5, counted - required, 9, "fig-over");
        drawing.Hatch(Skin + counted, 4.5, ended - counted, 9, step: 4);
        drawing.Rect(Skin + counted, 4.5, ended - counted - .5, 9, "fig-rim");
        if (depth.Stalled) foreach (var bar in new[] { -2, 2 }) drawing.Line("fig-mark", false, (Skin + ended + bar, 15), (Skin + ended + bar, 21));
        drawing.Line("fig-mark", false, (Skin + Length, 4), (Skin + Length, 14));
        drawing.Line(depth.Met ? "fig-notch" : "fig-notch open", true, (Skin + Length, 14), (Skin + Length - 4, 20), (Skin + Length + 4, 20));
        drawing.Rect(0, 0, Skin, 21, "fig-skin");
        return Svg.Hidden(120, 21, drawing.ToString(), "fig");
    }
}
