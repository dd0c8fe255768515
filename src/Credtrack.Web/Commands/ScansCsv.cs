using Credtrack.Core.Measures;
using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Readings;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Commands;

/// <summary>One person's scan, as scans.csv has it.</summary>
/// <param name="Assumed">The cells that took a default, in words.</param>
public sealed record PersonScan(int Line, string Person, ScanEvidence Scan, IReadOnlyList<string> Assumed);

/// <summary>The table of scans.</summary>
public static class ScansCsv
{
    private static readonly Dictionary<string, int> Qualities = Enumerable.Range(1, 5).ToDictionary(q => $"{q}");

    public static IReadOnlyList<string> Required { get; } = ["scan", "person", "application", "performed_at"];

    // In the order in which people ask for them.
    private static readonly (string Column, string Words)[] Defaults =
        [("indicated", "indicated"), ("setting", "clinical"), ("role", "performed"), ("supervision", "supervised later"), ("assisted", "no hands-on help")];

    /// <param name="text">The text of the file.</param>
    /// <param name="zone">The rulebook's zone; null if it is at fault: then days cannot be compared and are not.</param>
    /// <param name="faults">Every fault of the table is added here.</param>
    /// <param name="meaning">How a table that others made is read; null if it is in our format.</param>
    public static IReadOnlyList<PersonScan> Read(string text, TimeZoneInfo? zone, List<CsvFault> faults, CsvMeaning? meaning = null)
    {
        var table = CsvTable.Read(text, Required, meaning);
        var ids = new HashSet<string>(StringComparer.Ordinal);
        var scans = table.Rows.Select(row => Scan(row, zone, ids)).ToList();
        faults.AddRange(table.Faults.OrderBy(fault => fault.Line));
        return scans;
    }

    private static PersonScan Scan(CsvRow row, TimeZoneInfo? zone, HashSet<string> ids)
    {
        var id = row.Required("scan");
        if (id.Length > 0 && !ids.Add(id)) row.Fault("scan", "expected each scan once");
        var (person, application) = (row.Required("person"), row.Required("application"));
        row.Required("performed_at");
        var performed = row.Time("performed_at", zone ?? TimeZoneInfo.Utc);
        var scan = new ScanEvidence(id, application, row["subtype"], performed ?? default, row["encounter"],
            row.Word("role", RuleWords.Roles, Role.Performed), row.Word("setting", RuleWords.Settings, Setting.Clinical),
            row.Word("indicated", RuleWords.YesNo, true), row.Word("supervision", RuleWords.Supervisions, Supervision.Later),
            row.Word("assisted", RuleWords.YesNo, false), Reading(row, performed, zone), Outcome(row, zone));
        return new(row.Line, person, scan, [.. Defaults.Where(d => row[d.Column] is null).Select(d => d.Words)]);
    }

    private static ReadingEvidence? Reading(CsvRow row, DateTime? performed, TimeZoneInfo? zone)
    {
        var read = row.Time("read_at", zone ?? TimeZoneInfo.Utc);
        if (zone is not null && read is { } at && performed is { } earlier && LocalTimes.DayOf(at, zone) < LocalTimes.DayOf(earlier, zone))
            row.Fault("read_at", "expected a day not before that of performed_at");
        foreach (var column in new[] { "quality", "views", "result" })
            if (row["read_at"] is null && row[column] is not null) row.Fault(column, "expected read_at beside it");
        var (quality, views, result) = (row.Word("quality", Qualities), row.Word("views", RuleWords.YesNo), row.Word("result", RuleWords.Results));
        return read is null ? null : new(read.Value, quality, views, result);
    }

    private static OutcomeEvidence? Outcome(CsvRow row, TimeZoneInfo? zone)
    {
        if (row["outcome_at"] is null && row["outcome_result"] is not null) row.Fault("outcome_at", "expected a value, because outcome_result is given");
        if (row["outcome_result"] is null && row["outcome_at"] is not null) row.Fault("outcome_result", "expected a value, because outcome_at is given");
        var (at, result) = (row.Time("outcome_at", zone ?? TimeZoneInfo.Utc), row.Word<Result>("outcome_result", RuleWords.Results));
        return at is null || result is null ? null : new(at.Value, result.Value);
    }
}
