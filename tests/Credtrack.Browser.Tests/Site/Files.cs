using SkiaSharp;

namespace Credtrack.Browser.Tests.Site;

/// <summary>What a trainee may have on the phone: a picture drawn here, and a text that only bears the name of one.</summary>
internal static class Files
{
    public static FilePayload Picture()
    {
        using var bitmap = new SKBitmap(320, 240);
        using var canvas = new SKCanvas(bitmap);
        using var pen = new SKPaint { Color = SKColors.Silver };
        canvas.Clear(SKColors.Black);
        canvas.DrawCircle(160, 120, 70, pen);
        using var png = bitmap.Encode(SKEncodedImageFormat.Png, 100);
        return new() { Name = "still.png", MimeType = "image/png", Buffer = png.ToArray() };
    }

    public static FilePayload TextNamedAsPicture() => new() { Name = "letter.png", MimeType = "image/png", Buffer = "Not a picture at all."u8.ToArray() };
}
