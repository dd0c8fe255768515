namespace Credtrack.Web.Features.Programmes;

public sealed record ProgrammeLine(Guid Id, string Name, int Trainees, int Readers, string Coordinators);

/// <summary>The programmes whose people one may look at, fifty a page, with who is in them today.</summary>
public sealed record ProgrammesPage(IReadOnlyList<ProgrammeLine> Lines, int Page, int All)
{
    public const int Size = 50;
    public bool HasMore => Page * Size < All;

    public static async Task<ProgrammesPage> Load(CredtrackDb db, Me me, DateOnly today, int page)
    {
        var visible = db.ProgrammesVisibleTo(me.Person, me.Site).AsNoTracking();
        var programmes = await visible.OrderBy(p => p.Name).Skip((page - 1) * Size).Take(Size).ToListAsync();
        var ids = programmes.Select(p => p.Id).ToList();
        var current = db.People.SelectMany(p => p.Memberships, (p, m) => new { p.Name, m.Kind, m.ProgrammeId, m.FirstDay, m.LastDay }).Where(m => ids.Contains(m.ProgrammeId) && m.FirstDay <= today && (m.LastDay == null || m.LastDay >= today));
        var numbers = await current.GroupBy(m => new { m.ProgrammeId, m.Kind }).Select(g => new { g.Key, Number = g.Count() }).ToListAsync();
        var coordinators = (await current.Where(m => m.Kind == MembershipKind.Coordinator).OrderBy(m => m.Name).Take(500).ToListAsync()).ToLookup(m => m.ProgrammeId, m => m.Name);
        return new([.. programmes.Select(p => new ProgrammeLine(p.Id, p.Name, Number(p.Id, MembershipKind.Trainee), Number(p.Id, MembershipKind.Reader), string.Join(", ", coordinators[p.Id])))], page, await visible.CountAsync());

        int Number(Guid programme, MembershipKind kind) => numbers.SingleOrDefault(n => n.Key.ProgrammeId == programme && n.Key.Kind == kind)?.Number ?? 0;
    }
}
