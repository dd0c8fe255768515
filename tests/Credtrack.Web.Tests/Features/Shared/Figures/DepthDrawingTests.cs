using System.Xml.Linq;
using Credtrack.Web.Features.Shared.Figures;

namespace Credtrack.Web.Tests.Features.Shared.Figures;

public sealed class DepthDrawingTests
{
    public static TheoryData<string> Drawings => [.. Sketched.Lines("drawings.txt").Select(line => string.Join(" | ", line))];

    [Theory, MemberData(nameof(Drawings))]
    public void A_figure_is_drawn_as_the_sketch_has_it(string line)
    {
        var (depth, kind, svg) = Sketched.Drawing(line.Split(" | "));
        var unit = Depth.UnitFor([depth]);
        Assert.Equal(svg, kind switch
        {
            "column" => DepthDrawing.Column(depth, unit),
            "row" => DepthDrawing.Row(depth, unit),
            "cell" => CellDrawing.Of(depth),
            _ => ShortDrawing.Of(depth),
        });
    }

    [Fact]
    public void Nothing_is_drawn_outside_whatever_the_numbers()
    {
        var chance = new Random(20260301);
        for (var n = 0; n < 3000; n++)
        {
            var depth = Any(chance);
            // A chart may be deeper than this one of its columns.
            var unit = DepthUnit.For(Math.Max(depth.Required, chance.Next(2) * chance.Next(601)));
            foreach (var svg in new[] { DepthDrawing.Column(depth, unit), DepthDrawing.Row(depth, unit), ShortDrawing.Of(depth), CellDrawing.Of(depth) })
            {
                var canvas = Canvas.Of(svg);
                var outside = canvas.Places.Where(p => p.X < 0 || p.Y < 0 || p.X > canvas.Width || p.Y > canvas.Height).ToList();
                Assert.True(outside.Count == 0, $"{depth}, {unit}: {string.Join(", ", outside)}");
            }
        }
    }

    [Fact]
    public void A_chart_has_unique_ids_and_each_figure_a_title_and_a_description()
    {
        var depths = Sketched.Lines("drawings.txt").Select(line => Sketched.Drawing(line).Depth).Distinct().ToList();
        var unit = Depth.UnitFor(depths);
        var figures = depths.SelectMany(d => new[] { (d, DepthDrawing.Column(d, unit)), (d, DepthDrawing.Row(d, unit)) }).ToList();
        var ids = figures.SelectMany(f => XElement.Parse(f.Item2).DescendantsAndSelf().Attributes("id")).Select(i => i.Value).ToList();
        Assert.Equal(4 * depths.Count, ids.Distinct().Count());
        Assert.Equal(ids.Count, ids.Distinct().Count());
        Assert.All(figures, f =>
        {
            var svg = XElement.Parse(f.Item2);
            Assert.Equal([f.d.Name, f.d.Said], ((string)svg.Attribute("aria-labelledby")!).Split(' ').Select(id => svg.Elements().Single(e => (string?)e.Attribute("id") == id).Value));
            Assert.DoesNotMatch(@"\sstyle=", f.Item2);
        });
    }

    [Fact]
    public void What_is_far_beyond_the_drawing_is_cut()
    {
        var depth = new Depth("k", "Lung", 25, 30, 0, 0, Met: true);
        Assert.DoesNotContain("fig-cut", DepthDrawing.Column(depth, Depth.UnitFor([depth])), StringComparison.Ordinal);
        Assert.Contains("fig-cut", DepthDrawing.Column(depth with { Counting = 31 }, Depth.UnitFor([depth])), StringComparison.Ordinal);
    }

    [Fact]
    public void A_column_of_which_nothing_is_required_has_a_notch_at_the_skin_and_a_number_under_it()
    {
        var depth = new Depth("k", "Lung", 0, 0, 0, 0, Met: true);
        var svg = XElement.Parse(DepthDrawing.Column(depth, Depth.UnitFor([depth])));
        Assert.Equal("M32 3L40 0L40 8Z", (string?)Assert.Single(svg.Elements("path"), p => (string?)p.Attribute("class") == "fig-notch").Attribute("d"));
        Assert.Equal(("0", "13.5"), (svg.Element("text")!.Value, (string?)svg.Element("text")!.Attribute("y")));
        Assert.Equal("0 count, 0 required, count reached.", depth.Said);
    }

    private static Depth Any(Random chance) =>
        new("k", "Any", chance.Next(601), chance.Next(801), Few(chance), Few(chance), chance.Next(2) == 0, chance.Next(3) == 0);

    private static int Few(Random chance) => chance.Next(2) * chance.Next(200);
}
