using Credtrack.Core.Catalogue;
using Credtrack.Web.Features.Scans;

namespace Credtrack.Web.Features.Applications;

public sealed record ApplicationPage(Application Application, string? RetiredBy, string? WhyNotBringBack, IReadOnlyList<HistoryLine> History, Person Viewer)
{
    public bool IsCoordinator => Viewer.Is(MembershipKind.Coordinator);

    public static async Task<ApplicationPage?> Load(CredtrackDb db, Person viewer, Guid id)
    {
        var row = await db.Applications.AsNoTracking().Where(a => a.Id == id)
            .Select(a => new { Application = a, RetiredBy = db.People.Where(p => p.Id == a.RetiredById).Select(p => p.Name).FirstOrDefault() }).SingleOrDefaultAsync();
        if (row is null) return null;
        var others = row.Application.IsRetired ? await db.Applications.AsNoTracking().Where(a => a.RetiredAt == null).ToListAsync() : [];
        return new(row.Application, row.RetiredBy, row.Application.WhyNotBringBack(viewer, others), await HistoryLine.Of(db, id), viewer);
    }
}
