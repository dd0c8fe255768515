using Credtrack.Core.Measures;
using Credtrack.Web.Features.Cohorts;

namespace Credtrack.Web.Features.Home;

/// <summary>A number of this month beside the one before.</summary>
public sealed record Change(string What, int Now, int Before)
{
    public string Said => (Now - Before) switch { 0 => "as many", > 0 and var more => $"{more} more", var fewer => $"{-fewer} fewer" };
}

/// <summary>What came in a month up to today, beside the month before, in the programmes that one leads. Withdrawn scans are in neither.</summary>
public sealed record Changes(DateOnly From, IReadOnlyList<Change> Lines, int ByTrainees)
{
    public static async Task<Changes> Load(CredtrackDb db, Me me, IReadOnlyCollection<Guid> led, IReadOnlyList<CohortRow> rows, DateOnly today)
    {
        var (from, before) = (today.AddMonths(-1), today.AddMonths(-2));
        var (start, middle) = (LocalTimes.StartOfDay(before.AddDays(1), me.Zone), LocalTimes.StartOfDay(from.AddDays(1), me.Zone));
        var scans = db.Scans.IgnoreAutoIncludes().Standing().Where(s => led.Contains(s.ProgrammeId));
        var submitted = await InMonths(scans.SelectMany(s => s.Submissions.Where(x => x.Number == 1).Select(x => x.At)), start, middle);
        var read = await InMonths(scans.SelectMany(s => s.Readings.Select(r => r.At)), start, middle);
        var met = rows.Select(row =>
        {
            var (then, earlier) = (row.On(from).Applications, row.On(before).Applications);
            return (Now: row.Cells.Where((c, at) => c.Standing.Met && !then[at].Met).Count(), Before: then.Where((a, at) => a.Met && !earlier[at].Met).Count());
        }).ToList();
        return new(from, [submitted with { What = "Scans submitted" }, read with { What = "Readings given" }, new("Applications newly met", met.Sum(m => m.Now), met.Sum(m => m.Before))], met.Count(m => m.Now > 0));
    }

    private static async Task<Change> InMonths(IQueryable<DateTime> times, DateTime start, DateTime middle)
    {
        var numbers = await times.Where(at => at >= start).GroupBy(at => at >= middle).Select(g => new { g.Key, Number = g.Count() }).ToDictionaryAsync(g => g.Key, g => g.Number);
        return new("", numbers.GetValueOrDefault(true), numbers.GetValueOrDefault(false));
    }
}
