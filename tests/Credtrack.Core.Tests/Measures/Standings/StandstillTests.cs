using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Readings;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Measures.Standings;

// Days are counted by hand on a calendar of 2026.
public sealed class StandstillTests
{
    private static readonly DateOnly Began = new(2026, 1, 1);

    [Fact]
    public void Days_are_counted_from_the_day_after_the_last_scan_that_counts()
    {
        Assert.Equal(new Standstill(new(2026, 3, 1), true, 30, 0), On(new(2026, 3, 31), [new(2026, 2, 1), new(2026, 3, 1)]));
        Assert.Equal(0, On(new(2026, 3, 1), [new(2026, 3, 1)]).Days);
    }

    [Fact]
    public void What_does_not_count_or_waits_starts_nothing() =>
        Assert.Equal(new Standstill(new(2026, 2, 1), true, 58, 0), On(new(2026, 3, 31), [new(2026, 2, 1)], poor: new(2026, 3, 20), waiting: new(2026, 3, 25)));

    [Fact]
    public void Without_a_scan_that_counts_the_membership_starts_the_clock()
    {
        Assert.Equal(new Standstill(Began, false, 89, 0), On(new(2026, 3, 31), []));
        Assert.Equal(new Standstill(Began, false, 89, 0), On(new(2026, 3, 31), [new(2025, 11, 5)]));
    }

    [Fact]
    public void Days_of_leave_are_left_out_however_the_leaves_lie()
    {
        var leaves = new[] { (new DateOnly(2026, 2, 20), new DateOnly(2026, 3, 5)), (new(2026, 3, 4), new(2026, 3, 6)), (new(2026, 3, 30), new(2026, 4, 20)), (new(2025, 1, 1), new(2025, 12, 31)) };
        // 2 to 6 March and 30 and 31 March: seven days of thirty.
        Assert.Equal(new Standstill(new(2026, 3, 1), true, 23, 7), On(new(2026, 3, 31), [new(2026, 3, 1)], leaves: leaves));
    }

    [Fact]
    public void Days_and_leave_make_up_the_span_whatever_the_leaves()
    {
        var chance = new Random(20260306);
        for (var n = 0; n < 500; n++)
        {
            var leaves = Enumerable.Range(0, chance.Next(5)).Select(_ => Began.AddDays(chance.Next(-30, 120))).Select(first => (first, first.AddDays(chance.Next(40)))).ToArray();
            var found = On(new(2026, 3, 31), [new(2026, 1, 20)], leaves: leaves);
            var away = Enumerable.Range(1, 70).Select(d => new DateOnly(2026, 1, 20).AddDays(d)).Count(day => leaves.Any(l => l.Item1 <= day && day <= l.Item2));
            Assert.Equal((70 - away, away), (found.Days, found.Away));
        }
    }

    private static Standstill On(DateOnly day, DateOnly[] counting, DateOnly? poor = null, DateOnly? waiting = null, (DateOnly, DateOnly)[]? leaves = null)
    {
        var rules = RulesReader.Read("""
            { "format": "credtrack-rulebook/1", "name": "Own", "version": 1, "effective": "2026-01-01", "timeZone": "Europe/Dublin", "counting": { "quality": { "min": 3 } },
              "applications": [{ "code": "lung", "require": [{ "kind": "count", "min": 9 }] }] }
            """, "UTC").Rules!;
        var scans = counting.Select(d => Scan(d, 4)).ToList();
        if (poor is { } bad) scans.Add(Scan(bad, 2));
        if (waiting is { } later) scans.Add(Scan(later, null));
        return Standstill.Of(Standing.Of(rules, scans, [], day), Began, leaves ?? []);
    }

    private static ScanEvidence Scan(DateOnly day, int? quality)
    {
        var at = day.ToDateTime(new TimeOnly(12, 0), DateTimeKind.Utc);
        return new($"{day:O}-{quality}", "lung", null, at, null, Role.Performed, Setting.Clinical, true, Supervision.Later, false, quality is null ? null : new(at, quality, true, Result.TN), null);
    }
}
