using System.Globalization;
using Credtrack.Core.Measures.Standings;

namespace Credtrack.Core.Rulebooks.Requirements;

/// <summary>The share of the counting scans that match, of those that match <paramref name="Of"/> if it is given. Bounds are 0 to 1, inclusive.</summary>
public sealed record Share(Filter Where, Filter? Of, double? Min, double? Max) : Requirement
{
    public override string Kind => "share";

    public override string Asks => (Min, Max) switch
    {
        ({ } min, null) => $"at least {Percent(min)} {Whose}",
        (null, { } max) => $"at most {Percent(max)} {Whose}",
        var (min, max) => $"{Percent(min)} to {Percent(max)} {Whose}",
    };

    private string Whose => Of is null ? Where.Words : $"{Where.Words}, among {Of.Phrase("scans")}";

    public override RequirementStanding Measure(Basis basis)
    {
        var all = basis.Counting.Where(scan => Of?.Matches(scan) ?? true).ToList();
        var behind = all.Where(Where.Matches).ToList();
        double? value = all.Count == 0 ? null : (double)behind.Count / all.Count;
        // Without a value a lower bound does not hold and an upper one does.
        var met = (Min is null || value >= Min) && (Max is null || value is null || value <= Max);
        return new(this, met, value) { Behind = behind, Among = all, Min = Min, Max = Max, N = all.Count };
    }

    public override string Lacks(RequirementStanding standing) =>
        standing.Value is null ? $"{Asks}; no scan to take it from yet" : $"{Asks}; {Percent(standing.Value)} so far";

    public override string Says(double number) => Percent(number);

    private static string Percent(double? share) => (share * 100)?.ToString("0.##", CultureInfo.InvariantCulture) + " %";

    internal static Share Read(JsonPart part)
    {
        var keys = part.Keys(["kind", "where", "of", "min", "max"]);
        var where = keys.Required("where") is { } filter ? FilterReader.Read(filter) : new([]);
        var of = keys["of"] is { } among ? FilterReader.Read(among) : null;
        var (min, max) = (keys["min"]?.Number(0, 1), keys["max"]?.Number(0, 1));
        if (!keys.Has("min") && !keys.Has("max")) part.Fault("expected min, max or both");
        if (min > max) keys.Fault("min", "expected min at most max");
        return new(where, of, min, max);
    }
}
