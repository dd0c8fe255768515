using Credtrack.Core.Scans;

namespace Credtrack.Web.Features.Scans;

/// <summary>A grant that was signed while a scan, withdrawn since, stood among its evidence. What was signed keeps it.</summary>
public sealed record SignedOver(Guid GrantId, string Privilege, DateTime SignedAt)
{
    public static async Task<IReadOnlyList<SignedOver>> Load(CredtrackDb db, Person viewer, Scan scan)
    {
        if (scan.Withdrawal is not { } withdrawal) return [];
        var (application, since) = (scan.Readings.MinBy(r => r.Number)?.ApplicationId ?? scan.ApplicationId, scan.Submissions.Select(s => s.At).Append(scan.Imported is null ? DateTime.MaxValue : scan.LoggedAt).Min());
        return await db.GrantsVisibleTo(viewer).Where(g => g.HolderId == scan.TraineeId && g.ApplicationId == application)
            .SelectMany(g => g.Signatures.Where(s => s.At >= since && s.At <= withdrawal.At), (g, s) => new { g.Id, g.Privilege, s.At })
            .OrderBy(s => s.At).Take(20).Select(s => new SignedOver(s.Id, s.Privilege, s.At)).ToListAsync();
    }

    /// <summary>How many scans of the evidence were withdrawn after a grant was signed over it.</summary>
    public static Task<int> WithdrawnSince(CredtrackDb db, Guid holderId, Guid applicationId, DateTime signedAt) => db.Scans.CountAsync(s => s.TraineeId == holderId
        && s.Withdrawal!.At >= signedAt && (s.Submissions.Any(x => x.At <= signedAt) || (s.Imported != null && s.LoggedAt <= signedAt))
        && (s.Readings.Any() ? s.Readings.Any(r => r.Number == 1 && r.ApplicationId == applicationId) : s.ApplicationId == applicationId));
}
