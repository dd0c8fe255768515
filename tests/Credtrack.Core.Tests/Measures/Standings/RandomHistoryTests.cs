using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Readings;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Scans;
using Credtrack.Core.Tests.Rulebooks;

namespace Credtrack.Core.Tests.Measures.Standings;

public sealed class RandomHistoryTests
{
    private static readonly Rules Rules = Book.Read("""
        "timeZone": "America/Chicago", "introductory": 2, "counting": { "role": ["performed"], "quality": { "min": 2 } },
        "applications": [
          { "code": "cardiac", "caps": [{ "where": { "setting": ["education", "simulation"] }, "max": 3, "label": "teaching" }, { "where": { "positive": false }, "max": 5, "label": "normal" }],
            "require": [{ "kind": "count", "min": 8 }, { "kind": "share", "where": { "indicated": true }, "min": 0.5 }] },
          { "code": "lung", "introductory": 0, "counting": { "quality": null }, "require": [{ "kind": "count", "min": 3, "where": { "positive": true } }] },
          { "code": "aorta", "counting": { "read": false }, "require": [] }],
        "groups": [{ "name": "chest", "applications": ["cardiac", "lung"], "require": [{ "kind": "count", "min": 9 }] }],
        "overall": [{ "kind": "count", "min": 20 }, { "kind": "applications", "min": 2, "meeting": "own" }]
        """);

    [Fact]
    public void The_order_of_the_input_never_matters()
    {
        var chance = new Random(20260303);
        for (var history = 0; history < 100; history++)
        {
            var scans = History(chance);
            var standing = Standing.Of(Rules, scans, [], Book.Day);
            chance.Shuffle(scans);
            Assert.Equal(Said(standing), Said(Standing.Of(Rules, scans, [], Book.Day)));
        }
    }

    [Fact]
    public void Each_visible_scan_is_explained_once_and_the_numbers_are_their_sums()
    {
        var chance = new Random(20260304);
        for (var history = 0; history < 100; history++)
        {
            var scans = History(chance);
            var standing = Standing.Of(Rules, scans, [], Book.Day);
            var visible = scans.Where(s => SeenScan.On(Book.Day, s, Rules.Zone) is not null).Select(s => s.Scan);
            Assert.Equal(visible.Order(StringComparer.Ordinal), standing.Findings.Select(f => f.Scan).Order(StringComparer.Ordinal));
            Assert.All(standing.Findings, f => Assert.Equal((f.Verdict == Verdict.Excluded, f.Verdict != Verdict.Counts), (f.Reason is not null, f.Words() is not null)));
            foreach (var application in standing.Applications)
                Assert.Equal(standing.Findings.Count(f => f.Application == application.Code), application.Counted + application.Pending + application.Excluded.Values.Sum());
            Assert.Equal(standing.Applications.Sum(a => a.Counted), standing.Overall.Requirements[0].Value);
            Assert.Equal(standing.Applications.Where(a => a.Code != "aorta").Sum(a => a.Counted), standing.Groups[0].Requirements[0].Value);
        }
    }

    [Fact]
    public void A_scan_more_at_the_end_changes_no_earlier_verdict()
    {
        var chance = new Random(20260305);
        for (var history = 0; history < 100; history++)
        {
            var scans = History(chance).OrderBy(s => s.PerformedAt).ThenBy(s => s.Scan, StringComparer.Ordinal).ToArray();
            var fewer = Standing.Of(Rules, scans[..^1], [], Book.Day).Verdicts().ToList();
            Assert.Equal(fewer, Standing.Of(Rules, scans, [], Book.Day).Verdicts().Take(fewer.Count));
        }
    }

    private static string[] Said(Standing standing) =>
        [.. standing.Verdicts(), .. standing.Applications.Select(a => $"{a.Met} {a.Counted} {a.Pending} {string.Join(';', a.Requirements.Select(r => r.Value))}"), $"{standing.Met}"];

    private static ScanEvidence[] History(Random chance) => [.. Enumerable.Range(0, chance.Next(1, 80)).Select(number => Any(chance, $"s{number:000}"))];

    private static ScanEvidence Any(Random chance, string id)
    {
        T Pick<T>(params T[] values) => values[chance.Next(values.Length)];
        var at = new DateTime(2026, 1, 1, 0, 0, 0, DateTimeKind.Utc).AddHours(chance.Next(100 * 24));
        var scan = new ScanEvidence(id, Pick("cardiac", "cardiac", "lung", "aorta", "x"), null, at, Pick(null, "e1", "e2", "e3"), Pick(Role.Performed, Role.Performed, Role.Interpreted),
            Pick(Enum.GetValues<Setting>()), Pick(true, false), Pick(Enum.GetValues<Supervision>()), Pick(true, false), null, null);
        if (Pick(true, false, false)) return scan;
        var reading = new ReadingEvidence(at.AddHours(chance.Next(600)), Pick<int?>(null, 1, 2, 3, 5), Pick<bool?>(null, true, false), Pick<Result?>(null, Result.TP, Result.TN, Result.FN));
        return scan with { Reading = reading, Outcome = Pick(null, new OutcomeEvidence(at.AddHours(chance.Next(900)), Pick(Enum.GetValues<Result>()))) };
    }
}
