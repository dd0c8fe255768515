using System.Security.Cryptography;
using System.Text;
using Credtrack.Core.Catalogue;
using Credtrack.Core.Measures.Standings;
using Credtrack.Core.People;
using Credtrack.Core.Plumbing;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Imports;

/// <summary>One row of a file, before it becomes a scan.</summary>
/// <param name="Encounter">as the file has it; only a digest of it is kept, because it might name a patient after all</param>
/// <param name="Assumed">which cells took a default, in words; null if none did</param>
public sealed record ImportEntry(
    int Line, string Source, Application Application, string? Subtype, DateTime PerformedAt, string? Encounter, Role Role, Setting Setting, bool Indicated,
    Supervision Supervision, bool Assisted, ReadingEvidence? Reading, OutcomeEvidence? Outcome, string? Assumed)
{
    /// <summary>What cannot be so, each with the column it is about. A reading or an outcome of a later day is none yet in any standing, so it does no harm.</summary>
    public IEnumerable<(string Column, string Why)> Faults(Guid by, Guid? traineeId, DateTime now)
    {
        if (traineeId == by) yield return ("person", "this is you: nobody imports scans of their own. Leave these rows out, or let another coordinator import them");
        if (TextLine.WhyNot(Source, ImportedRow.LongestSource) is { } why) yield return ("scan", $"this id cannot be kept. {why}");
        if (PerformedAt > now) yield return ("performed_at", "this time has not come yet");
        if (PerformedAt.Year < ScanEntry.EarliestYear) yield return ("performed_at", "this is too long ago; check the year");
        if (Subtype is not null && !Application.Subtypes.Contains(Subtype)) yield return ("subtype", $"expected a part of {Application.Name} as the catalogue has it{(Application.Subtypes.Count == 0 ? ", which has none" : $": {string.Join(", ", Application.Subtypes)}")}");
    }

    /// <summary>Scans of one contact share it; without one in the file the scan is a contact of its own.</summary>
    internal string EncounterFor(Guid scanId, Guid programmeId) => Encounter is null ? scanId.ToString("N")[^12..]
        : Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes($"{programmeId} {Encounter}")))[..20];
}
