using System.Buffers.Binary;
using System.IO.Compression;
using System.Text;
using SkiaSharp;

namespace Credtrack.Web.Tests.Features.Scans.Pictures;

/// <summary>Files as a browser, a phone or an enemy would send them, built byte by byte.</summary>
internal static class SentFiles
{
    public const string Name = "Miller^Anna";
    private static readonly byte[] PngMark = [0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A];

    /// <summary>Grey steps with a red top left and a green top right corner, on an optional transparent ground.</summary>
    public static SKBitmap Pixels(int width = 160, int height = 96, bool transparent = false)
    {
        var pixels = new SKBitmap(new SKImageInfo(width, height, SKColorType.Rgba8888, SKAlphaType.Unpremul));
        for (var i = 0; i < width * height; i++)
        {
            var (x, y) = (i % width, i / width);
            pixels.SetPixel(x, y, (x < 16, x >= width - 16, y < 16) switch
            {
                (true, _, true) => SKColors.Red,
                (_, true, true) => SKColors.Lime,
                _ => new SKColor(200, 200, (byte)(x * 7 ^ y * 5), (byte)(transparent ? 0 : 255))
            });
        }
        return pixels;
    }

    public static byte[] Png(int width = 160, int height = 96, bool transparent = false)
    {
        using var pixels = Pixels(width, height, transparent);
        using var pixmap = pixels.PeekPixels();
        using var png = pixmap.Encode(SKPngEncoderOptions.Default);
        return png!.ToArray();
    }

    public static byte[] Jpeg(int width = 160, int height = 96)
    {
        using var pixels = Pixels(width, height);
        using var pixmap = pixels.PeekPixels();
        using var jpeg = pixmap.Encode(new SKJpegEncoderOptions(95));
        return jpeg!.ToArray();
    }

    /// <summary>A valid header of that size with hardly any pixels behind it.</summary>
    public static byte[] PngOfHeader(int width, int height)
    {
        var header = new byte[13];
        BinaryPrimitives.WriteInt32BigEndian(header, width);
        BinaryPrimitives.WriteInt32BigEndian(header.AsSpan(4), height);
        (header[8], header[9]) = (8, 2);
        using var packed = new MemoryStream();
        using (var zlib = new ZLibStream(packed, CompressionLevel.Optimal)) zlib.Write(new byte[1000]);
        return [.. PngMark, .. Chunk("IHDR", header), .. Chunk("IDAT", packed.ToArray()), .. Chunk("IEND", [])];
    }

    /// <summary>The same JPEG with another size written in its frame header (ITU-T T.81, B.2.2).</summary>
    public static byte[] JpegOfHeader(int width, int height)
    {
        var jpeg = Jpeg();
        var frame = jpeg.AsSpan(jpeg.AsSpan().IndexOf<byte>([0xFF, 0xC0, 0x00]));
        BinaryPrimitives.WriteUInt16BigEndian(frame[5..], (ushort)height);
        BinaryPrimitives.WriteUInt16BigEndian(frame[7..], (ushort)width);
        return jpeg;
    }

    /// <summary>A PNG with one more chunk behind its header.</summary>
    public static byte[] WithChunk(byte[] png, string type, byte[] content) => [.. png[..33], .. Chunk(type, content), .. png[33..]];

    /// <summary>A JPEG with one more segment right behind its first mark.</summary>
    public static byte[] WithSegment(byte[] jpeg, byte mark, byte[] content) =>
        [.. jpeg[..2], 0xFF, mark, (byte)((content.Length + 2) >> 8), (byte)(content.Length + 2), .. content, .. jpeg[2..]];

    /// <summary>A JPEG that sends its only pass over the picture that many times.</summary>
    public static byte[] WithScans(byte[] jpeg, int times)
    {
        var at = jpeg.AsSpan().IndexOf<byte>([0xFF, 0xDA]);
        return [.. jpeg[..at], .. Enumerable.Repeat(jpeg[at..^2], times).SelectMany(scan => scan), .. jpeg[^2..]];
    }

    /// <summary>What a camera adds: which way up, the name of its owner and a place (EXIF 2.32, 4.6: orientation 0112, artist 013B, GPS 8825).</summary>
    public static byte[] Exif(ushort orientation)
    {
        using var exif = new MemoryStream();
        using var to = new BinaryWriter(exif);
        to.Write(Encoding.ASCII.GetBytes("Exif\0\0II*\0"));
        to.Write(8);
        to.Write((ushort)3);
        Entry(0x0112, 3, 1, orientation);
        Entry(0x013B, 2, Name.Length + 1, 50);
        Entry(0x8825, 4, 1, 62);
        to.Write(0);
        to.Write(Encoding.ASCII.GetBytes(Name + '\0'));
        to.Write((ushort)2);
        Entry(0x0001, 2, 2, 'N');
        Entry(0x0002, 5, 3, 92);
        to.Write(0);
        foreach (var part in (int[])[48, 1, 8, 1, 15, 1]) to.Write(part);
        return exif.ToArray();

        void Entry(int tag, int kind, int count, int value)
        {
            to.Write((ushort)tag);
            to.Write((ushort)kind);
            to.Write(count);
            to.Write(value);
        }
    }

    private static byte[] Chunk(string type, byte[] content)
    {
        var chunk = new byte[content.Length + 12];
        BinaryPrimitives.WriteInt32BigEndian(chunk, content.Length);
        Encoding.ASCII.GetBytes(type, chunk.AsSpan(4));
        content.CopyTo(chunk, 8);
        BinaryPrimitives.WriteUInt32BigEndian(chunk.AsSpan(chunk.Length - 4), Crc(chunk.AsSpan(4, content.Length + 4)));
        return chunk;
    }

    // PNG specification, annex D.
    private static uint Crc(ReadOnlySpan<byte> bytes)
    {
        var crc = uint.MaxValue;
        foreach (var value in bytes)
        {
            crc ^= value;
            for (var bit = 0; bit < 8; bit++) crc = (crc & 1) == 1 ? crc >> 1 ^ 0xEDB88320 : crc >> 1;
        }
        return ~crc;
    }
}
