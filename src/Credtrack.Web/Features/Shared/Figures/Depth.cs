namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>How deep a person stands in one application; all numbers are scans, 0 or more.</summary>
/// <param name="Key">Makes the ids of the drawings, so it is unique on its page and without spaces.</param>
/// <param name="Met">All conditions of the application are met, not only its count: this fills the notch.</param>
/// <param name="OverCap">Scans that are there but do not count, because a cap is reached.</param>
public sealed record Depth(string Key, string Name, int Required, int Counting, int Waiting, int OverCap, bool Met, bool Stalled = false)
{
    public int Missing => Math.Max(0, Required - Counting);

    /// <summary>The figure in words, for those who do not see it.</summary>
    public string Said =>
        $"{Counting} count"
        + (Waiting > 0 ? $", {Waiting} wait for a reading" : "")
        + $", {Required} required, "
        + (Missing > 0 ? $"{Missing} missing" : "count reached")
        + (OverCap > 0 ? $", {OverCap} over a cap do not count" : "")
        + (Stalled ? ". Stalled." : ".");

    /// <summary>The one scale of a chart, so that depths compare by eye: as large as the look has it, smaller where the deepest would not fit.</summary>
    public static DepthUnit UnitFor(IEnumerable<Depth> chart) => DepthUnit.For(chart.Select(d => d.Required).DefaultIfEmpty().Max());
}
