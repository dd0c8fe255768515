using Credtrack.Core.Catalogue;

namespace Credtrack.Web.Features.Applications;

public sealed record CataloguePage(IReadOnlyList<Application> Lines, int Page, int All, Person Viewer)
{
    public const int Size = 50;
    public bool HasMore => Page * Size < All;
    public bool IsCoordinator => Viewer.Is(MembershipKind.Coordinator);

    /// <summary>Those that are offered first, then the retired ones.</summary>
    public static async Task<CataloguePage> Load(CredtrackDb db, Person viewer, int page)
    {
        var lines = await db.Applications.AsNoTracking().OrderBy(a => a.RetiredAt != null).ThenBy(a => a.Name).ThenBy(a => a.Code).Skip((page - 1) * Size).Take(Size).ToListAsync();
        return new(lines, page, await db.Applications.CountAsync(), viewer);
    }
}
