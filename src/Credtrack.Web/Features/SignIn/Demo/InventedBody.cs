using static Credtrack.Web.Features.SignIn.Demo.Tissue;

namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>An invented piece of body in front of an invented probe. Places and sizes in cm are drawn by eye: nobody's anatomy, no source.</summary>
/// <param name="Ground">Grey between the things, from 0 to 1.</param>
internal sealed record InventedBody(Sector Sector, double Ground, IReadOnlyList<Tissue> Things)
{
    public static InventedBody Of(InventedTheme theme, Random chance) => theme switch
    {
        InventedTheme.Abdomen => Abdomen(chance),
        InventedTheme.Heart => Heart(chance),
        InventedTheme.Lung => Lung(chance),
        InventedTheme.Vessels => Vessels(chance),
        InventedTheme.SoftTissue => SoftTissue(chance),
        _ => throw new ArgumentOutOfRangeException(nameof(theme))
    };

    private static InventedBody Abdomen(Random chance)
    {
        var (x, y, tilt) = (Between(chance, 2.2, 3.8), Between(chance, 8.2, 9.6), Between(chance, 0.25, 0.6));
        var (fluid, bladder) = (Math.Max(0, Between(chance, -0.3, 0.6)), chance.Next(3) == 0);
        List<Tissue> things =
        [
            new(Ellipse(-2.5, 1.5, 9.5, Between(chance, 10.2, 11.4), 0.1), null, 0.5, Soft: 0.12),
            new(s => -Ellipse(-2.5, 1.5, 9.6, 11.4, 0.1)(s), 0.27, Soft: 0.3),
            .. from _ in Enumerable.Range(0, chance.Next(2, 5))
               let size = Between(chance, 0.25, 0.55)
               select new Tissue(Ellipse(Between(chance, -5, bladder ? -2.6 : 1), Between(chance, 3.4, 7.5), size * Between(chance, 1, 2.4), size, Between(chance, -0.6, 0.6)), 0.04, 0.16, -0.03)
        ];
        if (bladder) things.Add(new(Ellipse(Between(chance, -0.6, 0.4), Between(chance, 4.2, 5), Between(chance, 0.8, 1.1), Between(chance, 1.6, 2), 0.5), 0.02, 0.25, -0.05));
        if (fluid > 0.1) things.Add(new(Ellipse(x - fluid, y - fluid * 0.9, 3.7, 2.2, tilt), 0.02, 0.12, -0.03));
        things.AddRange(
        [
            new(Ellipse(x, y, 3.7, 2.1, tilt), 0.37, 0.3),
            .. from i in Enumerable.Range(-2, 5) select new Tissue(Ellipse(x + i * 1.05 * Math.Cos(tilt) + 0.9 * Math.Sin(tilt), y + i * 1.05 * Math.Sin(tilt) - 0.95, 0.36, 0.42), 0.27, Soft: 0.2),
            new(Ellipse(x, y, 2.2, 0.75, tilt), 0.68, Soft: 0.35),
            .. Wall(1.7)
        ]);
        return new(Sector.Curved(Between(chance, 14, 16)), 0.47, things);
    }

    private static InventedBody Heart(Random chance)
    {
        var (size, lean, effusion) = (Between(chance, 0.9, 1.08), Between(chance, -0.18, 0.18), Math.Max(0, Between(chance, -0.6, 0.8)));
        var (left, right, leaf) = (Between(chance, 0.9, 1.15), Between(chance, 0.85, 1.2), Between(chance, -0.2, 1.1));
        var (sin, cos) = Math.SinCos(lean);
        // The heart lies in its own frame, leaning about its tip.
        Func<Spot, double> Leaning(Func<Spot, double> shape) => s =>
        {
            var (u, v) = (s.X / size, (s.Y - 2.2) / size);
            return size * shape(s with { X = u * cos + v * sin, Y = v * cos - u * sin + 2.2 });
        };
        List<Tissue> things = [];
        if (effusion > 0.1) things.Add(new(Leaning(Ellipse(0, 8, 4.9 + effusion, 6.3 + effusion)), 0.03, 0.45, -0.02));
        things.AddRange(
        [
            new(Leaning(Ellipse(0, 8, 4.9, 6.3)), 0.44, 0.34, Soft: 0.14),
            new(Leaning(Ellipse(2, 6.7, 1.75 * left, 3.5, -0.13)), 0.03, 0.2, -0.02, 0.16),
            new(Leaning(Ellipse(-2.15, 7.3, 1.25 * right, 2.7, 0.24)), 0.04, 0.2, -0.02, 0.16),
            new(Leaning(Ellipse(2, 12, 1.75, 1.45)), 0.03, 0.24, -0.02, 0.14),
            new(Leaning(Ellipse(-1.9, 11.9, 1.6, 1.4)), 0.04, 0.24, -0.02, 0.14),
            new(Leaning(Ellipse(2, 10.3, 1.15, 0.7)), 0.03, Soft: 0.2),
            new(Leaning(Ellipse(-2, 10.2, 0.95, 0.7)), 0.04, Soft: 0.2),
            new(Leaning(Segment(0.5, 10.4, 1.7 - leaf * 0.5, 10.3 - leaf, 0.16)), 0.72, Soft: 0.1),
            new(Leaning(Segment(3.5, 10.4, 2.2 + leaf * 0.6, 10.3 - leaf, 0.16)), 0.72, Soft: 0.1),
            new(Leaning(Segment(-0.5, 10.1, -1.6 + leaf * 0.4, 10.1 - leaf * 0.8, 0.14)), 0.66, Soft: 0.1),
            new(Leaning(Segment(-3.4, 10.2, -2.2 - leaf * 0.4, 10.1 - leaf * 0.8, 0.14)), 0.66, Soft: 0.1),
            .. Wall(1.2)
        ]);
        return new(Sector.Phased(Between(chance, 15, 17)), 0.29, things);
    }

    private static InventedBody Lung(Random chance)
    {
        var (straight, pleura) = (chance.Next(2) == 0, Between(chance, 1.5, 2.3));
        var sector = straight ? Sector.Linear(5.4, Between(chance, 5, 6)) : Sector.Curved(Between(chance, 9, 12));
        var streaks = chance.Next(0, 5);
        List<Tissue> things = [.. Wall(pleura - 0.25), new(s => pleura - s.Depth, 0.3, Loss: 0.012), new(Layer(pleura - 0.05, pleura + 0.05), 0.98, Soft: 0.08)];
        for (var i = 2; i < 5; i++) things.Add(new(Layer(i * pleura - 0.03, i * pleura + 0.03), 0.3 + (streaks > 2 ? 0.1 : 0.42) / (i - 1), Soft: 0.08));
        for (var i = 0; i < streaks; i++) things.Add(new(Streak(Between(chance, -0.45, 0.45), Between(chance, 0.004, 0.025), pleura), 0.66, Soft: 0.09));
        var apart = Between(chance, 0.66, 0.8) * (straight ? sector.Half : 3.6);
        foreach (var x in (double[])[-apart, apart + Between(chance, -0.3, 0.3)])
        {
            var y = sector.At(x / (straight ? sector.Half : 5.5 * sector.Half), pleura - 0.62).Y;
            things.Add(new(Ellipse(x, y, straight ? 0.6 : 0.7, 0.26, x * (straight ? 0 : -0.12)), 0.36, 0.62, 2.4, 0.08));
        }
        return new(sector, 0.42, things);
    }

    private static InventedBody Vessels(Random chance)
    {
        var side = chance.Next(2) * 2 - 1;
        var (x, y, r) = (side * Between(chance, 0.25, 0.7), Between(chance, 1.9, 2.5), Between(chance, 0.3, 0.44));
        var (vx, vy) = (x - side * Between(chance, 0.95, 1.25), y - Between(chance, 0.1, 0.5));
        return new(Sector.Linear(5, Between(chance, 3.8, 4.6)), 0.4,
        [
            new(Layer(0.95, 1.55), 0.33), new(Fibres(0.95, 1.55, 0.05, 0.16, 0.03), 0.52, Soft: 0.04), new(Fibres(1.6, 5, Between(chance, -0.1, 0.1), 0.42, 0.05), 0.52, Soft: 0.1),
            new(Ellipse(x, y, r * 1.25, r * 1.25), 0.5, Soft: 0.1), new(Ellipse(x, y, r, r), 0.02, 0.5, -0.16, 0.05),
            new(Ellipse(vx, vy, Between(chance, 0.45, 0.7), Between(chance, 0.2, 0.45), Between(chance, -0.25, 0.25)), 0.03, 0.26, -0.14, 0.05),
            new(Ellipse(x + side * 0.75, y + 0.35, 0.32, 0.17), 0.66, 0.1, Soft: 0.08), new(Ellipse(x + side * 0.68, y + 0.33, 0.05, 0.05), 0.3, Soft: 0.05), new(Ellipse(x + side * 0.83, y + 0.38, 0.06, 0.05), 0.3, Soft: 0.05),
            .. Wall(0.9)
        ]);
    }

    private static InventedBody SoftTissue(Random chance)
    {
        var (fascia, bone, slope) = (Between(chance, 0.9, 1.3), Between(chance, 2.7, 3.4), Between(chance, -0.25, 0.25));
        List<Tissue> things =
        [
            new(Layer(fascia, bone), 0.34), new(Fibres(fascia + 0.05, bone - 0.1, slope, 0.2, 0.035), 0.56, Soft: 0.05),
            new(Layer(fascia - 0.03, fascia + 0.03), 0.86, Soft: 0.05), new(Layer(bone - 0.65, bone - 0.61), 0.7, Soft: 0.05)
        ];
        things.AddRange([new(Ellipse(Between(chance, -1.2, 1.2), bone + 6, 7, 6), 0.12, 0.85, 0.9, 0.07), .. Wall(fascia - 0.1)]);
        if (chance.Next(2) == 0) things.Add(new(Ellipse(Between(chance, -1, 1), fascia - Between(chance, 0.1, 0.35), Between(chance, 0.5, 1), Between(chance, 0.22, 0.34), Between(chance, -0.15, 0.15)), 0.09, 0.16, -0.12, 0.1));
        return new(Sector.Linear(4.8, Between(chance, 3.6, 4.2)), 0.4, things);
    }

    /// <summary>Skin and the layers under it, down to that depth.</summary>
    private static IEnumerable<Tissue> Wall(double depth) =>
    [
        new(Fibres(depth * 0.25, depth, 0.06, depth * 0.3, depth * 0.03), 0.6, Soft: 0.06),
        new(Layer(depth - 0.04, depth + 0.02), 0.68, Soft: 0.06),
        new(Layer(-1, depth * 0.14), 0.7, Soft: 0.06)
    ];

    private static double Between(Random chance, double least, double most) => least + chance.NextDouble() * (most - least);
}
