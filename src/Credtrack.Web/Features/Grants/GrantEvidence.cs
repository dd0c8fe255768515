using System.Globalization;
using Credtrack.Core.Grants;
using Credtrack.Core.Measures.Standings;
using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Grants;

/// <summary>What there is on a day for one grant: the text that would be signed, and of each of its requirements, in the same order, the scans behind; null where only the plain number of counting scans is asked for.</summary>
public sealed record GrantEvidence(Grant Grant, string Holder, string Application, string Code, bool IsListed, Statement Statement, IReadOnlyList<RequirementStanding?> Behind)
{
    public static async Task<GrantEvidence> Load(CredtrackDb db, Site site, Grant grant, DateOnly today)
    {
        var names = await db.Grants.Where(g => g.Id == grant.Id)
            .Select(g => new { Holder = g.Holder.Name, Programme = g.Programme.Name, Application = g.Application.Name, g.Application.Code }).SingleAsync();
        var rulebook = await db.RulebookInForce(grant.ProgrammeId);
        var evidence = (await db.EvidenceOf([grant.HolderId]))[grant.HolderId];
        var rules = RulesOf.InForce(rulebook, site);
        var standing = rules is null ? null : Core.Measures.Standings.Standing.Of(rules, evidence, [], today);
        var application = standing?.Applications.FirstOrDefault(a => a.Code == names.Code);
        var findings = standing?.Findings.Where(f => f.Application == names.Code).ToList() ?? [];
        var asked = Asked(standing, application);
        var statement = new Statement(site.Name, names.Holder, grant.HolderId, names.Programme, grant.Privilege, names.Application, today,
            findings.Count, findings.Count(f => f.Seen.IsRead), findings.Count(f => f.Verdict == Verdict.Counts),
            [.. asked.Select(a => a.Said)], rulebook?.Name ?? "none", rulebook?.Edition ?? 0, Statement.Seal(findings)) { Required = application is null ? null : StandingLine.Of(standing!, application, names.Application).Depth?.Required };
        return new(grant, names.Holder, names.Application, names.Code, application is not null, statement, [.. asked.Select(a => a.Behind)]);
    }

    /// <summary>All that bears on this application: its own, those of the groups it belongs to, and those of the whole rulebook.</summary>
    private static List<(Evidenced Said, RequirementStanding? Behind)> Asked(Core.Measures.Standings.Standing? standing, ApplicationStanding? application)
    {
        if (standing is null || application is null) return [(new("a rulebook that lists this application", "none does", false), null)];
        var own = application.Requirements.Select(r => Of(r)).ToList();
        if (own.Count == 0) own.Add((new("a scan that counts", application.Counted.ToString(CultureInfo.InvariantCulture), application.Met), null));
        var groups = standing.Groups.Where(g => g.Rules.Applications.Contains(application.Code)).SelectMany(g => g.Requirements.Select(r => Of(r, $"{g.Name}: ")));
        return [.. own, .. groups, .. standing.Overall.Requirements.Select(r => Of(r))];
    }

    private static (Evidenced Said, RequirementStanding? Behind) Of(RequirementStanding requirement, string whose = "") => (new(whose + requirement.Asks, requirement.Said, requirement.Met), requirement);
}
