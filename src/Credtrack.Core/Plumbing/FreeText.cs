using System.Text.RegularExpressions;

namespace Credtrack.Core.Plumbing;

/// <summary>
/// Words that stay with a record for good must not name a patient. This finds what has the form of an identifier and is cheap to find;
/// a bare name it cannot know, so the hint beside each field asks for the same.
/// </summary>
public static partial class FreeText
{
    public const int Longest = 1000;

    private static readonly (Regex Form, string Kind)[] Identifiers =
    [
        (LongNumber(), "a number of a person or a record"),
        (LabelledNumber(), "a number of a person or a record"),
        (Birth(), "a date of birth"),
        (Date(), "a date"),
        (DateInWords(), "a date"),
        (Address(), "an e-mail address"),
        (Name(), "a name"),
    ];

    /// <summary>Why the words cannot stay as they are; null if they can, or if there are none.</summary>
    public static string? WhyNotKeep(string? text) =>
          text is null          ? null
        : text.Length > Longest ? "Keep it within 1,000 characters."
        : WhyNotName(text);

    /// <summary>The same of a text whose length is bounded elsewhere.</summary>
    public static string? WhyNotName(string? text) => text is null ? null
        : Identifiers.Where(i => i.Form.IsMatch(text)).Select(i => $"This looks like {i.Kind}. Take it out: nothing here may identify a patient.").FirstOrDefault();

    public static string? WhyNotReason(string? text) => string.IsNullOrWhiteSpace(text) ? "Give the reason." : WhyNotKeep(text);

    // Not the decimals of a measure. With blanks, hyphens and brackets between them it takes nine, so that 450-500 ml is none.
    [GeneratedRegex(@"(?<!\d[.,]?)\d{6,}|(\d[ ()-]*){9,}", RegexOptions.ExplicitCapture)]
    private static partial Regex LongNumber();

    [GeneratedRegex(@"\b(mrn|csn|nhs|ssn|accession|chart|(pt|patient|hospital|record)\s*(id|no|number))\b\D{0,12}\d", RegexOptions.ExplicitCapture | RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex LabelledNumber();

    [GeneratedRegex(@"\b(dob|date of birth|born)\b\D{0,12}\d", RegexOptions.ExplicitCapture | RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Birth();

    [GeneratedRegex(@"\b\d{1,4}([/.-])\d{1,2}\1\d{2,4}\b")]
    private static partial Regex Date();

    [GeneratedRegex(@"\b(\d{1,2}(st|nd|rd|th)?\s+)?(jan|feb|mar|apr|may|jun|jul|aug|sep|oct|nov|dec)[a-z]*\.?\s+(\d{1,2}(st|nd|rd|th)?,?\s+)?\d{4}\b", RegexOptions.ExplicitCapture | RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex DateInWords();

    [GeneratedRegex(@"[^\s@]+@[^\s@]+\.[^\s@]")]
    private static partial Regex Address();

    [GeneratedRegex(@"\b(Mr|Mrs|Ms|Miss)\b\.?\s+\p{Lu}|\b([Pp]atient|[Pp]t)( name)?\s*[:=]\s*\p{Lu}", RegexOptions.ExplicitCapture)]
    private static partial Regex Name();
}
