namespace Credtrack.Web.Features.Scans.Pictures;

public static class Erasing
{
    /// <summary>
    /// Erases those stills that no scan shows any more; the same picture may lie on another. Called once the removal is saved:
    /// what a crash leaves in between, the next start erases.
    /// </summary>
    public static async Task EraseUnused(this CredtrackDb db, PictureFiles files, IReadOnlyCollection<string> names)
    {
        if (names.Count == 0) return;
        var used = await db.Scans.SelectMany(s => s.Pictures).Where(p => p.RemovedAt == null && names.Contains(p.Sha256)).Select(p => p.Sha256).Distinct().ToListAsync();
        foreach (var unused in names.Except(used)) files.Erase(unused);
    }
}
