using Credtrack.Core.Imports;
using Credtrack.Web.Features.Scans;

namespace Credtrack.Web.Features.Imports;

public sealed class ConfirmationForm
{
    /// <summary>That cells which are missing take the values of the format.</summary>
    public bool Accepted { get; set; }
}

/// <summary>One import: what it will do before it is confirmed, what it did afterwards.</summary>
public sealed record ImportPage(Import Import, Person Viewer, ImportPlan? Plan, int Staged, int? Running, IReadOnlyList<(Guid Id, string Words)> InUse, IReadOnlyList<HistoryLine> History)
{
    public const int Size = 50;

    public ConfirmationForm Form { get; init; } = new();
    public int Page { get; init; } = 1;
    public int FaultPage { get; init; } = 1;
    public string? WhyNotConfirm => Import.WhyNotConfirm(Viewer) ?? Plan?.WhyNot;
    public string? WhyNotMap => Import.WhyNotMap(Viewer);
    public string? WhyNotThrowAway => Import.WhyNotThrowAway(Viewer);
    public string? WhyNotUndo => Import.WhyNotUndo(Viewer, [.. InUse.Select(u => u.Words)]);

    public static async Task<ImportPage?> Load(CredtrackDb db, Me me, TimeProvider clock, LongWork work, Guid id)
    {
        var running = work.PiecesOf(id);
        var imports = db.ImportsVisibleTo(me.Person).AsNoTracking();
        if (await (running is null ? imports.Include(i => i.File) : imports).SingleOrDefaultAsync(i => i.Id == id) is not { } import) return null;
        var staged = await db.ImportedRows.CountAsync(r => r.ImportId == id);
        var inUse = import.State == ImportState.Confirmed ? await TakingBack.InUse(db, id, me.Zone) : [];
        return new(import, me.Person, running is null ? await Planned(db, me.Site, import, me.Person, clock.UtcNow()) : null, staged, running, inUse, await HistoryLine.Of(db, id));
    }

    /// <summary>What the file will do by its mapping; null before there is one, and after it is confirmed, undone or thrown away.</summary>
    public static async Task<ImportPlan?> Planned(CredtrackDb db, Site site, Import import, Person by, DateTime now)
    {
        if (import.State is not (ImportState.Mapped or ImportState.HalfStaged) || SentTable.Read(import.File!.Content!, out _) is not { } table) return null;
        return ImportPlan.Of(table, Mapping.Of(import.Mapping), await ImportGround.Load(db, site, import.Programme, by, now), import.Id);
    }
}
