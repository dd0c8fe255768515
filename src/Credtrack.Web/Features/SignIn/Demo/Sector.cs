namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>Where an invented probe looks. Lengths in cm; y points down from the middle of the probe's face; a beam is numbered -1 (left) to 1.</summary>
/// <param name="Radius">Radius of the curved face; 0 for a straight one.</param>
/// <param name="Half">Half the opening in radians; for a straight face half its width.</param>
/// <param name="Depth">How far it looks.</param>
internal sealed record Sector(double Radius, double Half, double Depth)
{
    // Face and opening of ordinary probes: common practice, no source.
    public static Sector Curved(double depth) => new(5.5, 0.53, depth);
    public static Sector Phased(double depth) => new(0.5, 0.7, depth);
    public static Sector Linear(double width, double depth) => new(0, width / 2, depth);

    /// <summary>The y of the highest point, at the ends of a curved face.</summary>
    public double Top => Radius * (Math.Cos(Half) - 1);

    public (double X, double Y) At(double beam, double depth) => Radius == 0
        ? (beam * Half, depth)
        : ((Radius + depth) * Math.Sin(beam * Half), (Radius + depth) * Math.Cos(beam * Half) - Radius);

    public (double Beam, double Depth) Through(double x, double y) => Radius == 0
        ? (x / Half, y)
        : (Math.Atan2(x, y + Radius) / Half, Math.Sqrt(x * x + (y + Radius) * (y + Radius)) - Radius);
}
