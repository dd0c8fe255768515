using System.Globalization;
using System.Text.RegularExpressions;

namespace Credtrack.Core.Measures;

/// <summary>Times as files write them: a date, or a date and a time of day, with or without an offset.</summary>
public static partial class TimeText
{
    public const string Expected = "a date YYYY-MM-DD or a time YYYY-MM-DDThh:mm[:ss[.fraction]] with Z, +hh:mm, -hh:mm or nothing";

    /// <summary>The day, exactly as YYYY-MM-DD.</summary>
    public static DateOnly? ReadDay(string text) =>
        Date().IsMatch(text) && DateOnly.TryParseExact(text, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var day) ? day : null;

    /// <summary>The instant in UTC, or null if the text is none; what has no offset is local time of the zone, a date its first instant. Years 2 to 9998.</summary>
    public static DateTime? ReadUtc(string text, TimeZoneInfo zone)
    {
        if (ReadDay(text) is { } day) return day.Year is < 2 or > 9998 ? null : LocalTimes.StartOfDay(day, zone);
        if (Time().Match(text) is not { Success: true } time || ReadDay(time.Groups["day"].Value) is not { Year: >= 2 and <= 9998 } date) return null;
        var (hour, minute, second) = (Part(time, "hour"), Part(time, "minute"), Part(time, "second"));
        if (hour > 23 || minute > 59 || second > 59) return null;
        // Ticks are tenths of a microsecond; further digits are cut off.
        var ticks = int.Parse((time.Groups["fraction"].Value + "0000000")[..7], CultureInfo.InvariantCulture);
        var local = date.ToDateTime(new TimeOnly(hour, minute, second)).AddTicks(ticks);
        if (time.Groups["zulu"].Success) return DateTime.SpecifyKind(local, DateTimeKind.Utc);
        if (!time.Groups["sign"].Success) return LocalTimes.ToUtc(local, zone);
        var (hours, minutes) = (Part(time, "hours"), Part(time, "minutes"));
        if (hours > 23 || minutes > 59) return null;
        var offset = new TimeSpan(hours, minutes, 0);
        return DateTime.SpecifyKind(time.Groups["sign"].Value == "-" ? local + offset : local - offset, DateTimeKind.Utc);
    }

    private static int Part(Match match, string name) =>
        match.Groups[name].Success ? int.Parse(match.Groups[name].ValueSpan, CultureInfo.InvariantCulture) : 0;

    [GeneratedRegex(@"\A[0-9]{4}-[0-9]{2}-[0-9]{2}\z")]
    private static partial Regex Date();

    [GeneratedRegex(@"\A(?<day>[0-9]{4}-[0-9]{2}-[0-9]{2})T(?<hour>[0-9]{2}):(?<minute>[0-9]{2})(:(?<second>[0-9]{2})(\.(?<fraction>[0-9]+))?)?((?<zulu>Z)|(?<sign>[+-])(?<hours>[0-9]{2}):(?<minutes>[0-9]{2}))?\z",
        RegexOptions.ExplicitCapture)]
    private static partial Regex Time();
}
