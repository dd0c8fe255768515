using System.Globalization;
using System.IO.Compression;
using System.Text;
using System.Text.RegularExpressions;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>
/// Writes a saved document anew, object by object. PDFsharp compresses without the closing checksum of zlib (RFC 1950), at which strict readers
/// complain, and its metadata claims another standard and does not escape a title; both are put right, all else stays byte for byte.
/// </summary>
internal static partial class Finish
{
    public static byte[] Of(byte[] drawn, byte[] xmp)
    {
        // Latin-1 maps each byte to one letter, so that offsets in text are offsets in bytes.
        var text = Encoding.Latin1.GetString(drawn);
        var table = int.Parse(LastTable().Match(text).Groups[1].Value, CultureInfo.InvariantCulture);
        var offsets = Entry().Matches(text[table..]).Select(e => int.Parse(e.Groups[1].Value, CultureInfo.InvariantCulture)).ToList();
        var ends = offsets.Order().Append(table).ToList();
        using var written = new MemoryStream();
        Put(written, drawn.AsSpan(0, ends[0]));
        var moved = new List<long>();
        foreach (var offset in offsets)
        {
            moved.Add(written.Position);
            var one = drawn.AsSpan(offset, ends[ends.BinarySearch(offset) + 1] - offset);
            var head = StreamHead().Match(text, offset, one.Length);
            if (!head.Success) Put(written, one);
            else Stream(written, head, drawn.AsSpan(head.Index + head.Length), xmp);
        }
        var start = written.Position;
        Put(written, $"xref\n0 {moved.Count + 1}\n0000000000 65535 f \n");
        foreach (var offset in moved) Put(written, $"{offset:D10} 00000 n \n");
        Put(written, text[text.IndexOf("trailer", table, StringComparison.Ordinal)..(text.LastIndexOf("startxref", StringComparison.Ordinal))]);
        Put(written, $"startxref\n{start}\n%%EOF\n");
        return written.ToArray();
    }

    private static void Stream(MemoryStream written, Match head, ReadOnlySpan<byte> data, byte[] xmp)
    {
        var entries = head.Groups["entries"].Value;
        var content = data[..int.Parse(Length().Match(entries).Groups[1].Value, CultureInfo.InvariantCulture)].ToArray();
        if (entries.Contains("/Type/Metadata", StringComparison.Ordinal)) content = xmp;
        if (entries.Contains("/Filter/FlateDecode", StringComparison.Ordinal)) content = Deflated(content);
        Put(written, $"{head.Groups["number"].Value}<<{Length().Replace(entries, $"/Length {content.Length}")}>>\nstream\n");
        Put(written, content);
        Put(written, "\nendstream\nendobj\n");
    }

    private static byte[] Deflated(byte[] content)
    {
        using var plain = new MemoryStream();
        // Past the two bytes of the zlib header; what closes the stream is missing or not asked for.
        using (var inflate = new DeflateStream(new MemoryStream(content, 2, content.Length - 2), CompressionMode.Decompress)) inflate.CopyTo(plain);
        using var packed = new MemoryStream();
        using (var deflate = new ZLibStream(packed, CompressionLevel.SmallestSize, leaveOpen: true)) deflate.Write(plain.GetBuffer(), 0, (int)plain.Length);
        return packed.ToArray();
    }

    private static void Put(MemoryStream written, ReadOnlySpan<byte> bytes) => written.Write(bytes);
    private static void Put(MemoryStream written, string words) => Put(written, Encoding.Latin1.GetBytes(words));

    [GeneratedRegex(@"startxref\n(\d+)\n%%EOF\s*$", RegexOptions.RightToLeft)]
    private static partial Regex LastTable();

    [GeneratedRegex(@"(\d{10}) \d{5} n")]
    private static partial Regex Entry();

    [GeneratedRegex(@"\G(?<number>\d+ 0 obj\n)<<(?<entries>[^\n]*)>>\nstream\n")]
    private static partial Regex StreamHead();

    [GeneratedRegex(@"/Length (\d+)")]
    private static partial Regex Length();
}
