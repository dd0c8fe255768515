using Credtrack.Core.Measures.Standings;
using Credtrack.Core.People;
using Credtrack.Core.Readings;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Scans;

namespace Credtrack.Data;

/// <summary>What the measures may know of scans: those submitted at least once, or imported and confirmed, and not withdrawn, with the values that govern.</summary>
public static class Evidence
{
    /// <summary>Two queries, whatever the number of people. Drafts are no evidence; what waits or was returned is unread.</summary>
    public static async Task<ILookup<Guid, ScanEvidence>> EvidenceOf(this CredtrackDb db, IReadOnlyCollection<Guid> people)
    {
        var scans = await db.Scans.IgnoreAutoIncludes().Brought().Handed().Where(s => people.Contains(s.TraineeId) && s.Withdrawal == null).Select(s => new
        {
            s.Id, s.TraineeId, s.Application.Code, s.Subtype, s.PerformedAt, s.Encounter, s.Role, s.Setting, s.Indicated, s.Supervision, s.SupervisorId, s.Assisted,
            IsImported = s.Imported != null, s.Imported!.OutcomeAt, s.Imported.OutcomeResult,
            WasThere = s.Confirmations.Where(c => c.SupervisorId == s.SupervisorId && c.ApplicationId == s.ApplicationId && c.PerformedAt == s.PerformedAt).Select(c => (bool?)c.WasThere).FirstOrDefault(),
        }).ToListAsync();
        var governing = await db.Readings.IgnoreAutoIncludes().Where(r => people.Contains(r.TraineeId) && r.Number == 1).Select(r => new
        {
            r.ScanId, r.Application.Code, r.Subtype, r.Indicated, r.Assisted, r.AtMost, r.ReaderId, Reading = new ReadingEvidence(r.At, r.Quality, r.ViewsAdequate, r.Result),
        }).ToDictionaryAsync(r => r.ScanId);
        return scans.Select(s => (s.TraineeId, Evidence: governing.TryGetValue(s.Id, out var read)
            ? new ScanEvidence(s.Id.ToString(), read.Code, read.Subtype, s.PerformedAt, s.Encounter, s.Role, s.Setting, read.Indicated,
                Supervisions.Counting(s.Supervision, s.SupervisorId, read.ReaderId, read.AtMost, s.WasThere, s.IsImported), read.Assisted, read.Reading, Outcome(s.OutcomeAt, s.OutcomeResult))
            : new ScanEvidence(s.Id.ToString(), s.Code, s.Subtype, s.PerformedAt, s.Encounter, s.Role, s.Setting, s.Indicated,
                Supervisions.Counting(s.Supervision, s.SupervisorId, null, null, s.WasThere, s.IsImported), s.Assisted, null, Outcome(s.OutcomeAt, s.OutcomeResult))))
            .ToLookup(s => s.TraineeId, s => s.Evidence);
    }

    private static OutcomeEvidence? Outcome(DateTime? at, Result? result) => at is { } day && result is { } truth ? new(day, truth) : null;

    /// <summary>The rulebook in force: the latest edition that the programme has published; null before the first.</summary>
    public static Task<Rulebook?> RulebookInForce(this CredtrackDb db, Guid programmeId) =>
        db.Rulebooks.AsNoTracking().Where(r => r.ProgrammeId == programmeId).OrderByDescending(r => r.Edition).FirstOrDefaultAsync();
}
