using Credtrack.Core.Measures.Standings;

namespace Credtrack.Web.Features.Standings;

public sealed record TraineeLine(Guid Id, string Name, string Programme, Guid ProgrammeId, string? YearGroup, int Met, int Of, int Counting, int Pending);

/// <summary>The trainees of one's programmes by year, fifty a page, each with the standing of today in one line.</summary>
public sealed record TraineesPage(IReadOnlyList<TraineeLine> Lines, int Page, int All)
{
    public const int Size = 50;
    public bool HasMore => Page * Size < All;

    public static async Task<TraineesPage> Load(CredtrackDb db, Me me, int page, DateOnly today)
    {
        var theirs = me.Person.ProgrammesAs(MembershipKind.Reader, MembershipKind.Director, MembershipKind.Coordinator).ToList();
        var trainees = db.People.SelectMany(p => p.Memberships, (p, m) => new { p.Id, p.Name, m.Kind, m.ProgrammeId, Programme = m.Programme.Name, m.YearGroup, m.FirstDay, m.LastDay })
            .Where(t => t.Kind == MembershipKind.Trainee && t.FirstDay <= today && (t.LastDay == null || t.LastDay >= today) && (theirs.Contains(t.ProgrammeId) || t.Id == me.Person.Id));
        var rows = await trainees.OrderBy(t => t.Programme).ThenByDescending(t => t.YearGroup).ThenBy(t => t.Name).Skip((page - 1) * Size).Take(Size).ToListAsync();
        var evidence = await db.EvidenceOf([.. rows.Select(r => r.Id).Distinct()]);
        var rulebooks = await db.Rulebooks.AsNoTracking().Where(r => theirs.Contains(r.ProgrammeId)).ToListAsync();
        var rules = rulebooks.GroupBy(r => r.ProgrammeId).ToDictionary(g => g.Key, g => RulesOf.Read(g.MaxBy(r => r.Edition)!, me.Site));
        var lines = rows.Select(row =>
        {
            var standing = rules.TryGetValue(row.ProgrammeId, out var rule) ? Standing.Of(rule, evidence[row.Id], [], today) : null;
            return new TraineeLine(row.Id, row.Name, row.Programme, row.ProgrammeId, row.YearGroup, standing?.Applications.Count(a => a.Met) ?? 0, standing?.Applications.Count ?? 0,
                standing?.Applications.Sum(a => a.Counted) ?? 0, standing?.Applications.Sum(a => a.Pending) ?? 0);
        });
        return new([.. lines], page, await trainees.CountAsync());
    }
}
