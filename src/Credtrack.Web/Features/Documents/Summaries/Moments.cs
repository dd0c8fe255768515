using System.Globalization;
using Credtrack.Core.Measures;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>Days and instants in full, because a stranger reads them years later in another country.</summary>
internal static class Moments
{
    private static readonly CultureInfo English = CultureInfo.InvariantCulture;

    public static string InFull(this DateOnly day) => day.ToString("dddd d MMMM yyyy", English);

    /// <summary>Tuesday 3 November 2026, 15:02:11 (UTC+01:00, Europe/Berlin): the clock of the zone, how far it is from UTC, and its name.</summary>
    public static string InFull(this DateTime utc, TimeZoneInfo zone)
    {
        var offset = zone.GetUtcOffset(DateTime.SpecifyKind(utc, DateTimeKind.Utc));
        var sign = offset < TimeSpan.Zero ? '-' : '+';
        return string.Create(English, $"{LocalTimes.FromUtc(utc, zone):dddd d MMMM yyyy, HH:mm:ss} (UTC{sign}{offset:hh\\:mm}, {zone.Id})");
    }
}
