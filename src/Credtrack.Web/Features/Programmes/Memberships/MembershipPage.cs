using Credtrack.Web.Features.Scans;

namespace Credtrack.Web.Features.Programmes.Memberships;

/// <summary>One person in one programme: since when, away when, how they sign in, and what was changed.</summary>
public sealed record MembershipPage(Person Person, Membership Membership, Account? Account, string? StandsInFor, IReadOnlyList<HistoryLine> History, string? WhyNotChange, string? WhyNotEnd, bool IsOver)
{
    public IEnumerable<Leave> Leaves => Membership.Leaves.Where(l => l.TakenBackAt is null).OrderBy(l => l.FirstDay);

    public static async Task<MembershipPage?> Load(CredtrackDb db, Me me, Guid programmeId, Guid id, DateOnly today)
    {
        if (await Find(db.People.AsNoTracking(), db, me, programmeId, id) is not { } found) return null;
        var (person, membership) = found;
        var account = await db.Users.AsNoTracking().SingleOrDefaultAsync(a => a.Id == person.Id);
        var absent = membership.StandsInForId is { } other ? await db.People.Where(p => p.Id == other).Select(p => p.Name).SingleAsync() : null;
        return new(person, membership, account, absent, await HistoryLine.Latest(db, person.Id), person.WhyNotAdmit(me.Person, me.Site, membership.Programme, membership.Kind),
            person.WhyNotEnd(me.Person, me.Site, membership, membership.Kind == MembershipKind.Coordinator ? await EditPage.CoordinatorsOf(db, programmeId, today) : [], today), membership.LastDay < today);
    }

    /// <summary>The person whose membership it is, with all memberships, in a programme one may look at.</summary>
    public static async Task<(Person Person, Membership Membership)?> Find(IQueryable<Person> people, CredtrackDb db, Me me, Guid programmeId, Guid id)
    {
        var visible = db.ProgrammesVisibleTo(me.Person, me.Site).Select(p => p.Id);
        var person = await people.Include(p => p.Memberships).ThenInclude(m => m.Leaves).Include(p => p.Invitations).AsSplitQuery()
            .SingleOrDefaultAsync(p => p.Memberships.Any(m => m.Id == id && m.ProgrammeId == programmeId && visible.Contains(m.ProgrammeId)));
        return person is null ? null : (person, person.Memberships.Single(m => m.Id == id));
    }
}
