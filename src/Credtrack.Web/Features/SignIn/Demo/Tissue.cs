namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>A place in the invented body, in cm, and the beam (-1 to 1) and depth that reach it.</summary>
internal readonly record struct Spot(double X, double Y, double Beam, double Depth);

/// <summary>Something in the invented body.</summary>
/// <param name="Distance">Distance to its edge in cm, negative inside.</param>
/// <param name="Level">Grey inside, from 0 (black) to 1; null leaves what is there.</param>
/// <param name="Rim">Grey added along the edge where the beam meets it squarely.</param>
/// <param name="Loss">Grey lost behind it per cm crossed; negative behind fluid.</param>
/// <param name="Soft">Width of the edge in cm.</param>
internal sealed record Tissue(Func<Spot, double> Distance, double? Level, double Rim = 0, double Loss = 0, double Soft = 0.06)
{
    public static Func<Spot, double> Ellipse(double x, double y, double rx, double ry, double tilt = 0)
    {
        var (sin, cos) = Math.SinCos(tilt);
        return s =>
        {
            var (u, v) = (((s.X - x) * cos + (s.Y - y) * sin) / rx, ((s.Y - y) * cos - (s.X - x) * sin) / ry);
            return (Math.Sqrt(u * u + v * v) - 1) * Math.Min(rx, ry);
        };
    }

    /// <summary>A straight piece of that thickness between two points.</summary>
    public static Func<Spot, double> Segment(double x1, double y1, double x2, double y2, double thickness)
    {
        var (dx, dy) = (x2 - x1, y2 - y1);
        return s =>
        {
            var along = Math.Clamp(((s.X - x1) * dx + (s.Y - y1) * dy) / (dx * dx + dy * dy), 0, 1);
            var (u, v) = (s.X - x1 - along * dx, s.Y - y1 - along * dy);
            return Math.Sqrt(u * u + v * v) - thickness / 2;
        };
    }

    /// <summary>A layer that follows the probe's face.</summary>
    public static Func<Spot, double> Layer(double from, double to) => s => Math.Max(from - s.Depth, s.Depth - to);

    /// <summary>Parallel fibres inside a layer, rising by the slope.</summary>
    public static Func<Spot, double> Fibres(double from, double to, double slope, double period, double thickness) => s =>
    {
        var across = (s.Depth + slope * s.X + 0.3 * period * Math.Sin(s.X * 2.1 + s.Depth)) / period;
        var nearest = Math.Abs(across - Math.Round(across)) * period - thickness / 2;
        return Math.Max(nearest, Math.Max(from - s.Depth, s.Depth - to));
    };

    /// <summary>A streak along the beams, from a depth on.</summary>
    public static Func<Spot, double> Streak(double beam, double halfWidth, double from) => s =>
        Math.Max((Math.Abs(s.Beam - beam) - halfWidth) * 3, from - s.Depth);
}
