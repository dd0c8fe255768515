namespace Credtrack.Web.Features.Scans.Pictures;

/// <summary>Pictures that came with a form which was never finished belong to no scan; they do not stay, nor do removed ones whose erasure a crash cut off.</summary>
public sealed class AbandonedPictures(CredtrackDb db, PictureFiles files, TimeProvider clock)
{
    // A form that comes back after a day has to bring its pictures again.
    private static readonly TimeSpan LongestForm = TimeSpan.FromDays(1);

    public async Task Run(CancellationToken stop)
    {
        var before = clock.UtcNow() - LongestForm;
        var removed = await db.Scans.SelectMany(s => s.Pictures).Where(p => p.RemovedAt >= before).Select(p => p.Sha256).Distinct().ToListAsync(stop);
        foreach (var some in files.OlderThan(before).Concat(removed).Chunk(500)) await db.EraseUnused(files, some);
    }
}
