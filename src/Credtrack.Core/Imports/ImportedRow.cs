using System.Security.Cryptography;
using System.Text;
using Credtrack.Core.People;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Imports;

/// <summary>
/// What makes a scan an imported one: where it comes from, who attests it, and what of it was assumed. It carries trainee and importer too,
/// so that the database itself can refuse a row about oneself.
/// </summary>
public sealed class ImportedRow
{
    public const int LongestSource = 100;
    public const int LongestAssumed = 120;

    public Guid ScanId { get; private init; }
    public Guid ImportId { get; private init; }
    public Import Import { get; private init; } = null!;
    public Guid ProgrammeId { get; private init; }
    public Guid TraineeId { get; private init; }
    public Guid AttestedById { get; private init; }
    public Person AttestedBy { get; private init; } = null!;

    /// <summary>The id that the scan had in the file.</summary>
    public string Source { get; private init; } = "";

    /// <summary>Digest of the source id while the row stands, else null: of those the database lets in one alone for a programme.</summary>
    public string? Key { get; private set; }

    /// <summary>The line of the file at which the record began.</summary>
    public int Line { get; private init; }

    /// <summary>As attested; it needs no confirmation by a supervisor.</summary>
    public Supervision Supervision { get; private init; }

    /// <summary>Whether it was read elsewhere; else it waits for its trainee's pictures and answers.</summary>
    public bool IsRead { get; private init; }
    public DateTime? OutcomeAt { get; private init; }
    public Result? OutcomeResult { get; private init; }

    /// <summary>Which cells took a default, in words: "clinical, indicated"; null if none did.</summary>
    public string? Assumed { get; private init; }

    private ImportedRow() { }

    internal ImportedRow(Scan scan, Import import, Person by, ImportEntry entry)
    {
        (ScanId, ImportId, ProgrammeId, TraineeId, AttestedById) = (scan.Id, import.Id, import.ProgrammeId, scan.TraineeId, by.Id);
        (Source, Key, Line, Supervision, IsRead) = (entry.Source, KeyOf(entry.Source), entry.Line, entry.Supervision, entry.Reading is not null);
        (OutcomeAt, OutcomeResult, Assumed) = (entry.Outcome?.At, entry.Outcome?.Result, entry.Assumed);
    }

    /// <summary>Databases compare texts each in its own way; digests they all compare alike.</summary>
    public static string KeyOf(string source) => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(source)));

    internal void LetGo() => Key = null;
}
