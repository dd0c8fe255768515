using Credtrack.Core.Rulebooks.Requirements;

namespace Credtrack.Core.Measures.Standings;

/// <summary>How far one requirement is met. What does not apply to its kind is null; a null value means that there is nothing to measure.</summary>
public sealed record RequirementStanding(Requirement Asked, bool Met, double? Value)
{
    public string Kind => Asked.Kind;

    /// <summary>Its own in the standing, by which a page asks for the scans behind it: "application:cardiac:2", "group:1:1", "overall:1".</summary>
    public string Name { get; init; } = "";

    /// <summary>The scans behind the value. A count is their number, a share their part of <see cref="Among"/>; behind a number of applications stand their counting scans.</summary>
    public required IReadOnlyList<SeenScan> Behind { get; init; }

    /// <summary>Of a share, all scans from which it is taken.</summary>
    public IReadOnlyList<SeenScan>? Among { get; init; }
    public double? Min { get; init; }
    public double? Max { get; init; }

    /// <summary>How many more are needed, 0 or more.</summary>
    public double? Missing { get; init; }

    /// <summary>How many scans might still add to the value once they are read.</summary>
    public int? Pending { get; init; }
    public double? Bound { get; init; }

    /// <summary>The denominator.</summary>
    public int? N { get; init; }

    /// <summary>The code of the item.</summary>
    public string? Of { get; init; }
    public double? Limit { get; init; }

    /// <summary>What is asked, in words: "5 positive scans".</summary>
    public string Asks => Asked.Asks;

    /// <summary>The value as people read it.</summary>
    public string Said => Value is { } value ? Asked.Says(value) : "nothing to take it from";

    /// <summary>What is missing, in words: "2 positive scans"; null once it is met.</summary>
    public string? Lacks => Met ? null : Asked.Lacks(this);
}
