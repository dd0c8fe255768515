using Credtrack.Web.Features.Cohorts;
using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Home;

/// <summary>A trainee who meets all that an application asks, with no grant of it open.</summary>
public sealed record ReadyLine(CohortRow Row, StandingLine Application, bool CanPropose);

/// <summary>How the trainees of the programmes that one leads come on: who is ready, who stalls, and what changed within a month.</summary>
public sealed record Progress(IReadOnlyList<ReadyLine> Ready, IReadOnlyList<CohortRow> Stalled, Changes Changes, int LookedAt, int Trainees)
{
    /// <summary>Of how many trainees the standings are taken for this page; what is left out, it says.</summary>
    public const int Most = 240;
    public const int Listed = 10;

    public static async Task<Progress?> Load(CredtrackDb db, Me me, DateOnly today)
    {
        var led = me.Person.ProgrammesAs(MembershipKind.Director, MembershipKind.Coordinator).ToList();
        if (led.Count == 0) return null;
        var trainees = CohortMember.On(db, led, today);
        var all = await trainees.CountAsync();
        var members = await trainees.OrderBy(m => m.Name).ThenBy(m => m.PersonId).ThenBy(m => m.ProgrammeId).Take(Most).ToListAsync();
        var rows = await CohortRow.Load(db, members, await RulesOf.InForce(db, led, me.Site), today);
        var people = members.Select(m => m.PersonId).Distinct().ToList();
        var open = (await db.Grants.Where(g => people.Contains(g.HolderId) && g.IsOpen == true).Select(g => new { g.HolderId, g.ProgrammeId, g.Application.Code }).ToListAsync()).ToHashSet();
        var known = (await db.Applications.Select(a => a.Code).ToListAsync()).ToHashSet();
        var ready = from row in rows
                    from cell in row.Cells
                    where cell.Standing.Met && !open.Contains(new { HolderId = row.Who.PersonId, row.Who.ProgrammeId, cell.Code })
                    select new ReadyLine(row, cell, known.Contains(cell.Code) && row.Who.PersonId != me.Person.Id && me.Person.Is(MembershipKind.Director, row.Who.ProgrammeId));
        return new([.. ready], [.. rows.Where(r => r.Stalls(CohortQuery.UsualDays)).OrderByDescending(r => r.Standstill.Days)],
            await Changes.Load(db, me, led, rows, today), members.Count, all);
    }
}
