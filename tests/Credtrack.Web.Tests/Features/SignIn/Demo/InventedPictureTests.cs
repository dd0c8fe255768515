using Credtrack.Web.Features.Scans.Pictures;
using Credtrack.Web.Features.SignIn.Demo;
using SkiaSharp;

namespace Credtrack.Web.Tests.Features.SignIn.Demo;

public sealed class InventedPictureTests
{
    public static TheoryData<InventedTheme> Themes => [.. Enum.GetValues<InventedTheme>()];

    [Theory, MemberData(nameof(Themes))]
    public void One_seed_gives_one_picture_and_another_seed_another(InventedTheme theme)
    {
        var first = InventedPicture.Draw(theme, 1);
        Assert.Equal(first.Bytes, InventedPicture.Draw(theme, 1).Bytes);
        Assert.NotEqual(first.Sha256, InventedPicture.Draw(theme, 2).Sha256);
    }

    [Fact]
    public void Every_theme_looks_different() =>
        Assert.Equal(Themes.Count, Enum.GetValues<InventedTheme>().Select(theme => InventedPicture.Draw(theme, 3).Sha256).Distinct().Count());

    [Theory, MemberData(nameof(Themes))]
    public async Task It_would_be_accepted_as_an_upload(InventedTheme theme)
    {
        for (var seed = -1; seed < 2; seed++)
        {
            var drawn = InventedPicture.Draw(theme, seed);
            var (still, whyNot) = await StillImage.From(drawn.Bytes);
            Assert.Null(whyNot);
            Assert.Equal((800, 600, 800, 600), (drawn.Width, drawn.Height, still!.Width, still.Height));
            Assert.InRange(drawn.Bytes.Length, 30_000, 130_000);
        }
    }

    [Theory, MemberData(nameof(Themes))]
    public void It_is_grey_on_black_with_bright_and_dark_structures(InventedTheme theme)
    {
        using var pixels = SKBitmap.Decode(InventedPicture.Draw(theme, 4).Bytes);
        Assert.All(pixels.Pixels, p => Assert.True(p.Red == p.Green && p.Green == p.Blue));
        var greys = pixels.Pixels.Select(p => (int)p.Red).Order().ToArray();
        Assert.True(greys[0] < 4 && greys[greys.Length / 4] < 12 && greys[^2000] > 130, $"{greys[0]} {greys[greys.Length / 4]} {greys[^2000]}");
    }

    [Fact]
    public void The_words_that_it_is_no_patient_are_burned_in()
    {
        // The words are the only thing in the lower left corner, and no sector reaches there: two pictures agree on them.
        using var one = SKBitmap.Decode(InventedPicture.Draw(InventedTheme.Heart, 1).Bytes);
        using var two = SKBitmap.Decode(InventedPicture.Draw(InventedTheme.Vessels, 9).Bytes);
        var (words, same) = (0, 0);
        for (var i = 0; i < 200 * 24; i++)
        {
            var (x, y) = (24 + i % 200, 570 + i / 200);
            if (one.GetPixel(x, y).Red > 90) words++;
            if (Math.Abs(one.GetPixel(x, y).Red - two.GetPixel(x, y).Red) < 40) same++;
        }
        Assert.True(words > 350 && same == 200 * 24, $"{words} {same}");
    }
}
