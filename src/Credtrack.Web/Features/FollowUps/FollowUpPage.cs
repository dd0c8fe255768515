using Credtrack.Core.FollowUps;
using Credtrack.Core.Readings;
using Credtrack.Web.Features.Scans;

namespace Credtrack.Web.Features.FollowUps;

/// <summary>One discrepancy: between whom, what came of it. The scan itself is one link away.</summary>
public sealed record FollowUpPage(FollowUp FollowUp, string Application, DateTime PerformedAt, string Trainee, string OpenedBy, Result? Result, IReadOnlyList<HistoryLine> History, Person Viewer)
{
    public string? WhyNotClose => FollowUp.WhyNotClose(Viewer);

    public static async Task<FollowUpPage?> Load(CredtrackDb db, Person viewer, Guid id)
    {
        var row = await db.FollowUpsVisibleTo(viewer).AsNoTracking().Where(f => f.Id == id).Select(f => new
        {
            FollowUp = f,
            Application = f.Scan.Application.Name,
            f.Scan.PerformedAt,
            Trainee = f.Scan.Trainee.Name,
            OpenedBy = f.OpenedBy.Name,
            Result = f.Scan.Readings.Where(r => r.ReaderId == f.OpenedById).Select(r => r.Result).FirstOrDefault(),
        }).SingleOrDefaultAsync();
        return row is null ? null : new(row.FollowUp, row.Application, row.PerformedAt, row.Trainee, row.OpenedBy, row.Result, await HistoryLine.Of(db, id), viewer);
    }
}
