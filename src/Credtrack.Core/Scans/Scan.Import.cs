using Credtrack.Core.Imports;
using Credtrack.Core.People;
using Credtrack.Core.Readings;

namespace Credtrack.Core.Scans;

public sealed partial class Scan
{
    /// <summary>For a scan that comes from a file: where it stood and who attests it.</summary>
    public ImportedRow? Imported { get; private set; }

    /// <summary>Its first reading was not given here: no answers, no pictures, only what the importer attests.</summary>
    public bool IsReadElsewhere => Imported is { IsRead: true };

    // Until the trainee names a supervisor, which makes it a statement of the trainee's.
    private bool IsAttested => Imported is not null && SupervisorId is null;

    public static string? WhyNotImport(Person by, Person trainee, Import import) =>
          import.WhyNotConfirm(by)
        ?? (by.Id == trainee.Id ? "Nobody imports scans of their own." : null);

    /// <summary>Staged: it is seen, and is evidence, once its import is confirmed.</summary>
    public static Scan Bring(Person by, Person trainee, Import import, ImportEntry entry, DateTime at)
    {
        RuleBroken.If(WhyNotImport(by, trainee, import) ?? entry.Faults(by.Id, trainee.Id, at).Select(f => f.Why).FirstOrDefault());
        var id = Guid.CreateVersion7(at);
        var scan = new Scan
        {
            Id = id,
            TraineeId = trainee.Id,
            ProgrammeId = import.ProgrammeId,
            Encounter = entry.EncounterFor(id, import.ProgrammeId),
            LoggedAt = at,
            ApplicationId = entry.Application.Id,
        };
        (scan.Subtype, scan.PerformedAt, scan.Role, scan.Setting) = (entry.Subtype, entry.PerformedAt, entry.Role, entry.Setting);
        (scan.Indicated, scan.Supervision, scan.Assisted) = (entry.Indicated, entry.Supervision, entry.Assisted);
        scan.Imported = new ImportedRow(scan, import, by, entry);
        if (entry.Reading is { } reading) scan.readings.Add(new Reading(scan, by, reading));
        else (scan.Views, scan.Answers) = ([.. entry.Application.Views.Select(v => v.With(marked: false))], [.. entry.Application.Questions.Select(q => q.With(null))]);
        scan.Record(new ScanImported(by, at, entry.Application.Name, entry.PerformedAt, entry.Line, entry.Reading is null ? "not read" : "read elsewhere"));
        return scan;
    }

    /// <summary>With its whole import, undone or thrown away; a file may bring it again.</summary>
    public void TakeBack(Person by, DateTime at)
    {
        RuleBroken.If(Imported is null ? "Only an imported scan is taken back." : null);
        Imported!.LetGo();
        Withdrawal ??= new Withdrawal(this, by, "Its import was undone.", at);
        Record(new ScanTakenBack(by, at));
    }
}
