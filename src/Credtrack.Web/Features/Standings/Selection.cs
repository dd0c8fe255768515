using Credtrack.Core.Measures.Standings;

namespace Credtrack.Web.Features.Standings;

/// <summary>AsOf: the day; Programme: under whose rulebook; the rest picks from the scans: by verdict, application, the requirement behind whose value they stand (Among: from which its share is taken), or whether they are read.</summary>
public sealed record StandingQuery(
    DateOnly? AsOf = null, Guid? Programme = null, Verdict? Verdict = null, string? Application = null, string? Requirement = null, bool Among = false, bool? Read = null, int Page = 1)
{
    /// <summary>What picks, as it stands in an address: "&amp;application=cardiac&amp;verdict=Counts".</summary>
    public string Picks =>
        (Application is null ? "" : $"&application={Uri.EscapeDataString(Application)}") + (Verdict is null ? "" : $"&verdict={Verdict}")
        + (Requirement is null ? "" : $"&requirement={Uri.EscapeDataString(Requirement)}") + (Among ? "&among=true" : "") + (Read is null ? "" : Read.Value ? "&read=true" : "&read=false");
}

/// <summary>The scans that were asked for: how many there are, and those of them that the viewer may find on such a list, fifty a page.</summary>
public sealed record Selection(int All, IReadOnlyList<TraceLine> Lines, RequirementStanding? Requirement, int Page)
{
    public const int Size = 50;

    /// <summary>Logged in other programmes, or not open to the viewer: they are in the number alone.</summary>
    public int Unlisted => All - Lines.Count;
    public IEnumerable<TraceLine> Shown => Lines.Skip((Page - 1) * Size).Take(Size);
    public bool HasMore => Page * Size < Lines.Count;

    public static Selection Of(Standing standing, IReadOnlyList<TraceLine> trace, StandingQuery query)
    {
        var requirement = standing.Requirements.FirstOrDefault(r => r.Name == query.Requirement);
        var behind = (query.Among ? requirement?.Among : requirement?.Behind)?.Select(s => s.Evidence.Scan).ToHashSet(StringComparer.Ordinal);
        var tells = query.Verdict is not null || query.Requirement is not null; // being on such a list would tell what came of a reading
        return new(standing.Findings.Count(Fits), [.. trace.Where(t => Fits(t.Finding) && !(tells && t.IsClosed))], requirement, Math.Clamp(query.Page, 1, 100_000));

        bool Fits(Finding finding) =>
            (query.Verdict ?? finding.Verdict) == finding.Verdict && (query.Application ?? finding.Application) == finding.Application
            && (query.Read ?? finding.Seen.IsRead) == finding.Seen.IsRead && (query.Requirement is null || behind?.Contains(finding.Scan) == true);
    }
}
