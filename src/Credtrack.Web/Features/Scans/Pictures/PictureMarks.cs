using System.Buffers.Binary;

namespace Credtrack.Web.Features.Scans.Pictures;

/// <summary>What the marks in a PNG or JPEG file say before anybody decodes it. Reads any bytes whatever, once, and never fails.</summary>
internal static class PictureMarks
{
    // PNG specification (W3C, third edition), 5.2; JPEG: ITU-T T.81, B.1.1.3, and the first mark that must follow.
    private static ReadOnlySpan<byte> Png => [0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A];
    private static ReadOnlySpan<byte> Jpeg => [0xFF, 0xD8, 0xFF];

    public static bool IsPng(ReadOnlySpan<byte> file) => file.StartsWith(Png);

    public static bool IsJpeg(ReadOnlySpan<byte> file) => file.StartsWith(Jpeg);

    /// <summary>Whether a PNG file announces an animation: a chunk acTL before the first IDAT (PNG third edition, 11.3.6.1).</summary>
    public static bool IsAnimated(ReadOnlySpan<byte> file)
    {
        if (!IsPng(file)) return false;
        for (var rest = file[Png.Length..]; rest.Length >= 8;)
        {
            var length = BinaryPrimitives.ReadUInt32BigEndian(rest);
            var type = rest[4..8];
            if (type.SequenceEqual("acTL"u8)) return true;
            if (type.SequenceEqual("IDAT"u8) || length + 12L > rest.Length) return false;
            rest = rest[(int)(length + 12)..];
        }
        return false;
    }

    /// <summary>How many passes over the picture a JPEG file holds: its marks SOS up to the mark EOI (ITU-T T.81, B.1.1). 0 for any other file.</summary>
    public static int Scans(ReadOnlySpan<byte> file)
    {
        if (!IsJpeg(file)) return 0;
        var scans = 0;
        var rest = file[2..];
        while (NextMark(ref rest) is { } mark and not 0xD9)
        {
            if (mark == 0xDA) scans++;
            // Stuffed zeros, reserved marks and restarts stand alone; every other mark is followed by the length of its segment.
            if (mark is < 0xC0 or (>= 0xD0 and <= 0xD8)) continue;
            if (rest.Length < 2) break;
            rest = rest[Math.Min(rest.Length, Math.Max(2, (int)BinaryPrimitives.ReadUInt16BigEndian(rest)))..];
        }
        return scans;
    }

    private static byte? NextMark(ref ReadOnlySpan<byte> rest)
    {
        var at = rest.IndexOf((byte)0xFF);
        if (at < 0) return null;
        rest = rest[at..];
        var after = rest.IndexOfAnyExcept((byte)0xFF);
        if (after < 0) return null;
        var mark = rest[after];
        rest = rest[(after + 1)..];
        return mark;
    }
}
