using SkiaSharp;

namespace Credtrack.Web.Tests.Site;

/// <summary>Pictures made by code, as a browser would send them.</summary>
public static class Stills
{
    public static byte[] Png(byte shade, int width = 320, int height = 240)
    {
        using var pixels = new SKBitmap(width, height);
        pixels.Erase(new SKColor(shade, shade, shade));
        return pixels.Encode(SKEncodedImageFormat.Png, 100).ToArray();
    }
}
