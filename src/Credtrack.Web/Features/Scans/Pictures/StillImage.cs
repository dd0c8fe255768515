using System.Security.Cryptography;
using SkiaSharp;

namespace Credtrack.Web.Features.Scans.Pictures;

/// <summary>
/// A picture as it is kept: always a JPEG that we wrote from pixels, so that nothing else of the sent file
/// remains (camera data, comments, places, hidden tails). Only this class can make one.
/// </summary>
public sealed record StillImage
{
    public const int MostBytes = 15 * 1024 * 1024;
    public const int MostPixels = 24_000_000;
    public const int LongestSide = 10_000;
    public const int ShortestSide = 64;
    // An ordinary progressive picture has about ten; thousands over a large picture keep a decoder busy for hours.
    public const int MostScans = 64;

    private const string Damaged = "This picture is damaged or incomplete. Export it again and attach the new file.";
    // 4:4:4 keeps the colours of a Doppler picture sharp.
    private static readonly SKJpegEncoderOptions Encoding = new(92, SKJpegEncoderDownsample.Downsample444, SKJpegEncoderAlphaOption.BlendOnBlack);
    // The largest picture takes 96 MB, twice that while it is turned: two at a time stay under 400 MB.
    private static readonly SemaphoreSlim Desks = new(2);

    private StillImage(byte[] bytes, int width, int height) =>
        (Bytes, Width, Height, Sha256) = (bytes, width, height, Convert.ToHexStringLower(SHA256.HashData(bytes)));

    public byte[] Bytes { get; }
    /// <summary>Pixels from left to right, of the picture held upright.</summary>
    public int Width { get; }
    /// <summary>Pixels from top to bottom, of the picture held upright.</summary>
    public int Height { get; }
    /// <summary>SHA-256 of <see cref="Bytes"/>, 64 lower-case hexadecimal digits.</summary>
    public string Sha256 { get; }

    /// <summary>The clean still of an uploaded file, or the reason in plain words why there is none: one of the two is null.</summary>
    public static async Task<(StillImage? Still, string? WhyNot)> From(byte[] file, CancellationToken stop = default)
    {
        if (WhyNotOpen(file) is { } reason) return (null, reason);
        await Desks.WaitAsync(stop);
        try
        {
            return Decode(file);
        }
        finally
        {
            Desks.Release();
        }
    }

    /// <summary>The still with exactly these pixels; their colour space is taken as sRGB, transparent parts become black.</summary>
    /// <exception cref="InvalidOperationException">JPEG cannot hold the picture: it has no pixels, or a side over 65,500.</exception>
    internal static StillImage Of(SKBitmap pixels)
    {
        // Without a colour space the encoder writes no profile: a JPEG without one is read as sRGB.
        using var plain = new SKPixmap(new SKImageInfo(pixels.Width, pixels.Height, pixels.ColorType, pixels.AlphaType), pixels.GetPixels(), pixels.RowBytes);
        using var jpeg = plain.Encode(Encoding) ?? throw new InvalidOperationException($"{pixels.Width} x {pixels.Height} pixels could not be written as JPEG.");
        return new StillImage(jpeg.ToArray(), pixels.Width, pixels.Height);
    }

    private static string? WhyNotOpen(byte[] file) =>
          file.Length == 0 ? "This file is empty. Export the picture again and attach the new file."
        : file.Length > MostBytes ? "This file is larger than 15 MB. Export the picture smaller, for example as JPEG, and attach it again."
        : !PictureMarks.IsPng(file) && !PictureMarks.IsJpeg(file) ? "This file is not a PNG or JPEG picture. Export it as one of these and attach it again."
        : PictureMarks.IsAnimated(file) ? "This picture moves. Export one frame as PNG or JPEG and attach that."
        : PictureMarks.Scans(file) > MostScans ? "This picture is built in too many layers. Export it as an ordinary JPEG and attach that."
        : null;

    private static (StillImage? Still, string? WhyNot) Decode(byte[] file)
    {
        using var data = SKData.CreateCopy(file);
        using var codec = SKCodec.Create(data);
        if (codec is null || codec.EncodedFormat != (PictureMarks.IsPng(file) ? SKEncodedImageFormat.Png : SKEncodedImageFormat.Jpeg)) return (null, Damaged);
        if (WhyNotDecode(codec) is { } reason) return (null, reason);

        using var srgb = SKColorSpace.CreateSrgb();
        using var raw = new SKBitmap(new SKImageInfo(codec.Info.Width, codec.Info.Height, SKImageInfo.PlatformColorType, SKAlphaType.Premul, srgb));
        if (codec.GetPixels(raw.Info, raw.GetPixels()) != SKCodecResult.Success) return (null, Damaged);
        if (codec.EncodedOrigin == SKEncodedOrigin.TopLeft) return (Of(raw), null);
        using var upright = Upright(raw, codec.EncodedOrigin);
        return (Of(upright), null);
    }

    private static string? WhyNotDecode(SKCodec codec) =>
          codec.FrameCount > 1 ? "This picture moves. Export one frame as PNG or JPEG and attach that."
        : Math.Max(codec.Info.Width, codec.Info.Height) > LongestSide || (long)codec.Info.Width * codec.Info.Height > MostPixels
            ? "This picture has more than 24 megapixels or a side over 10,000 pixels. Export it smaller and attach it again."
        : Math.Min(codec.Info.Width, codec.Info.Height) < ShortestSide ? "This picture is smaller than 64 by 64 pixels. Export it in its full size and attach it again."
        : null;

    private static SKBitmap Upright(SKBitmap raw, SKEncodedOrigin origin)
    {
        // EXIF 2.32, tag 0x0112: from 5 on, the rows of the file are the columns of the picture.
        var (w, h) = origin >= SKEncodedOrigin.LeftTop ? (raw.Height, raw.Width) : (raw.Width, raw.Height);
        var upright = new SKBitmap(raw.Info.WithSize(w, h));
        using var canvas = new SKCanvas(upright);
        canvas.SetMatrix(origin switch
        {
            SKEncodedOrigin.TopRight => new SKMatrix(-1, 0, w, 0, 1, 0, 0, 0, 1),
            SKEncodedOrigin.BottomRight => new SKMatrix(-1, 0, w, 0, -1, h, 0, 0, 1),
            SKEncodedOrigin.BottomLeft => new SKMatrix(1, 0, 0, 0, -1, h, 0, 0, 1),
            SKEncodedOrigin.LeftTop => new SKMatrix(0, 1, 0, 1, 0, 0, 0, 0, 1),
            SKEncodedOrigin.RightTop => new SKMatrix(0, -1, w, 1, 0, 0, 0, 0, 1),
            SKEncodedOrigin.RightBottom => new SKMatrix(0, -1, w, -1, 0, h, 0, 0, 1),
            SKEncodedOrigin.LeftBottom => new SKMatrix(0, 1, 0, -1, 0, h, 0, 0, 1),
            _ => SKMatrix.Identity
        });
        canvas.DrawBitmap(raw, 0, 0, SKSamplingOptions.Default);
        return upright;
    }
}
