using Credtrack.Core.Imports;
using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Plumbing;
using Credtrack.Core.Readings;
using Credtrack.Web.Commands;

namespace Credtrack.Web.Features.Imports;

/// <summary>One row and what happens to it.</summary>
/// <param name="Entry">what is added; null for a row that is here already or left out</param>
public sealed record PlannedRow(int Line, string Source, string Person, string Choice, string Application, DateTime PerformedAt, string What, int Assumed, ImportEntry? Entry);

/// <summary>What a file will do: row by row, or every fault with its line and column. Nothing is saved by it.</summary>
public sealed record ImportPlan(IReadOnlyList<PlannedRow> Rows, IReadOnlyList<CsvFault> Faults, IReadOnlyList<string> Dropped, Mapping Mapping)
{
    public const string IsNew = "is added", IsHere = "is here already", IsOut = "left out, as chosen", IsWrong = "is at fault";

    public IEnumerable<PlannedRow> New => Rows.Where(r => r.Entry is not null);
    public int Here => Rows.Count(r => r.What == IsHere);
    public int Out => Rows.Count(r => r.What == IsOut);

    /// <summary>Cells of the rows to be added that take a default.</summary>
    public int Assumed => New.Sum(r => r.Assumed);
    public IEnumerable<string> NewPeople => New.Where(r => r.Choice == Mapping.New).Select(r => r.Person).Distinct(StringComparer.Ordinal);

    public string? WhyNot => Faults.Count > 0 ? "Nothing is imported while a row is at fault: correct the file and upload it again, or change what it means."
        : New.Any() ? null : "Nothing of this file would be added.";

    public static ImportPlan Of(SentTable table, Mapping mapping, ImportGround ground, Guid? importId)
    {
        var faults = new List<CsvFault>();
        var scans = ScansCsv.Read(table.Text, ground.Zone, faults, mapping.Meaning(table.Separator));
        var wrong = faults.Select(f => f.Line).ToHashSet();
        var rows = scans.Where(s => !wrong.Contains(s.Line)).Select(s => Row(s, mapping, ground, importId, faults)).ToList();
        var named = faults.OrderBy(f => f.Line).Select(f => f with { Column = f.Column is null ? null : mapping.Columns.GetValueOrDefault(f.Column, f.Column) });
        return new(rows, [.. named], [.. table.Header.Except(mapping.Columns.Values)], mapping);
    }

    private static PlannedRow Row(PersonScan row, Mapping mapping, ImportGround ground, Guid? importId, List<CsvFault> faults)
    {
        var (scan, choice) = (row.Scan, mapping.People.GetValueOrDefault(row.Person, ""));
        var planned = new PlannedRow(row.Line, scan.Scan, row.Person, choice, scan.Application, scan.PerformedAt, IsOut, row.Assumed.Count, null);
        if (choice == Mapping.Out) return planned;
        if (ground.Held.TryGetValue(ImportedRow.KeyOf(scan.Scan), out var held) && (held.IsConfirmed || held.ImportId != importId))
        {
            if (!held.IsConfirmed) faults.Add(new(row.Line, "scan", "this row is staged by another import of this programme; take that up again or throw it away first"));
            return planned with { What = IsHere };
        }
        if (ground.Applications.FirstOrDefault(a => a.Code == scan.Application) is not { } application)
        {
            faults.Add(new(row.Line, "application", "expected the code of an application of the catalogue; add it there, or say which one this word means"));
            return planned with { What = IsWrong };
        }
        var entry = new ImportEntry(row.Line, scan.Scan, application, scan.Subtype, Whole(scan.PerformedAt), scan.Encounter, scan.Role, scan.Setting, scan.Indicated, scan.Supervision, scan.Assisted,
            scan.Reading is { } reading ? reading with { At = Whole(reading.At) } : null, scan.Outcome is { } outcome ? outcome with { At = Whole(outcome.At) } : null,
            row.Assumed.Count == 0 ? null : string.Join(", ", row.Assumed));
        var before = faults.Count;
        faults.AddRange(entry.Faults(ground.By.Id, Trainee(row.Person, choice, ground), ground.Now).Append(WhyNotPerson(row.Person, choice, ground, mapping)).Where(f => f.Why.Length > 0).Select(f => new CsvFault(row.Line, f.Column, f.Why)));
        return faults.Count > before ? planned with { What = IsWrong } : planned with { What = IsNew, Entry = entry };
    }

    private static (string Column, string Why) WhyNotPerson(string cell, string choice, ImportGround ground, Mapping mapping) => ("person",
          choice.Length == 0 ? "say who this is"
        : choice == Mapping.New ? TextLine.WhyNot(cell, Person.LongestName) ?? ""
        : ground.Trainees.Any(t => $"{t.Id}" == choice) || mapping.Enrolled.Any(e => $"{e}" == choice) ? ""
        : "expected a trainee of this programme");

    // Somebody of the importer's own name is taken for the importer, so that nobody brings in their own scans as a new person's.
    private static Guid? Trainee(string cell, string choice, ImportGround ground) => choice == Mapping.New && ground.IsImporter(cell) ? ground.By.Id : Guid.TryParse(choice, out var id) ? id : null;

    // In whole milliseconds, which every database keeps.
    private static DateTime Whole(DateTime utc) => utc.AddTicks(-(utc.Ticks % TimeSpan.TicksPerMillisecond));
}
