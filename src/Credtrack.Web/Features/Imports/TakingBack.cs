using Credtrack.Core;
using Credtrack.Core.Imports;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Features.Imports;

/// <summary>Takes all scans of an import back, with the import's own step, in one transaction.</summary>
public static class TakingBack
{
    private const int Batch = 500;
    private const int MostNamed = 50;

    /// <summary>Scans that were read, changed, added to or signed over since, in words; the first fifty of them. None of what is withdrawn already.</summary>
    public static async Task<IReadOnlyList<(Guid Id, string Words)>> InUse(CredtrackDb db, Guid importId, TimeZoneInfo zone)
    {
        var rows = await db.Scans.IgnoreAutoIncludes().Where(s => s.Imported!.ImportId == importId && s.Withdrawal == null)
            .Select(s => new { s.Id, Application = s.Application.Name, Trainee = s.Trainee.Name, s.PerformedAt, IsRead = s.Readings.Any(r => !r.IsElsewhere), IsChanged = s.Version > 1,
                IsSigned = db.Grants.Any(g => g.HolderId == s.TraineeId && g.ApplicationId == s.ApplicationId && g.Signatures.Any(x => x.At >= s.LoggedAt)) })
            .Where(s => s.IsRead || s.IsChanged || s.IsSigned).OrderBy(s => s.PerformedAt).Take(MostNamed).ToListAsync();
        return [.. rows.Select(r => (r.Id, $"{r.Application} of {r.Trainee}, {r.PerformedAt.PrintedDay(zone)}: {(r.IsRead ? "read here since" : r.IsChanged ? "changed since by its trainee" : "among the evidence of a signature")}"))];
    }

    public static async Task Run(CredtrackDb db, Guid importId, Person by, DateTime at, Action<Import> step)
    {
        await using var transaction = await db.Database.BeginTransactionAsync();
        var ids = await db.ImportedRows.IgnoreAutoIncludes().Where(r => r.ImportId == importId).Select(r => r.ScanId).ToListAsync();
        foreach (var some in ids.Chunk(Batch))
        {
            db.ChangeTracker.Clear();
            var scans = await db.Scans.IgnoreAutoIncludes().Include(s => s.Imported).Include(s => s.Withdrawal).Where(s => some.Contains(s.Id)).ToListAsync();
            RuleBroken.If(scans.Any(s => s.Version > 1 && s.Withdrawal is null) ? "A scan of this import was just read or changed. Look again." : null);
            foreach (var scan in scans) scan.TakeBack(by, at);
            await db.SaveChangesAsync();
        }
        db.ChangeTracker.Clear();
        step(await db.Imports.Include(i => i.File).SingleAsync(i => i.Id == importId));
        await db.SaveChangesAsync();
        await transaction.CommitAsync();
    }
}
