using Credtrack.Core.FollowUps;

namespace Credtrack.Web.Features.FollowUps;

public sealed record FollowUpLine(Guid Id, string Application, DateTime PerformedAt, string OpenedBy, DateTime OpenedAt, DateTime? ClosedAt)
{
    public static IQueryable<FollowUpLine> Of(IQueryable<FollowUp> followUps) =>
        followUps.Select(f => new FollowUpLine(f.Id, f.Scan.Application.Name, f.Scan.PerformedAt, f.OpenedBy.Name, f.OpenedAt, f.ClosedAt));
}

/// <summary>Those that are open first, the oldest at the top; then what was closed, the latest first. Fifty a page.</summary>
public sealed record FollowUpsPage(IReadOnlyList<FollowUpLine> Lines, int Page, int Open, int All)
{
    public const int Size = 50;
    public bool HasMore => Page * Size < All;

    public static async Task<FollowUpsPage> Load(CredtrackDb db, Person viewer, int page)
    {
        var visible = db.FollowUpsVisibleTo(viewer).AsNoTracking();
        var (all, open) = (await visible.CountAsync(), await visible.CountAsync(f => f.ClosedAt == null));
        var lines = await FollowUpLine.Of(visible.OrderBy(f => f.ClosedAt == null ? 0 : 1).ThenByDescending(f => f.ClosedAt).ThenBy(f => f.OpenedAt).Skip((page - 1) * Size).Take(Size)).ToListAsync();
        return new(lines, page, open, all);
    }
}
