using System.Buffers;
using System.Formats.Asn1;
using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;

namespace Credtrack.Web.Features.Documents.Seals;

/// <summary>
/// A file taken apart at its seal. It is looked for in the one spelling in which we write it, and nothing of the PDF around it is
/// interpreted: what the signature covers is what we wrote, so that readers of all kinds see the same document.
/// </summary>
internal sealed partial class SealedFile
{
    // Capital digits only, as we write them: else the case of a letter could change unseen.
    private static readonly SearchValues<byte> Digits = SearchValues.Create("0123456789ABCDEF"u8);

    private SealedFile(byte[] covered, byte[] signature, DateTime sealedAt, string place) => (Covered, Signature, SealedAt, Place) = (covered, signature, sealedAt, place);

    /// <summary>The whole file but the hexadecimal text of the signature.</summary>
    public byte[] Covered { get; }

    /// <summary>The signature alone, without the zeros that fill its room.</summary>
    public byte[] Signature { get; }

    /// <summary>The instant that the seal names, UTC.</summary>
    public DateTime SealedAt { get; }

    public string Place { get; }

    /// <summary>The file taken apart, or what is wrong with its form: one of the two is null.</summary>
    public static (SealedFile? File, SealFinding? Wrong) Open(byte[] file)
    {
        if (!file.AsSpan().StartsWith("%PDF-"u8)) return (null, new(SealVerdict.NoPdf, "This file is not a PDF.", "at its first bytes"));
        var found = Spelling().Matches(Encoding.Latin1.GetString(file));
        if (found.Count == 0) return (null, SealFinding.NotOurs("it carries no seal of ours", "in the whole file"));
        if (found.Count > 1) return (null, SealFinding.Altered($"it carries {found.Count} seals instead of one", $"at byte {found[^1].Index}"));

        var (open, place) = (found[0].Index + found[0].Length - 1, $"in the seal at byte {found[0].Index}");
        var (start, end, rest) = (Number(found[0], "start"), Number(found[0], "end"), Number(found[0], "rest"));
        if (start != open || end != start + 2 * Seal.Room + 2) return (null, SealFinding.Altered("the seal does not lie where it says", place));
        if (end + rest > file.Length) return (null, SealFinding.Altered($"{end + rest - file.Length} bytes are missing", $"after byte {file.Length}"));
        if (end + rest < file.Length) return (null, SealFinding.Altered($"{file.Length - end - rest} bytes follow the sealed document", $"after byte {end + rest}"));
        var digits = file.AsSpan((int)start + 1, 2 * Seal.Room);
        if (file[end - 1] != '>' || digits.ContainsAnyExcept(Digits)) return (null, SealFinding.Altered("the signature is not written as we write it", place));
        if (SignatureOf(Convert.FromHexString(Encoding.Latin1.GetString(digits))) is not { } signature) return (null, SealFinding.Altered("the room behind the signature is not empty", place));
        return DateTime.TryParseExact(found[0].Groups["time"].Value, "yyyyMMddHHmmss", CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal | DateTimeStyles.AdjustToUniversal, out var at)
            ? (new([.. file.AsSpan(0, (int)start), .. file.AsSpan((int)end)], signature, at, place), null)
            : (null, SealFinding.Altered("the seal names no time", place));
    }

    // By its own length, not by taking zeros away: a signature may end in a zero.
    private static byte[]? SignatureOf(byte[] room) => Decoded.OrNull(() =>
    {
        AsnDecoder.ReadEncodedValue(room, AsnEncodingRules.DER, out _, out _, out var length);
        return room.AsSpan(length).ContainsAnyExcept((byte)0) ? null : room[..length];
    });

    private static long Number(Match match, string name) => long.Parse(match.Groups[name].ValueSpan, NumberStyles.None, CultureInfo.InvariantCulture);

    [GeneratedRegex(Seal.Kind + @" /M \(D:(?<time>[0-9]{14})Z\) /ByteRange \[0 (?<start>[0-9]{1,10}) (?<end>[0-9]{1,10}) (?<rest>[0-9]{1,10}) *\] /Contents <")]
    private static partial Regex Spelling();
}
