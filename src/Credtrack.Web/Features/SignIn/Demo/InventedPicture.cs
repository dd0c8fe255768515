using System.Globalization;
using System.Runtime.InteropServices;
using Credtrack.Web.Features.Scans.Pictures;
using SkiaSharp;

namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>Draws ultrasound stills for the demonstration: no patient, no file, the same picture for the same seed.</summary>
public static class InventedPicture
{
    private const int Width = 800, Height = 600;
    // The sector keeps to this part of the picture; the rest holds the scale and the words.
    private const double Middle = 385, Top = 28, Bottom = 556, Widest = 700;
    private const string Words = "Invented drawing, not a patient";

    public static StillImage Draw(InventedTheme theme, int seed)
    {
        // Random gives neighbouring seeds nearly the same first numbers, so they are spread first (Knuth's multiplier).
        var body = InventedBody.Of(theme, new Random((int)((uint)seed * 2654435761)));
        var sector = body.Sector;
        var scale = Math.Min((Bottom - Top) / (sector.Depth - sector.Top), Widest / (2 * sector.At(1, sector.Depth).X));
        using var pixels = new SKBitmap(new SKImageInfo(Width, Height, SKColorType.Gray8, SKAlphaType.Opaque));
        Paint(new EchoField(body, seed), pixels, scale, sector.Top);
        using var canvas = new SKCanvas(pixels);
        Mark(canvas, sector, scale);
        return StillImage.Of(pixels);
    }

    private static void Paint(EchoField echoes, SKBitmap pixels, double scale, double top)
    {
        var row = new byte[Width];
        for (var y = 0; y < Height; y++)
        {
            for (var x = 0; x < Width; x++) row[x] = (byte)(240 * (echoes.At((x - Middle) / scale, (y - Top) / scale + top) ?? 0));
            Marshal.Copy(row, 0, pixels.GetPixels() + y * pixels.RowBytes, Width);
        }
    }

    private static void Mark(SKCanvas canvas, Sector sector, double scale)
    {
        using var pen = new SKPaint { Color = new SKColor(170, 170, 170), Style = SKPaintStyle.Stroke, StrokeWidth = 1.1f, IsAntialias = true, StrokeCap = SKStrokeCap.Round };
        using var fill = new SKPaint { Color = new SKColor(210, 210, 210), IsAntialias = true };
        var face = Top - sector.Top * scale;
        var every = sector.Depth > 7 ? 5 : 1;
        for (var cm = 0; cm <= sector.Depth; cm++)
        {
            var (y, numbered) = ((float)(face + cm * scale), cm % every == 0);
            canvas.DrawLine(numbered ? 752 : 758, y, 764, y, pen);
            if (numbered) StrokeFont.Write(canvas, cm.ToString(CultureInfo.InvariantCulture), 771, y + 4.5f, 1.1f, pen);
        }
        StrokeFont.Write(canvas, "cm", 770, 574, 1.1f, pen);
        var left = (float)(Middle + sector.At(-1, 0).X * scale);
        canvas.DrawCircle(left - 14, (float)Top + 5, 4.5f, fill);
        StrokeFont.Write(canvas, Words, 24, 586, 1.15f, pen);
    }
}
