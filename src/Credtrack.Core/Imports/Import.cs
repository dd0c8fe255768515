using System.Security.Cryptography;
using Credtrack.Core.People;

namespace Credtrack.Core.Imports;

public enum ImportStepKind { Confirmed, Undone, ThrownAway }

public enum ImportState { Uploaded, Mapped, HalfStaged, Confirmed, Undone, ThrownAway }

/// <summary>
/// An old log that a coordinator brings in for a programme. Its rows are staged as scans that nobody sees, batch by batch, and become
/// evidence by the one row that says it is confirmed. Whoever uploads the file attests what stands in it.
/// </summary>
public sealed class Import : Recorded
{
    public const int LongestFileName = 200;
    public const int LongestMapping = 200_000;

    /// <summary>Years of a large programme; a longer file is split.</summary>
    public const int MostRows = 100_000;

    private readonly List<ImportStep> steps = [];

    public Guid ProgrammeId { get; private init; }
    public Guid ById { get; private init; }
    public Person By { get; private init; } = null!;
    public Programme Programme { get; private init; } = null!;
    public string FileName { get; private init; } = "";
    public DateTime At { get; private init; }

    /// <summary>What the columns, words, times and people of the file mean, as JSON; the next file of the programme begins with it.</summary>
    public string? Mapping { get; private set; }

    /// <summary>When the first row was staged: from then on the mapping stays.</summary>
    public DateTime? StagedAt { get; private set; }
    public ImportFile? File { get; private init; }
    public IReadOnlyList<ImportStep> Steps => steps;

    private Import() { }

    public ImportState State =>
          Step(ImportStepKind.ThrownAway) is not null ? ImportState.ThrownAway
        : Step(ImportStepKind.Undone) is not null     ? ImportState.Undone
        : Step(ImportStepKind.Confirmed) is not null  ? ImportState.Confirmed
        : StagedAt is not null                        ? ImportState.HalfStaged
        : Mapping is not null                         ? ImportState.Mapped
        :                                               ImportState.Uploaded;

    public ImportStep? Step(ImportStepKind kind) => steps.SingleOrDefault(s => s.Kind == kind);

    public static string? WhyNotUpload(Person by, Programme programme) =>
        by.Is(MembershipKind.Coordinator, programme.Id) ? null : "Only this programme's coordinators import scans.";

    public static Import Upload(Person by, Programme programme, string fileName, byte[] content, DateTime at)
    {
        RuleBroken.If(WhyNotUpload(by, programme));
        var id = Guid.CreateVersion7(at);
        var import = new Import { Id = id, ProgrammeId = programme.Id, ById = by.Id, FileName = fileName.Length > LongestFileName ? fileName[..LongestFileName] : fileName, At = at, File = new ImportFile(id, content) };
        import.Record(new ImportUploaded(by, at, Convert.ToHexStringLower(SHA256.HashData(content))));
        return import;
    }

    public string? WhyNotMap(Person by) =>
          WhyNotHandle(by)
        ?? (by.Id != ById            ? "Only the person who uploaded a file says what stands in it."
        : StagedAt is not null       ? "Rows of this file are staged already; its mapping stays. Take it up again, or throw it away and upload it anew."
        : null);

    public void Map(Person by, string mapping, DateTime at)
    {
        RuleBroken.If(WhyNotMap(by));
        Mapping = mapping;
        Record(new ImportMapped(by, at));
    }

    public string? WhyNotConfirm(Person by) =>
          WhyNotHandle(by)
        ?? (by.Id != ById      ? "Only the person who uploaded a file confirms it: its readings are attested by that person."
        : Mapping is null      ? "Say first what the columns of the file mean."
        : null);

    /// <summary>Begins to stage, or goes on. The mapping now names the people that were enrolled for it.</summary>
    public void Stage(Person by, string mapping, int enrolled, DateTime at)
    {
        RuleBroken.If(WhyNotConfirm(by));
        (StagedAt, Mapping) = (StagedAt ?? at, mapping);
        Record(new ImportStaged(by, at, enrolled));
    }

    /// <summary>The moment at which all staged rows become evidence. What the file held beyond them goes.</summary>
    public void Confirm(Person by, int rows, int assumed, DateTime at)
    {
        RuleBroken.If(WhyNotConfirm(by) ?? (rows == 0 ? "Nothing of this file would be added." : null));
        steps.Add(new ImportStep(this, by, ImportStepKind.Confirmed, at));
        File?.Erase();
        Record(new ImportConfirmed(by, at, rows, assumed));
    }

    public string? WhyNotThrowAway(Person by) => WhyNotHandle(by);

    public void ThrowAway(Person by, DateTime at)
    {
        RuleBroken.If(WhyNotThrowAway(by));
        steps.Add(new ImportStep(this, by, ImportStepKind.ThrownAway, at));
        File?.Erase();
        Record(new ImportThrownAway(by, at));
    }

    /// <param name="inUse">its scans that were read, changed or signed over since, each in words</param>
    public string? WhyNotUndo(Person by, IReadOnlyCollection<string> inUse) =>
          !by.Is(MembershipKind.Coordinator, ProgrammeId) ? "Only this programme's coordinators undo an import."
        : State != ImportState.Confirmed                  ? "Only an import that is confirmed is undone."
        : inUse.Count > 0                                 ? "Scans of this import are in use since, so it is not undone as a whole."
        : null;

    public void Undo(Person by, IReadOnlyCollection<string> inUse, DateTime at)
    {
        RuleBroken.If(WhyNotUndo(by, inUse));
        steps.Add(new ImportStep(this, by, ImportStepKind.Undone, at));
        Record(new ImportUndone(by, at));
    }

    private string? WhyNotHandle(Person by) =>
          !by.Is(MembershipKind.Coordinator, ProgrammeId) ? "Only this programme's coordinators import scans."
        : State switch
        {
            ImportState.Confirmed => "This import is confirmed.",
            ImportState.Undone => "This import is undone.",
            ImportState.ThrownAway => "This import is thrown away.",
            _ => null,
        };
}

/// <summary>A state with who and when, not a flag.</summary>
public sealed class ImportStep
{
    public Guid ImportId { get; private init; }
    public ImportStepKind Kind { get; private init; }
    public Guid ById { get; private init; }
    public Person By { get; private init; } = null!;
    public DateTime At { get; private init; }

    private ImportStep() { }

    internal ImportStep(Import import, Person by, ImportStepKind kind, DateTime at) => (ImportId, ById, Kind, At) = (import.Id, by.Id, kind, at);
}

/// <summary>The file as it was sent. It may hold more than we keep, so it goes as soon as it is not needed.</summary>
public sealed class ImportFile
{
    public Guid ImportId { get; private init; }
    public byte[]? Content { get; private set; }

    private ImportFile() { }

    internal ImportFile(Guid importId, byte[] content) => (ImportId, Content) = (importId, content);

    internal void Erase() => Content = null;
}
