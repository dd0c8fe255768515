using System.Globalization;
using Credtrack.Core.Measures.Standings;

namespace Credtrack.Core.Rulebooks.Requirements;

/// <summary>Where a rulebook may ask for something.</summary>
[Flags]
public enum Place { Application = 1, Group = 2, Overall = 4, Items = 8 }

/// <summary>One thing that a rulebook asks for. A kind is one file here: how it is read, how it is measured, and its words.</summary>
public abstract record Requirement
{
    /// <summary>As the rulebook writes it.</summary>
    public abstract string Kind { get; }

    /// <summary>What is asked, in words.</summary>
    public abstract string Asks { get; }

    /// <summary>What there is of it, with the scans behind the value: the value is their number, or taken from it.</summary>
    public abstract RequirementStanding Measure(Basis basis);

    /// <summary>A value or a bound as people read it.</summary>
    public virtual string Says(double number) => number.ToString(CultureInfo.InvariantCulture);

    /// <summary>What is missing, in words, where it is not met.</summary>
    public abstract string Lacks(RequirementStanding standing);
}
