using Credtrack.Core.Measures.Standings;

namespace Credtrack.Web.Features.Standings;

/// <summary>A value that opens into its scans: on which standing they are found, and behind which requirement they stand.</summary>
public sealed record BehindValue(string Standing, RequirementStanding Requirement)
{
    public string Address => $"{Standing}&requirement={Uri.EscapeDataString(Requirement.Name)}";
}
