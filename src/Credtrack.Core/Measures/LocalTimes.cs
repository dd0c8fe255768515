namespace Credtrack.Core.Measures;

/// <summary>
/// Between the clock on a wall and UTC. A local time that occurs twice is the first; one that a clock change skips is read with the
/// offset in force before the change. Range: years 2 to 9998, so that no offset leads out of the calendar.
/// </summary>
public static class LocalTimes
{
    /// <summary>The instant, in UTC, at which the clocks of the zone show this date and time.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The year is outside 2 to 9998.</exception>
    public static DateTime ToUtc(DateTime local, TimeZoneInfo zone)
    {
        var (first, before) = Search(local, zone);
        return first ?? Minus(local, before);
    }

    /// <summary>The first instant, in UTC, of a calendar day; where midnight is skipped, the instant of the clock change.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The year is outside 2 to 9998.</exception>
    public static DateTime StartOfDay(DateOnly day, TimeZoneInfo zone)
    {
        var midnight = day.ToDateTime(TimeOnly.MinValue);
        var (first, before) = Search(midnight, zone);
        return first ?? Change(Minus(midnight, before).AddDays(-1), Minus(midnight, before).AddDays(1), midnight, zone);
    }

    /// <summary>What the clocks of the zone show at an instant.</summary>
    public static DateTime FromUtc(DateTime utc, TimeZoneInfo zone) =>
        DateTime.SpecifyKind(utc + zone.GetUtcOffset(DateTime.SpecifyKind(utc, DateTimeKind.Utc)), DateTimeKind.Unspecified);

    /// <summary>The calendar day of an instant in the zone.</summary>
    public static DateOnly DayOf(DateTime utc, TimeZoneInfo zone) => DateOnly.FromDateTime(FromUtc(utc, zone));

    /// <summary>The first instant that shows the local time, if any does, and the offset in force a day before.</summary>
    private static (DateTime? First, TimeSpan Before) Search(DateTime local, TimeZoneInfo zone)
    {
        if (local.Year is < 2 or > 9998) throw new ArgumentOutOfRangeException(nameof(local));
        var before = zone.GetUtcOffset(Minus(local, TimeSpan.Zero).AddDays(-1));
        var after = zone.GetUtcOffset(Minus(local, TimeSpan.Zero).AddDays(1));
        // The larger offset gives the earlier instant, so it is tried first.
        foreach (var offset in before > after ? new[] { before, after } : [after, before])
            if (zone.GetUtcOffset(Minus(local, offset)) == offset) return (Minus(local, offset), before);
        return (null, before);
    }

    /// <summary>The instant, to the tick, at which the clocks jump over a midnight.</summary>
    private static DateTime Change(DateTime low, DateTime high, DateTime midnight, TimeZoneInfo zone)
    {
        while (high.Ticks - low.Ticks > 1)
        {
            var middle = low.AddTicks((high.Ticks - low.Ticks) / 2);
            if (FromUtc(middle, zone) < midnight) low = middle; else high = middle;
        }
        return high;
    }

    private static DateTime Minus(DateTime local, TimeSpan offset) => DateTime.SpecifyKind(local - offset, DateTimeKind.Utc);
}
