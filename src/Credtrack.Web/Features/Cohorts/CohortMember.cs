namespace Credtrack.Web.Features.Cohorts;

/// <summary>A trainee of a programme: the latest membership that had begun on a day, with the leaves that were not taken back.</summary>
public sealed record CohortMember
{
    public required Guid PersonId { get; init; }
    public required string Name { get; init; }
    public required Guid ProgrammeId { get; init; }
    public required string? YearGroup { get; init; }
    public required DateOnly FirstDay { get; init; }
    public required DateOnly? LastDay { get; init; }
    public required List<AwayDays> Away { get; init; }

    public bool HasLeft(DateOnly day) => LastDay < day;

    public AwayDays? AwayOn(DateOnly day) => Away.Find(a => a.FirstDay <= day && day <= a.LastDay);

    /// <summary>Those who have left are among them.</summary>
    public static IQueryable<CohortMember> Begun(CredtrackDb db, IReadOnlyCollection<Guid> programmes, DateOnly day) => db.People.AsNoTracking()
        .SelectMany(p => p.Memberships, (Person, Membership) => new { Person, Membership })
        .Where(x => x.Membership.Kind == MembershipKind.Trainee && programmes.Contains(x.Membership.ProgrammeId) && x.Membership.FirstDay <= day
            && !x.Person.Memberships.Any(later => later.Kind == MembershipKind.Trainee && later.ProgrammeId == x.Membership.ProgrammeId && later.FirstDay <= day && later.FirstDay > x.Membership.FirstDay))
        .Select(x => new CohortMember
        {
            PersonId = x.Person.Id,
            Name = x.Person.Name,
            ProgrammeId = x.Membership.ProgrammeId,
            YearGroup = x.Membership.YearGroup,
            FirstDay = x.Membership.FirstDay,
            LastDay = x.Membership.LastDay,
            Away = x.Membership.Leaves.Where(l => l.TakenBackAt == null).Select(l => new AwayDays(l.FirstDay, l.LastDay)).ToList(),
        });

    public static IQueryable<CohortMember> On(CredtrackDb db, IReadOnlyCollection<Guid> programmes, DateOnly day) =>
        Begun(db, programmes, day).Where(m => m.LastDay == null || m.LastDay >= day);
}

/// <summary>Days on which nothing is expected; both ends are part of it.</summary>
public sealed record AwayDays(DateOnly FirstDay, DateOnly LastDay);
