namespace Credtrack.Web.Features.Programmes.Memberships;

public enum SignsIn { Yes, Invited, No }

public sealed record MembershipLine(Guid Id, string Name, MembershipKind Kind, string? YearGroup, DateOnly FirstDay, DateOnly? LastDay, bool IsOver, SignsIn SignsIn);

public sealed record MembershipsFilter(MembershipKind? Kind, bool Over = false, int Page = 1);

/// <summary>The people of a programme, a hundred a page: those who are in it or will be, or those who were.</summary>
public sealed record MembershipsPage(Programme Programme, IReadOnlyList<MembershipLine> Lines, MembershipsFilter Filter, int All, string? WhyNotStaff, bool TakesList)
{
    public const int Size = 100;
    public int Page => Math.Clamp(Filter.Page, 1, 10_000);
    public bool HasMore => Page * Size < All;

    public static async Task<MembershipsPage?> Load(CredtrackDb db, Me me, Guid programmeId, MembershipsFilter filter, DateOnly today)
    {
        if (await db.ProgrammesVisibleTo(me.Person, me.Site).AsNoTracking().Find(programmeId) is not { } programme) return null;
        var rows = from person in db.People
                   from m in person.Memberships
                   where m.ProgrammeId == programmeId && (filter.Kind == null || m.Kind == filter.Kind) && (m.LastDay != null && m.LastDay < today) == filter.Over
                   select new { m.Id, person.Name, m.Kind, m.YearGroup, m.FirstDay, m.LastDay, Account = db.Users.Where(a => a.Id == person.Id).Select(a => new { Has = a.PasswordHash != null }).FirstOrDefault() };
        var found = await rows.OrderBy(r => r.Kind).ThenBy(r => r.YearGroup).ThenBy(r => r.Name).Skip((Math.Clamp(filter.Page, 1, 10_000) - 1) * Size).Take(Size).ToListAsync();
        var lines = found.Select(r => new MembershipLine(r.Id, r.Name, r.Kind, r.YearGroup, r.FirstDay, r.LastDay, r.LastDay < today, r.Account is null ? SignsIn.No : r.Account.Has ? SignsIn.Yes : SignsIn.Invited));
        return new(programme, [.. lines], filter, await rows.CountAsync(), programme.WhyNotStaff(me.Person, MembershipKind.Coordinator, me.Site),
            programme.WhyNotStaff(me.Person, MembershipKind.Trainee, me.Site) is null);
    }
}
