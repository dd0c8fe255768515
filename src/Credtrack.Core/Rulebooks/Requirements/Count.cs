using Credtrack.Core.Measures.Standings;

namespace Credtrack.Core.Rulebooks.Requirements;

/// <summary>A number of counting scans, of those that match <paramref name="Where"/> if it is given. The target is a goal for display only.</summary>
public sealed record Count(long Min, long? Target, Filter? Where, bool Overall) : Requirement
{
    private static readonly Filter Any = new([]);

    public override string Kind => "count";

    public override string Asks =>
        (Where ?? Any).Scans(Min) + (Overall ? " in all applications" : "") + (Target is { } target ? FormattableString.Invariant($" (goal {target})") : "");

    public override RequirementStanding Measure(Basis basis)
    {
        var behind = basis.Counting.Where(scan => Where?.Matches(scan) ?? true).ToList();
        var possible = basis.Pending.Count(scan => Where?.MayMatch(scan) ?? true);
        return new(this, behind.Count >= Min, behind.Count) { Behind = behind, Min = Min, Missing = Math.Max(0, Min - behind.Count), Pending = possible };
    }

    public override string Lacks(RequirementStanding standing) => (Where ?? Any).Scans(standing.Missing ?? 0);

    internal static Count Read(JsonPart part, Place place)
    {
        var keys = part.Keys(["kind", "min", "target", "where", "within", "recent"]);
        foreach (var span in new[] { "within", "recent" })
            if (keys[span] is not null) keys.Fault(span, $"'{span}' is not evaluated by this version; expected a count without it");
        var where = keys["where"] is { } filter ? FilterReader.Read(filter) : null;
        return new(keys.Required("min")?.Whole(0) ?? 0, keys["target"]?.Whole(0), where, place == Place.Overall);
    }
}
