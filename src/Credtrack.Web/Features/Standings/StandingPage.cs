using Credtrack.Core.Grants;
using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Rulebooks;

namespace Credtrack.Web.Features.Standings;

/// <summary>A grant that stands or waits, with its sealed paper.</summary>
public sealed record GrantedLine(Guid Id, string Privilege, GrantState State, DateTime? SignedAt, Guid? DocumentId)
{
    public static async Task<IReadOnlyList<GrantedLine>> Load(CredtrackDb db, Person viewer, Guid holderId)
    {
        var rows = await db.GrantsVisibleTo(viewer).AsNoTracking().Where(g => g.HolderId == holderId).OrderByDescending(g => g.ProposedAt).Take(50)
            .Select(g => new { Grant = g, DocumentId = g.Documents.Select(d => (Guid?)d.Id).FirstOrDefault() }).ToListAsync();
        return [.. rows.Select(r => new GrantedLine(r.Grant.Id, r.Grant.Privilege, r.Grant.State, r.Grant.Signature?.At, r.DocumentId))];
    }
}

public sealed record StandingPage(
    Person Trainee, Rulebook? Rulebook, IReadOnlyList<Membership> Programmes, Membership Membership, DateOnly AsOf, DateOnly Today, StandingQuery Query,
    Standing? Standing, IReadOnlyList<StandingLine> Lines, IReadOnlyList<TraceLine> Trace)
{
    public IReadOnlyList<GrantedLine> Grants { get; private init; } = [];

    /// <summary>Whether the viewer may propose a grant from here.</summary>
    public bool Proposes { get; private init; }

    /// <summary>The scans that the query picks; only where there is a standing.</summary>
    public Selection Selected => Selection.Of(Standing!, Trace, Query);

    public string Address => $"~/standings/{Trainee.Id}?asOf={AsOf.Iso()}&programme={Membership.ProgrammeId}";
    public int Counting => Standing!.Findings.Count(f => f.Verdict == Verdict.Counts);
    public int Pending => Standing!.Findings.Count(f => f.Verdict == Verdict.Pending);
    public int Excluded => Standing!.Findings.Count(f => f.Verdict == Verdict.Excluded);

    /// <summary>What would close an application soonest: the fewest scans missing first, then those whose count is reached.</summary>
    public IEnumerable<StandingLine> NearestGaps => Lines.Where(l => !l.Standing.Met).OrderBy(l => l.Missing == 0 ? 1 : l.Missing).ThenBy(l => l.Code, StringComparer.Ordinal).Take(3);

    /// <summary>What is asked of several applications together.</summary>
    public IEnumerable<(string Name, RequirementStanding Requirement)> Together =>
        [.. Standing!.Groups.SelectMany(g => g.Requirements.Select(r => (g.Name, r))), .. Standing.Overall.Requirements.Select(r => ("All together", r))];

    public static async Task<StandingPage?> Load(CredtrackDb db, Me me, Guid personId, StandingQuery query, DateOnly today)
    {
        var trainee = await db.TraineesVisibleTo(me.Person).AsNoTracking().Include(p => p.Memberships).ThenInclude(m => m.Leaves).SingleOrDefaultAsync(p => p.Id == personId);
        if (trainee is null) return null;
        var programmes = trainee.Memberships.Where(m => m.Kind == MembershipKind.Trainee && (personId == me.Person.Id || me.Person.Memberships.Any(mine => mine.ProgrammeId == m.ProgrammeId)))
            .OrderByDescending(m => m.FirstDay).ToList();
        var membership = programmes.Find(m => m.ProgrammeId == query.Programme) ?? programmes[0];
        var (asOf, rulebook) = (Within(query.AsOf ?? today), await db.RulebookInForce(membership.ProgrammeId));
        if (rulebook is null) return new(trainee, null, programmes, membership, asOf, today, query, null, [], []);
        var standing = Standing.Of(RulesOf.Read(rulebook, me.Site), (await db.EvidenceOf([personId]))[personId], [], asOf);
        var names = await db.Applications.ToDictionaryAsync(a => a.Code, a => a.Name);
        var trace = await TraceLine.Load(db, me.Person, personId, standing, names);
        return new(trainee, rulebook, programmes, membership, asOf, today, query, standing,
            [.. standing.Applications.Select(a => StandingLine.Of(standing, a, a.Rules.Name ?? names.GetValueOrDefault(a.Code, a.Code)))],
            trace)
        {
            Grants = await GrantedLine.Load(db, me.Person, personId),
            Proposes = personId != me.Person.Id && me.Person.Is(MembershipKind.Director, membership.ProgrammeId),
        };
    }

    /// <summary>A year that no calendar of scans has would only make the arithmetic of days overflow.</summary>
    public static DateOnly Within(DateOnly day) => day.Year < 1950 ? new(1950, 1, 1) : day.Year > 2200 ? new(2200, 12, 31) : day;
}
