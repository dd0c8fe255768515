using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Cohorts;

/// <summary>Which trainees were asked for, of a programme whose cohort the viewer may see. The sheet and its file ask alike.</summary>
public sealed record CohortFilter(CohortQuery Query, Programme Programme, IQueryable<CohortMember> Begun)
{
    public IQueryable<CohortMember> Shown
    {
        get
        {
            var (day, year, former) = (Query.AsOf, Query.Year, Query.Former);
            var kept = former ? Begun : Begun.Where(m => m.LastDay == null || m.LastDay >= day);
            return year is null ? kept : kept.Where(m => m.YearGroup == year);
        }
    }

    public IQueryable<CohortMember> Ordered => Shown.OrderByDescending(m => m.YearGroup).ThenBy(m => m.Name).ThenBy(m => m.PersonId);

    public static CohortFilter? Of(CredtrackDb db, Person viewer, CohortQuery asked, DateOnly today)
    {
        var programmes = viewer.CohortsVisible();
        var programme = asked.Programme is { } id ? programmes.FirstOrDefault(p => p.Id == id) : programmes is [var first, ..] ? first : null;
        if (programme is null) return null;
        var day = StandingPage.Within(asked.AsOf ?? today);
        return new(asked.Bounded() with { AsOf = day, Programme = programme.Id }, programme, CohortMember.Begun(db, [programme.Id], day));
    }
}
