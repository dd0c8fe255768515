using Credtrack.Web.Features.Shared.Figures;

namespace Credtrack.Web.Tests.Features.Shared.Figures;

public sealed class SignsTests
{
    [Fact]
    public void Swatches_and_icons_are_drawn_as_the_sketch_has_them() => Assert.All(Sketched.Lines("signs.txt"), line => Assert.Equal(line[1], line[0] switch
    {
        "mark" => Icons.Of(IconName.Brand),
        var name when Enum.TryParse<IconName>(name, ignoreCase: true, out var icon) => Icons.Of(icon),
        var name => Swatches.Of(Enum.Parse<SwatchKind>(name, ignoreCase: true)),
    }));

    [Fact]
    public void Every_sign_is_sketched_or_passed_over_by_readers()
    {
        Assert.Equal(Enum.GetNames<SwatchKind>().Select(k => k.ToLowerInvariant()).Order(), Sketched.Lines("signs.txt").Select(l => l[0]).Except(["mark", "note", "bad"]).Order());
        Assert.All(Enum.GetValues<IconName>().Select(Icons.Of), svg => Assert.Contains("aria-hidden=\"true\"", svg, StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(7, 20, 6, 14, true, false)]
    [InlineData(1, 1, 0, 1, true, false)]
    [InlineData(3, 300, 2, 18, true, true)]
    [InlineData(150, 300, 10, 10, false, true)]
    [InlineData(300, 300, 19, 1, false, false)]
    public void The_queue_shows_at_most_twenty_boxes_around_the_place(int position, int length, int passed, int others, bool begins, bool goesOn)
    {
        var svg = BenchDrawings.Queue(position, length);
        Assert.Equal((passed, others), (Parts(svg, "fig-solid"), Parts(svg, "fig-track")));
        Assert.Equal((begins ? 1 : 0, (begins ? 0 : 1) + (goesOn ? 1 : 0)), (Parts(svg, "fig-skin"), Parts(svg, "fig-faint")));
        Assert.Equal(1, Parts(svg, "fig-notch"));
    }

    [Theory]
    [InlineData(0, 5)]
    [InlineData(6, 5)]
    public void A_place_outside_the_queue_is_refused(int position, int length) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => BenchDrawings.Queue(position, length));

    [Fact]
    public void The_strip_over_closed_answers_is_hatched_to_its_rim_and_no_further()
    {
        var canvas = Canvas.Of(BenchDrawings.Closed());
        Assert.Equal((448.0, 15.0), (canvas.Width, canvas.Height));
        Assert.All(canvas.Places, p => Assert.True(p.X is >= 0 and <= 448 && p.Y is >= 0 and <= 15, p.ToString()));
    }

    private static int Parts(string svg, string kind) => svg.Split($"class=\"{kind}\"").Length - 1;
}
