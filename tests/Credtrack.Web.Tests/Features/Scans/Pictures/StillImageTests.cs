using System.Text;
using Credtrack.Web.Features.Scans.Pictures;
using SkiaSharp;

namespace Credtrack.Web.Tests.Features.Scans.Pictures;

public sealed class StillImageTests
{
    [Fact]
    public async Task A_PNG_and_a_JPEG_become_a_JPEG_of_the_same_size()
    {
        foreach (var file in (byte[][])[SentFiles.Png(), SentFiles.Jpeg()])
        {
            var still = await Kept(file);
            using var pixels = SKBitmap.Decode(still.Bytes);
            Assert.Equal([0xFF, 0xD8, 0xFF], still.Bytes[..3]);
            Assert.Equal((160, 96, 160, 96), (still.Width, still.Height, pixels.Width, pixels.Height));
            Assert.Equal(Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(still.Bytes)), still.Sha256);
            Assert.True(Near(pixels.GetPixel(4, 4), SKColors.Red) && Near(pixels.GetPixel(155, 4), SKColors.Lime));
        }
    }

    [Fact]
    public async Task Colours_keep_their_full_resolution()
    {
        var still = await Kept(SentFiles.Png());
        var frame = still.Bytes.AsSpan(still.Bytes.AsSpan().IndexOf<byte>([0xFF, 0xC0]));
        // Sampling factors of the first component, ITU-T T.81, B.2.2: 11 is one chroma value a pixel.
        Assert.Equal(0x11, frame[11]);
    }

    [Fact]
    public async Task Transparent_parts_become_black()
    {
        using var pixels = SKBitmap.Decode((await Kept(SentFiles.Png(transparent: true))).Bytes);
        Assert.True(Near(pixels.GetPixel(80, 60), SKColors.Black));
    }

    [Theory]
    [InlineData("<!DOCTYPE html><script>alert(1)</script>")]
    [InlineData("<svg xmlns='http://www.w3.org/2000/svg' onload='alert(1)'/>")]
    [InlineData("GIF89a\u0001\0\u0001\0\0\0\0;")]
    [InlineData("RIFF\u001a\0\0\0WEBPVP8L\r\0\0\0/\0\0\0")]
    [InlineData("%PDF-1.7")]
    public async Task Another_kind_of_file_is_refused_with_the_remedy(string content) =>
        Assert.Equal("This file is not a PNG or JPEG picture. Export it as one of these and attach it again.", await WhyNot(Encoding.Latin1.GetBytes(content)));

    [Fact]
    public async Task A_text_that_begins_like_a_picture_is_damaged()
    {
        Assert.StartsWith("This picture is damaged", await WhyNot([0xFF, 0xD8, 0xFF, .. "<html></html>"u8]), StringComparison.Ordinal);
        Assert.StartsWith("This picture is damaged", await WhyNot([.. SentFiles.Png()[..8], .. "<html></html>"u8]), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(60_000, 60_000)]
    [InlineData(5_000, 5_000)]
    [InlineData(10_001, 100)]
    public async Task A_huge_picture_is_refused_by_its_header(int width, int height)
    {
        // There is nothing behind these headers: only who reads no further can say this.
        Assert.StartsWith("This picture has more than 24 megapixels", await WhyNot(SentFiles.PngOfHeader(width, height)), StringComparison.Ordinal);
        Assert.StartsWith("This picture has more than 24 megapixels", await WhyNot(SentFiles.JpegOfHeader(width, height)), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Files_and_pictures_that_are_empty_tiny_or_too_big_are_refused()
    {
        Assert.StartsWith("This file is empty", await WhyNot([]), StringComparison.Ordinal);
        Assert.StartsWith("This picture is smaller than 64 by 64 pixels", await WhyNot(SentFiles.Png(1, 1)), StringComparison.Ordinal);
        Assert.StartsWith("This picture is smaller than 64 by 64 pixels", await WhyNot(SentFiles.Png(63, 200)), StringComparison.Ordinal);
        Assert.Equal((64, 64), ((await Kept(SentFiles.Png(64, 64))).Width, (await Kept(SentFiles.Png(64, 64))).Height));

        var full = SentFiles.Jpeg();
        Array.Resize(ref full, StillImage.MostBytes);
        Assert.Equal((await Kept(SentFiles.Jpeg())).Sha256, (await Kept(full)).Sha256);
        Array.Resize(ref full, StillImage.MostBytes + 1);
        Assert.StartsWith("This file is larger than 15 MB", await WhyNot(full), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_truncated_picture_is_refused()
    {
        var (png, jpeg) = (SentFiles.Png(), SentFiles.Jpeg());
        foreach (var share in (double[])[0.3, 0.6, 0.9])
        {
            Assert.StartsWith("This picture is damaged", await WhyNot(png[..(int)(png.Length * share)]), StringComparison.Ordinal);
            Assert.StartsWith("This picture is damaged", await WhyNot(jpeg[..(int)(jpeg.Length * share)]), StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task An_animated_PNG_is_refused() =>
        Assert.StartsWith("This picture moves", await WhyNot(SentFiles.WithChunk(SentFiles.Png(), "acTL", [0, 0, 0, 2, 0, 0, 0, 0])), StringComparison.Ordinal);

    [Fact]
    public async Task A_JPEG_of_very_many_passes_is_refused()
    {
        Assert.StartsWith("This picture is built in too many layers", await WhyNot(SentFiles.WithScans(SentFiles.Jpeg(), StillImage.MostScans + 1)), StringComparison.Ordinal);
        Assert.StartsWith("This picture is built in too many layers", await WhyNot(SentFiles.WithSegment(SentFiles.WithScans(SentFiles.Jpeg(), StillImage.MostScans + 1), 0xFE, [0xFF, 0xD9])), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Of_one_picture_nothing_but_its_pixels_remains()
    {
        var (png, jpeg) = (SentFiles.Png(), SentFiles.Jpeg());
        var text = Encoding.Latin1.GetBytes($"Author\0{SentFiles.Name}");
        byte[][] dirtyPngs = [png, SentFiles.WithChunk(png, "tEXt", text), SentFiles.WithChunk(png, "eXIf", SentFiles.Exif(1)[6..]), [.. png, .. "<script>"u8]];
        byte[][] dirtyJpegs = [jpeg, SentFiles.WithSegment(jpeg, 0xE1, SentFiles.Exif(1)), SentFiles.WithSegment(jpeg, 0xFE, text), [.. jpeg, .. "PK\u0003\u0004<html>"u8]];
        foreach (var files in (byte[][][])[dirtyPngs, dirtyJpegs])
        {
            var stills = await Task.WhenAll(files.Select(Kept));
            Assert.Single(stills.Select(s => s.Sha256).Distinct());
            Assert.All((string[])[SentFiles.Name, "Exif", "ICC_PROFILE", "PK\u0003\u0004", "<html>", "<script>"], word =>
                Assert.DoesNotContain(word, Encoding.Latin1.GetString(stills[0].Bytes), StringComparison.Ordinal));
        }
    }

    // Where the corner that lay top left in the file belongs, EXIF 2.32, tag 0112.
    [Theory]
    [InlineData(1, false, false)]
    [InlineData(2, true, false)]
    [InlineData(3, true, true)]
    [InlineData(4, false, true)]
    [InlineData(5, false, false)]
    [InlineData(6, true, false)]
    [InlineData(7, true, true)]
    [InlineData(8, false, true)]
    public async Task A_phone_picture_is_turned_upright(ushort orientation, bool right, bool bottom)
    {
        var still = await Kept(SentFiles.WithSegment(SentFiles.Jpeg(), 0xE1, SentFiles.Exif(orientation)));
        using var pixels = SKBitmap.Decode(still.Bytes);
        Assert.Equal(orientation < 5 ? (160, 96) : (96, 160), (still.Width, still.Height));
        Assert.True(Near(pixels.GetPixel(right ? still.Width - 4 : 4, bottom ? still.Height - 4 : 4), SKColors.Red));
        // The green corner lay beside the red one along a row of the file, which is a column of the picture from 5 on.
        var alongRow = orientation < 5;
        Assert.True(Near(pixels.GetPixel(right ^ alongRow ? still.Width - 4 : 4, bottom ^ !alongRow ? still.Height - 4 : 4), SKColors.Lime));
    }

    [Fact]
    public async Task Mutated_files_are_kept_or_refused_and_never_break_anything()
    {
        var chance = new Random(20260301);
        byte[][] seeds = [SentFiles.Png(96, 64), SentFiles.WithSegment(SentFiles.Jpeg(96, 64), 0xE1, SentFiles.Exif(6))];
        var kept = 0;
        for (var i = 0; i < 2000; i++)
        {
            var file = (byte[])seeds[i % 2].Clone();
            for (var n = chance.Next(1, 8); n > 0; n--) file[chance.Next(file.Length)] = (byte)chance.Next(256);
            var (still, whyNot) = await StillImage.From(file);
            Assert.True(still is null ^ whyNot is null);
            if (still is not null) kept++;
        }
        Assert.InRange(kept, 1, 1999);
    }

    private static async Task<StillImage> Kept(byte[] file)
    {
        var (still, whyNot) = await StillImage.From(file);
        Assert.Null(whyNot);
        return still!;
    }

    private static async Task<string> WhyNot(byte[] file)
    {
        var (still, whyNot) = await StillImage.From(file);
        Assert.Null(still);
        return whyNot!;
    }

    private static bool Near(SKColor a, SKColor b) => Math.Abs(a.Red - b.Red) + Math.Abs(a.Green - b.Green) + Math.Abs(a.Blue - b.Blue) < 30;
}
