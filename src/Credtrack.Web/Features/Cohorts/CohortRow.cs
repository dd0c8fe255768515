using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Rulebooks;
using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Cohorts;

/// <summary>A trainee with the standing of a day, application by application in the rulebook's order.</summary>
public sealed record CohortRow(CohortMember Who, Standing Standing, IReadOnlyList<StandingLine> Cells, IReadOnlyList<ScanEvidence> Evidence)
{
    public int Met => Cells.Count(c => c.Standing.Met);
    public int Missing => Cells.Sum(c => c.Missing);
    public Standstill Standstill { get; } = Standstill.Of(Standing, Who.FirstDay, Who.Away.Select(a => (a.FirstDay, a.LastDay)));

    /// <summary>Whoever has left, or has nothing more to do, does not stall.</summary>
    public bool Stalls(int days) => Standstill.Days >= days && Met < Cells.Count && !Who.HasLeft(Standing.AsOf);

    public string Address => $"~/standings/{Who.PersonId}?asOf={Standing.AsOf.Iso()}&programme={Who.ProgrammeId}";

    /// <summary>What there was on another day, as known today.</summary>
    public Standing On(DateOnly day) => Standing.Of(Standing.Rules, Evidence, [], day);

    /// <summary>The last day on which a scan counted in this application.</summary>
    public DateOnly? LastCounted(StandingLine cell) => Standing.Findings.Where(f => f.Verdict == Verdict.Counts && f.Application == cell.Code).Max(f => (DateOnly?)f.Seen.Day);

    /// <summary>Three queries, whatever the number of trainees. Those of a programme without a rulebook have no standing.</summary>
    public static async Task<IReadOnlyList<CohortRow>> Load(CredtrackDb db, IReadOnlyCollection<CohortMember> members, IReadOnlyDictionary<Guid, Rules> rules, DateOnly asOf)
    {
        var evidence = await db.EvidenceOf([.. members.Select(m => m.PersonId).Distinct()]);
        var names = await db.Applications.ToDictionaryAsync(a => a.Code, a => a.Name);
        return [.. from member in members
                   where rules.ContainsKey(member.ProgrammeId)
                   let scans = evidence[member.PersonId].ToList()
                   let standing = Standing.Of(rules[member.ProgrammeId], scans, [], asOf)
                   select new CohortRow(member, standing, [.. standing.Applications.Select(a => StandingLine.Of(standing, a, NameOf(a.Rules, names)))], scans)];
    }

    public static string NameOf(ApplicationRules rules, IReadOnlyDictionary<string, string> names) => rules.Name ?? names.GetValueOrDefault(rules.Code, rules.Code);
}
