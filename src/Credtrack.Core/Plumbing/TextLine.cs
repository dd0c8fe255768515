using System.Globalization;
using System.Text;
using System.Text.Json;

namespace Credtrack.Core.Plumbing;

/// <summary>Texts that stand in one line of a page, of a list or of a fact.</summary>
public static class TextLine
{
    /// <summary>In the bytes that JSON takes for it: the detail of a fact holds the list twice, alone and in its sentence, and letters beyond ASCII take six bytes there.</summary>
    public const int LongestList = 3500;

    // The places that JSON takes for a letter beyond the first 65,536, in a column that is bounded.
    private const int Emoji = 12;

    /// <summary>Why this cannot stand in a line; null if it can. An empty one can.</summary>
    public static string? WhyNot(string text, int longest) =>
          text.Length > longest ? $"Keep it within {longest} characters."
        : text.Length + text.Count(char.IsHighSurrogate) * (Emoji - 2) > longest ? $"Keep it within {longest} characters; an emoji counts as {Emoji}."
        : text.EnumerateRunes().Any(Breaks) ? "Write it in one line, without control characters."
        : null;

    /// <summary>One after the other; what would make the list too long is counted, not told.</summary>
    public static string Listed(IEnumerable<string> changes)
    {
        var all = changes.ToList();
        var told = 0;
        for (var length = 0; told < all.Count && (length += JsonEncodedText.Encode(all[told]).EncodedUtf8Bytes.Length + 2) <= LongestList; told++) { }
        var more = all.Count - told;
        return string.Join("; ", [.. all.Take(told), .. more == 0 ? [] : new[] { told == 0 ? $"{more} in all" : $"and {more} more" }]);
    }

    // Half of a surrogate pair reads as U+FFFD. Marks that turn the direction of what follows would rewrite the line around them.
    private static bool Breaks(Rune rune) => rune.Value is 0xFFFD or (>= 0x202A and <= 0x202E) or (>= 0x2066 and <= 0x2069)
        || Rune.GetUnicodeCategory(rune) is UnicodeCategory.Control or UnicodeCategory.LineSeparator or UnicodeCategory.ParagraphSeparator;
}
