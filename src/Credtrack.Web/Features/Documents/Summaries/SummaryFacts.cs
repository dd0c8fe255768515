namespace Credtrack.Web.Features.Documents.Summaries;

public enum Paper { A4, Letter }

/// <summary>Everything that a competency summary says, as plain values: what is not here cannot be printed, a reader's comment least of all.</summary>
public sealed record SummaryFacts
{
    public required string Holder { get; init; }
    public required string Programme { get; init; }
    public required string Site { get; init; }

    /// <summary>Random text that names this document to whoever checks it.</summary>
    public required string DocumentCode { get; init; }

    /// <summary>The absolute address of the public page that checks this code.</summary>
    public required string CheckAddress { get; init; }

    public required IReadOnlyList<SummaryLine> Lines { get; init; }
    public required string Privilege { get; init; }
    public required DateOnly GrantedFrom { get; init; }

    /// <summary>The last day of the grant; null where no end was set, which is printed too.</summary>
    public DateOnly? GrantedUntil { get; init; }

    public required string RulebookName { get; init; }
    public required string RulebookVersion { get; init; }

    /// <summary>The instant, in UTC, up to which scans were counted.</summary>
    public required DateTime AsOf { get; init; }

    public required string SignerName { get; init; }
    public required string SignerRole { get; init; }

    /// <summary>The instant of signing, in UTC.</summary>
    public required DateTime SignedAt { get; init; }

    /// <summary>The IANA name of the zone in which both instants are printed.</summary>
    public required string ZoneId { get; init; }

    /// <summary>What the signature means.</summary>
    public required string Meaning { get; init; }

    /// <summary>Why it was signed though a requirement was not met; null where no reason was asked for.</summary>
    public string? GapReason { get; init; }

    /// <summary>SHA-256 of the sealing certificate, as hexadecimal digits in groups.</summary>
    public required string CertificateFingerprint { get; init; }

    /// <summary>The head of the ledger's chain when this was drawn, printed where it is given.</summary>
    public string? LedgerHead { get; init; }

    public bool IsDemonstration { get; init; }
    public Paper Paper { get; init; }

    internal TimeZoneInfo Zone => TimeZoneInfo.FindSystemTimeZoneById(ZoneId);
    internal string Title => $"Competency summary, {Holder}, {DocumentCode}".Normalize();
}

/// <summary>One application: its counts, and each requirement as what is asked, the value that was found, and whether it is met.</summary>
public sealed record SummaryLine(string Application, int Performed, int Read, int Counted, IReadOnlyList<(string Asked, string Value, bool Met)> Requirements)
{
    /// <summary>How many scans must count; without it no depth row is drawn.</summary>
    public int? Required { get; init; }

    internal IEnumerable<(string Asked, string Value, bool Met)> Unmet => Requirements.Where(r => !r.Met);
}
