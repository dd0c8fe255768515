using System.Globalization;
using System.Text;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>Whether the facts can be printed whole and truly. What cannot is refused in plain words before anything is drawn.</summary>
internal static class Drawable
{
    // Every text but the reason stands in one piece on a page; three hundred of the widest letters still do, in the narrowest column. The code
    // shares one line with other words in the foot of every page.
    private const int Longest = 300, LongestReason = 10_000, LongestCode = 24;
    private const string Reason = "reason for the gap", Code = "document code";

    public static string? WhyNot(SummaryFacts facts) =>
        Texts(facts).Select(t => WhyNot(t.Where, t.Text)).FirstOrDefault(why => why is not null)
        ?? (facts.Lines.Count == 0 ? "The summary names no application." : null)
        ?? (TimeZoneInfo.TryFindSystemTimeZoneById(facts.ZoneId, out _) ? null : $"There is no time zone {facts.ZoneId}; take an IANA name such as Europe/Dublin.")
        ?? (Uri.TryCreate(facts.CheckAddress, UriKind.Absolute, out var address) && address.Scheme is "https" or "http" ? null : "The address of the check page must be absolute, such as https://credtrack.example/check.")
        ?? (CheckCode.Of(facts.CheckAddress) is null ? "The address of the check page is too long for a code that still reads from paper; 150 plain letters are enough for it." : null);

    private static IEnumerable<(string Where, string Text)> Texts(SummaryFacts facts)
    {
        (string, string)[] own =
        [
            ("name of the holder", facts.Holder), ("name of the programme", facts.Programme), ("name of the site", facts.Site), (Code, facts.DocumentCode),
            ("address of the check page", facts.CheckAddress), ("privilege", facts.Privilege), ("name of the rulebook", facts.RulebookName), ("version of the rulebook", facts.RulebookVersion),
            ("name of the signer", facts.SignerName), ("role of the signer", facts.SignerRole), ("time zone", facts.ZoneId), ("meaning of the signature", facts.Meaning),
            ("fingerprint of the certificate", facts.CertificateFingerprint), .. Given(Reason, facts.GapReason), .. Given("head of the ledger", facts.LedgerHead),
        ];
        return own.Concat(facts.Lines.SelectMany(line => line.Requirements.SelectMany(r => new[] { ($"requirement of {line.Application}", r.Asked), ($"value found for {line.Application}", r.Value) })
            .Prepend(("name of the application", line.Application))));
    }

    private static (string, string)[] Given(string where, string? text) => text is null ? [] : [(where, text)];

    private static string? WhyNot(string where, string text)
    {
        var most = where switch { Reason => LongestReason, Code => LongestCode, _ => Longest };
        if (string.IsNullOrWhiteSpace(text)) return $"The {where} is empty.";
        if (text.Length > most) return $"The {where} has {text.Length.ToString(CultureInfo.InvariantCulture)} characters; {most.ToString(CultureInfo.InvariantCulture)} at most fit.";
        var letters = text.EnumerateRunes().ToList();
        // A lone half of a pair is read as U+FFFD, which a text has no reason to hold; it is looked for first, because such a text has no normal form.
        if (Named(letters.Where(l => Unseen(l) && !(where == Reason && l.Value is '\n' or '\r'))) is { } unseen) return $"The {where} holds what cannot be seen on paper: {unseen}. Take it out.";
        var composed = text.Normalize().EnumerateRunes().ToList();
        if (Named(composed.Where(l => Rune.GetUnicodeCategory(l) is UnicodeCategory.NonSpacingMark or UnicodeCategory.SpacingCombiningMark or UnicodeCategory.EnclosingMark)) is { } marks)
            return $"The {where} holds marks that the document cannot set on their letter: {marks}.";
        if (Named(composed.Where(l => l.Value is not ('\n' or '\r') && !SummaryFonts.Have(l.Value))) is { } missing) return $"The document's font has no {missing}, which stands in the {where}.";
        return null;
    }

    private static bool Unseen(Rune letter) => letter == Rune.ReplacementChar || Rune.GetUnicodeCategory(letter) is UnicodeCategory.Control or UnicodeCategory.Format
        or UnicodeCategory.LineSeparator or UnicodeCategory.ParagraphSeparator or UnicodeCategory.PrivateUse or UnicodeCategory.OtherNotAssigned;

    /// <summary>Each character by its code, and by itself where it can be seen; null if there is none.</summary>
    private static string? Named(IEnumerable<Rune> letters)
    {
        string[] names = [.. letters.Distinct().Select(l => Unseen(l) ? $"U+{l.Value:X4}" : $"{l} (U+{l.Value:X4})")];
        return names.Length == 0 ? null : string.Join(", ", names);
    }
}
