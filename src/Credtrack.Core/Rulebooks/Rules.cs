using Credtrack.Core.Rulebooks.Requirements;

namespace Credtrack.Core.Rulebooks;

/// <summary>A site's thresholds as its rulebook's file states them, read and free of faults.</summary>
public sealed record Rules(
    string Name, long Version, DateOnly Effective, TimeZoneInfo Zone, string? Notes, IReadOnlyList<string> Sources, bool OnePerEncounter,
    IReadOnlyList<ApplicationRules> Applications, IReadOnlyList<GroupRules> Groups, IReadOnlyList<Requirement> Overall, IReadOnlyList<Requirement> Items)
{
    public const string Format = "credtrack-rulebook/1";
}

/// <summary>One application's rules. Counting is already laid over the rulebook's; Introductory is the application's own or the rulebook's.</summary>
public sealed record ApplicationRules(
    string Code, string? Name, string? Privilege, Filter Counting, long Introductory, IReadOnlyList<Cap> Caps, IReadOnlyList<Requirement> Require);

/// <summary>At most so many of the counting scans that match go on counting.</summary>
public sealed record Cap(Filter Where, long Max, string Label);

/// <summary>What is asked of several applications together, by their codes.</summary>
public sealed record GroupRules(string Name, IReadOnlyList<string> Applications, IReadOnlyList<Requirement> Require);
