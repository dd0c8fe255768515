using Credtrack.Web.Features.Shared.Figures;

namespace Credtrack.Web.Tests.Features.Shared.Figures;

public sealed class DepthUnitTests
{
    // The unit, the width of a row and the ticks of small charts are those of our look; the others are computed by hand.
    [Theory]
    [InlineData(0, 6, 5, 5, 25)]
    [InlineData(50, 6, 5, 5, 25)]
    [InlineData(60, 6, 250.0 / 60, 5, 25)]
    [InlineData(120, 3, 250.0 / 120, 5, 25)]
    [InlineData(156, 360.0 / 156, 250.0 / 156, 5, 25)]
    [InlineData(157, 360.0 / 157, 250.0 / 157, 25, 100)]
    [InlineData(500, .72, .5, 25, 100)]
    [InlineData(1000, .36, .241, 100, 500)]
    [InlineData(100_000, .0036, .00223, 500, 2500)]
    public void A_chart_shrinks_so_that_its_deepest_fits(int deepest, double column, double row, int tick, int longTick)
    {
        var unit = DepthUnit.For(deepest);
        Assert.Equal(column, unit.Column, 1e-9);
        Assert.Equal(row, unit.Row, 1e-9);
        Assert.Equal((tick, longTick), (unit.Tick, unit.LongTick));
    }

    [Fact]
    public void All_columns_of_a_chart_share_the_unit_of_the_deepest()
    {
        Depth[] chart = [Of(10), Of(500), Of(25)];
        Assert.Equal(DepthUnit.For(500), Depth.UnitFor(chart));
        Assert.Equal(DepthUnit.For(0), Depth.UnitFor([]));
        Assert.All(chart, d => Assert.InRange(Canvas.Of(DepthDrawing.Column(d, Depth.UnitFor(chart))).Height, 30, 400));
    }

    private static Depth Of(int required) => new($"k{required}", "Lung", required, 3, 0, 0, Met: false);
}
