namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>Grey values of an invented body along the beams of its probe, speckled as sound would: by the sum of many small random echoes.</summary>
internal sealed class EchoField
{
    private const int Beams = 256, Samples = 512;
    // Rayleigh-distributed amplitudes on a logarithmic scale of 75 dB: 20 / ln 10 / 75 a natural unit.
    private const double Contrast = 0.116;

    private readonly Sector sector;
    private readonly double reach;
    private readonly float[] grey = new float[Beams * Samples];
    private ulong state;

    public EchoField(InventedBody body, int seed)
    {
        (sector, reach, state) = (body.Sector, body.Sector.At(1, body.Sector.Depth).X, (ulong)seed);
        var (real, imaginary) = (Scatter(), Scatter());
        var patches = Enumerable.Range(0, 64 * 64).Select(_ => Next(0) - 0.5).ToArray();
        for (var beam = 0; beam < Beams; beam++) Trace(body, beam, patches);
        for (var i = 0; i < grey.Length; i++)
        {
            var power = real[i] * real[i] + imaginary[i] * imaginary[i];
            grey[i] += (float)(Contrast * 0.5 * Math.Log(power + 0.002));
        }
    }

    /// <summary>Grey from 0 to 1 at a place in cm, or null outside the sector.</summary>
    public double? At(double x, double y)
    {
        if (Math.Abs(x) > reach || y > sector.Depth) return null;
        var (beam, depth) = sector.Through(x, y);
        var (b, s) = ((beam + 1) / 2 * (Beams - 1), depth / sector.Depth * (Samples - 1));
        if (!(b >= 0 && b < Beams - 1 && s >= 0 && s < Samples - 1)) return null;
        var (i, j) = ((int)b, (int)s);
        var (u, v, at) = ((float)(b - i), (float)(s - j), i * Samples + j);
        var near = grey[at] + (grey[at + 1] - grey[at]) * v;
        var far = grey[at + Samples] + (grey[at + Samples + 1] - grey[at + Samples]) * v;
        return Math.Clamp(near + (far - near) * u, 0, 1);
    }

    private void Trace(InventedBody body, int number, double[] patches)
    {
        var (beam, step, wave) = (number * 2.0 / (Beams - 1) - 1, sector.Depth / (Samples - 1), 30 / sector.Depth);
        var lost = 0.0;
        Span<(double Distance, double Inside, int Asleep)> last = stackalloc (double, double, int)[body.Things.Count];
        // Contact is poorer at the ends of the face.
        var edge = 0.16 * Math.Pow(Math.Abs(beam), 6);
        for (var sample = 0; sample < Samples; sample++)
        {
            var depth = sample * step;
            var (x, y) = sector.At(beam, depth);
            // Nothing in a body is quite straight.
            var bend = Math.Sin(x * wave * 0.4 + y * wave * 0.13 + patches[0] * 6) + 0.5 * Math.Sin(x * wave * 0.9 - y * wave * 0.5 + patches[1] * 6);
            var spot = new Spot(x + 0.25 * bend / wave, y + 0.2 * bend / wave, beam, depth + 0.12 * bend / wave);
            var level = body.Ground + 0.11 * Patch(patches, x * wave / 2, y * wave / 2) + 0.1 * Patch(patches, x * wave * 2 + 9, y * wave * 2 + 5);
            for (var i = 0; i < body.Things.Count; i++)
            {
                var thing = body.Things[i];
                ref var then = ref last[i];
                var rim = 0.0;
                if (then.Asleep-- <= 0)
                {
                    var distance = thing.Distance(spot);
                    var squarely = sample == 0 ? 0 : Math.Min(1, Math.Abs(distance - then.Distance) / step);
                    if (Math.Abs(distance) < 3 * thing.Soft) rim = thing.Rim * squarely * squarely * Math.Exp(-distance * distance / (thing.Soft * thing.Soft));
                    // An edge far away cannot be reached for a while; half the way allows for the bends.
                    then = (distance, Math.Clamp(0.5 - distance / (2 * thing.Soft), 0, 1), (int)((Math.Abs(distance) - 3 * thing.Soft) / (2 * step)));
                }
                if (thing.Level is { } own && then.Inside > 0) level += (own - level) * then.Inside * (own < 0.1 ? 1 : 0.88);
                level += rim;
                lost += thing.Loss * then.Inside * step;
            }
            grey[number * Samples + sample] = (float)(level - Math.Clamp(lost, -0.12, 0.7) - edge - 0.12 * Math.Pow(depth / sector.Depth, 4));
        }
    }

    private static double Patch(double[] patches, double x, double y)
    {
        var (i, j) = ((int)Math.Floor(x), (int)Math.Floor(y));
        var (u, v) = (x - i, y - j);
        (u, v) = (u * u * (3 - 2 * u), v * v * (3 - 2 * v));
        double Value(int a, int b) => patches[(a & 63) * 64 + (b & 63)];
        var (top, bottom) = (Value(i, j) + (Value(i + 1, j) - Value(i, j)) * u, Value(i, j + 1) + (Value(i + 1, j + 1) - Value(i, j + 1)) * u);
        return top + (bottom - top) * v;
    }

    /// <summary>Random scatterers seen through a pulse short in depth and broad across beams; mean power one half.</summary>
    private float[] Scatter()
    {
        var points = new float[Beams * Samples];
        for (var i = 0; i < points.Length; i++) points[i] = (float)(Next(0) + Next(16) - 1);
        return Smooth(Smooth(points, 1, 0.5f), Samples, 0.8f);
    }

    private static float[] Smooth(float[] points, int stride, float share)
    {
        var (smooth, outer) = (new float[points.Length], share * share * 0.6f);
        // Weights are scaled to keep the power; a single uncorrelated sum of two uniforms has variance 1/6.
        var scale = (stride == 1 ? 1 : MathF.Sqrt(3)) / MathF.Sqrt(1 + 2 * share * share + 2 * outer * outer);
        for (var i = 2 * stride; i < points.Length - 2 * stride; i++)
            smooth[i] = scale * (points[i] + share * (points[i - stride] + points[i + stride]) + outer * (points[i - 2 * stride] + points[i + 2 * stride]));
        return smooth;
    }

    // SplitMix64 (Steele, Lea and Flood 2014, OOPSLA): the same on every machine, and quick.
    private double Next(int bits)
    {
        if (bits == 0) state += 0x9E3779B97F4A7C15;
        var mixed = (state ^ state >> 30) * 0xBF58476D1CE4E5B9;
        mixed = (mixed ^ mixed >> 27) * 0x94D049BB133111EB;
        return ((mixed ^ mixed >> 31) >> bits & 0xFFFF) / 65536.0;
    }
}
