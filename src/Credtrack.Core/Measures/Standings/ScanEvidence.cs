using Credtrack.Core.Readings;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Measures.Standings;

/// <summary>What a standing needs to know of one scan, and no more. Instants are UTC.</summary>
public sealed record ScanEvidence(
    string Scan, string Application, string? Subtype, DateTime PerformedAt, string? Encounter,
    Role Role, Setting Setting, bool Indicated, Supervision Supervision, bool Assisted,
    ReadingEvidence? Reading, OutcomeEvidence? Outcome);

/// <summary>The reading that governs. Quality is 1 to 5; Views says whether all required views are adequate.</summary>
public sealed record ReadingEvidence(DateTime At, int? Quality, bool? Views, Result? Result);

/// <summary>Later truth about a scan: from its day on it stands in place of the reading's result.</summary>
public sealed record OutcomeEvidence(DateTime At, Result Result);

/// <summary>A course, an examination, a direct observation. Amount is hours or a score, 0 or more, exact.</summary>
public sealed record ItemEvidence(string Item, DateTime At, decimal Amount, bool Passed);
