using Credtrack.Core.Rulebooks.Requirements;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Measures.Standings;

/// <summary>What a requirement is measured on: one application's findings, a group's, or those of all listed applications, in order.</summary>
public sealed record Basis(DateOnly AsOf, IReadOnlyList<Finding> Findings)
{
    /// <summary>For overall requirements: what has been found for each application.</summary>
    public IReadOnlyList<ApplicationStanding> Applications { get; init; } = [];

    /// <summary>For items: those dated on or before the day.</summary>
    public IReadOnlyList<ItemEvidence> Items { get; init; } = [];

    public IEnumerable<SeenScan> Counting => Findings.Where(f => f.Verdict == Verdict.Counts).Select(f => f.Seen);

    public IEnumerable<SeenScan> Pending => Findings.Where(f => f.Verdict == Verdict.Pending).Select(f => f.Seen);

    /// <summary>What there is of each requirement, named by the place where it is asked for and its number there.</summary>
    internal IReadOnlyList<RequirementStanding> Measure(string place, IEnumerable<Requirement> asked) =>
        [.. asked.Select((requirement, at) => requirement.Measure(this) with { Name = $"{place}:{at + 1}" })];

    /// <summary>Read scans performed by the trainee, neither duplicate nor introductory, whatever the counting filter says.</summary>
    public IEnumerable<SeenScan> Population => Findings
        .Where(f => f.Seen.IsRead && f.Seen.Evidence.Role == Role.Performed && f.Reason is not (Finding.Duplicate or Finding.Introduction)).Select(f => f.Seen);
}
