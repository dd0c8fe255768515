using Credtrack.Core.Rulebooks;

namespace Credtrack.Web.Features.Standings;

/// <summary>What was published was read without a fault then; if it no longer is, that is our fault and must be seen.</summary>
public static class RulesOf
{
    public static Rules? InForce(Rulebook? rulebook) => rulebook is null ? null : Read(rulebook);

    public static Rules Read(Rulebook rulebook)
    {
        var faults = RulesReader.Read(rulebook.Text, "UTC", out var rules);
        return rules ?? throw new InvalidOperationException($"Rulebook {rulebook.Id} does not read any more: {faults[0]}");
    }
}
