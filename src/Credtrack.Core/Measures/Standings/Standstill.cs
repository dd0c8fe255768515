namespace Credtrack.Core.Measures.Standings;

/// <summary>
/// How long nothing has counted for a person, whatever the application: the days after the last scan that counts, up to and with the day of the
/// standing, without days of leave. What counted before the membership began does not start the clock; its first day does. The measure is our own, no source.
/// </summary>
/// <param name="Since">the last day on which a scan counted, or the first day of the membership</param>
/// <param name="HasCounted">whether a scan counted on that day</param>
/// <param name="Days">without leave</param>
/// <param name="Away">days of leave among them, which are left out</param>
public sealed record Standstill(DateOnly Since, bool HasCounted, int Days, int Away)
{
    public static Standstill Of(Standing standing, DateOnly firstDay, IEnumerable<(DateOnly First, DateOnly Last)> leaves)
    {
        var counted = standing.Findings.Where(f => f.Verdict == Verdict.Counts).Select(f => f.Seen.Day).DefaultIfEmpty().Max();
        var since = counted > firstDay ? counted : firstDay;
        var (away, next) = (0, since.AddDays(1));
        foreach (var (first, last) in leaves.OrderBy(l => l.First))
        {
            var (from, to) = (first > next ? first : next, last < standing.AsOf ? last : standing.AsOf);
            if (to < from) continue;
            away += to.DayNumber - from.DayNumber + 1;
            next = to.AddDays(1);
        }
        return new(since, counted != default && counted == since, Math.Max(0, standing.AsOf.DayNumber - since.DayNumber) - away, away);
    }
}
