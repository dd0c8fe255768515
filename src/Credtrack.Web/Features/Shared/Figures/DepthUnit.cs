using System.Globalization;

namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>How long one scan is drawn, in CSS pixels, and how many scans lie between two ticks.</summary>
public sealed record DepthUnit(double Column, double Row, int Tick, int LongTick)
{
    private const double ColumnUnit = 6, RowUnit = 5, DeepestColumn = 360, LongestRow = 250, RowWithNumber = 277, Digit = 9, TicksApart = 8;
    private static readonly int[] Ticks = [5, 25, 100, 500, 2_500];

    /// <summary>
    /// Columns shrink above 60 required scans (360 px); rows above 50, because a row of 288 px must also hold 25 px beyond the notch or the number beside it.
    /// Ticks thin out before they stand closer than 8 px. Nought required is drawn in the full unit.
    /// </summary>
    public static DepthUnit For(int deepest)
    {
        var digits = deepest.ToString(CultureInfo.InvariantCulture).Length;
        var row = Math.Min(RowUnit, Math.Min(LongestRow, RowWithNumber - Digit * digits) / deepest);
        var step = Array.FindIndex(Ticks, 0, Ticks.Length - 1, tick => tick * row >= TicksApart);
        if (step < 0) step = Ticks.Length - 2;
        return new(Math.Min(ColumnUnit, DeepestColumn / deepest), row, Ticks[step], Ticks[step + 1]);
    }
}
