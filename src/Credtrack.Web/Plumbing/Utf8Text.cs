using System.Buffers;
using System.Text;
using System.Text.Unicode;

namespace Credtrack.Web.Plumbing;

/// <summary>A text file that somebody sends.</summary>
public static class Utf8Text
{
    /// <summary>The text without its mark of order; or null and a sentence that says in what else it is written.</summary>
    public static string? Read(ReadOnlySpan<byte> bytes, out string? fault)
    {
        fault = bytes is [0xFF, 0xFE, ..] or [0xFE, 0xFF, ..] || bytes.IndexOf((byte)0) >= 0 ? "This file is written in UTF-16 or is no text. Save it as UTF-8 and send it again."
            : !Utf8.IsValid(bytes) ? "This file is not written in UTF-8, perhaps in an older Windows encoding. Save it as UTF-8 and send it again."
            : null;
        return fault is null ? Encoding.UTF8.GetString(bytes is [0xEF, 0xBB, 0xBF, ..] ? bytes[3..] : bytes) : null;
    }

    /// <summary>The line of the first byte that is no UTF-8.</summary>
    public static int FirstBadLine(ReadOnlySpan<byte> bytes)
    {
        var at = 0;
        while (Rune.DecodeFromUtf8(bytes[at..], out _, out var length) == OperationStatus.Done) at += length;
        return bytes[..at].Count((byte)'\n') + 1;
    }
}
