namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>The fills and marks that states and legends share with the depth column; the word beside one says what it means there.</summary>
public enum SwatchKind
{
    Solid,
    Hatch,
    None,
    Draft,
    Over,
    Track,
    Met,
    Unmet,
    Stall,
    Back,
    Gone,
    Shadow,
    Ticks,
}
