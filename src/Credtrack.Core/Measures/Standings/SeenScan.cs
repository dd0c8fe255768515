using Credtrack.Core.Readings;

namespace Credtrack.Core.Measures.Standings;

/// <summary>A scan as it looks on a day: what came later does not exist yet, and the outcome has replaced the result.</summary>
public sealed record SeenScan(ScanEvidence Evidence, DateOnly Day, ReadingEvidence? Reading, Result? Result)
{
    public bool IsRead => Reading is not null;

    /// <summary>Whether the truth is positive; null where the result is indeterminate or not given.</summary>
    public bool? Positive => Result switch
    {
        Readings.Result.TP or Readings.Result.FN => true,
        Readings.Result.TN or Readings.Result.FP => false,
        _ => null,
    };

    /// <summary>The scan as seen on a day of the zone, or null if it was performed later.</summary>
    public static SeenScan? On(DateOnly asOf, ScanEvidence scan, TimeZoneInfo zone)
    {
        var day = LocalTimes.DayOf(scan.PerformedAt, zone);
        if (day > asOf) return null;
        var reading = scan.Reading is { } read && LocalTimes.DayOf(read.At, zone) <= asOf ? read : null;
        var outcome = reading is not null && scan.Outcome is { } later && LocalTimes.DayOf(later.At, zone) <= asOf ? later : null;
        return new(scan, day, reading, outcome?.Result ?? reading?.Result);
    }

    /// <summary>By instant, then by id in UTF-16 code units: the order in which scans are walked.</summary>
    public static int InOrder(SeenScan a, SeenScan b) => a.Evidence.PerformedAt.CompareTo(b.Evidence.PerformedAt) is not 0 and var order ? order
        : string.CompareOrdinal(a.Evidence.Scan, b.Evidence.Scan);
}
