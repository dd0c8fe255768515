using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Readings;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Rulebooks;

/// <summary>Rulebooks and evidence in a line.</summary>
internal static class Book
{
    public static readonly DateOnly Day = new(2026, 3, 31);

    /// <summary>A rulebook with this much of its own, beside what every rulebook needs.</summary>
    public static string Json(string rest) =>
        $$"""{ "format": "credtrack-rulebook/1", "name": "Harbour", "version": 3, "effective": "2026-01-01", {{rest}} }""";

    /// <summary>The rules for one application, cardiac, or whatever stands here.</summary>
    public static Rules Read(string rest)
    {
        var read = RulesReader.Read(Json(rest), "UTC");
        Assert.Empty(read.Faults);
        return read.Rules!;
    }

    public static Rules Cardiac(string rest) => Read($$"""  "applications": [{ "code": "cardiac", {{rest}} }] """);

    public static Standing On(this Rules rules, params ScanEvidence[] scans) => Standing.Of(rules, scans, [], Day);

    /// <summary>A clinical cardiac scan at noon UTC of a day of March 2026, not read.</summary>
    public static ScanEvidence Scan(string id, int day = 1) => new(id, "cardiac", null, new DateTime(2026, 3, day, 12, 0, 0, DateTimeKind.Utc), null,
        Role.Performed, Setting.Clinical, Indicated: true, Supervision.Later, Assisted: false, null, null);

    /// <summary>The scan read a quarter of an hour later.</summary>
    public static ScanEvidence As(this ScanEvidence scan, Result? result, int? quality = 3, bool? views = true) =>
        scan with { Reading = new(scan.PerformedAt.AddMinutes(15), quality, views, result) };

    public static IEnumerable<string> Verdicts(this Standing standing) =>
        standing.Findings.Select(f => $"{f.Scan} {f.Verdict}{(f.Reason is null ? "" : ": " + f.Reason)}");
}
