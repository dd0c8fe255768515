using System.Globalization;

namespace Credtrack.Core.Rulebooks;

/// <summary>All that a rulebook says, one line for each thing, so that two editions can be held against each other.</summary>
public static class RuleLines
{
    /// <param name="rules">as they were read</param>
    /// <param name="nameOf">the name of an application by its code; the rulebook's own names are lines of their own</param>
    public static IReadOnlyList<string> Of(Rules rules, Func<string, string> nameOf) =>
    [
        $"Called “{rules.Name}”",
        $"Effective {rules.Effective:O}",
        $"Days are those of {rules.Zone.Id}",
        .. rules.Notes is { } notes ? new[] { $"Notes: {notes}" } : [],
        .. rules.Sources.Select(source => $"Source: {source}"),
        rules.OnePerEncounter ? "Of one application, one scan of a patient contact counts" : "Scans of one patient contact all count",
        .. rules.Applications.SelectMany(application => Of(application, nameOf(application.Code))),
        .. rules.Groups.SelectMany(group => group.Require.Select(r => r.Asks).DefaultIfEmpty("nothing is asked").Select(asks => $"{group.Name} ({string.Join(", ", group.Applications.Select(nameOf))}): {asks}")),
        .. rules.Overall.Select(requirement => $"All together: {requirement.Asks}"),
    ];

    private static IEnumerable<string> Of(ApplicationRules application, string name)
    {
        if (application.Name is { } own && own != name) yield return $"{name}: called “{own}”";
        if (application.Privilege is { } privilege) yield return $"{name}: the privilege is “{privilege}”";
        foreach (var asks in application.Require.Select(r => r.Asks).DefaultIfEmpty("a scan that counts")) yield return $"{name}: {asks}";
        yield return $"{name}: a scan counts if it is {application.Counting.Words}";
        if (application.Introductory > 0) yield return string.Create(CultureInfo.InvariantCulture, $"{name}: scans set aside first, {application.Introductory}");
        foreach (var cap in application.Caps) yield return string.Create(CultureInfo.InvariantCulture, $"{name}: {cap.Label} (at most {cap.Max} that are {cap.Where.Words})");
    }
}

/// <summary>What one edition says that the other does not. A line that stands twice is two lines.</summary>
public sealed record RuleDifference(IReadOnlyList<string> Gone, IReadOnlyList<string> New)
{
    public bool IsNone => Gone.Count + New.Count == 0;

    public static RuleDifference Between(IReadOnlyList<string> before, IReadOnlyList<string> after) => new(Without(before, after), Without(after, before));

    private static List<string> Without(IReadOnlyList<string> lines, IReadOnlyList<string> others)
    {
        var left = others.GroupBy(o => o, StringComparer.Ordinal).ToDictionary(g => g.Key, g => g.Count(), StringComparer.Ordinal);
        return [.. lines.Where(line => (left[line] = left.GetValueOrDefault(line) - 1) < 0)];
    }
}
