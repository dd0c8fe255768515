using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;

namespace Credtrack.Core.Catalogue;

/// <summary>Codes of applications, views, questions and parts: small letters, digits and single hyphens. Rulebooks and files name things by them.</summary>
public static partial class Codes
{
    public const int Longest = 40;

    public static bool IsCode(string text) => text.Length <= Longest && Pattern().IsMatch(text);

    /// <summary>"Anterior chest, left" becomes anterior-chest-left; where it is taken, a number follows.</summary>
    /// <param name="text">what it is made from</param>
    /// <param name="otherwise">what it is called where the text has no letter of the alphabet</param>
    public static string Of(string text, string otherwise, IReadOnlyCollection<string> taken)
    {
        var plain = Plain(text) is { Length: > 0 } letters ? letters : otherwise;
        return Enumerable.Range(1, taken.Count + 1).Select(n => n == 1 ? plain : string.Create(CultureInfo.InvariantCulture, $"{plain}-{n}")).First(code => !taken.Contains(code));
    }

    // Four places are left for the number.
    private static string Plain(string text)
    {
        var letters = new StringBuilder();
        foreach (var letter in string.Concat(text.EnumerateRunes()).Normalize(NormalizationForm.FormD).ToLowerInvariant().Where(c => CharUnicodeInfo.GetUnicodeCategory(c) != UnicodeCategory.NonSpacingMark))
        {
            if (char.IsAsciiLetterOrDigit(letter)) letters.Append(letter);
            else if (letters is [.., not '-']) letters.Append('-');
        }
        return letters.ToString(0, Math.Min(letters.Length, Longest - 4)).Trim('-');
    }

    [GeneratedRegex(@"\A[a-z0-9]+(-[a-z0-9]+)*\z")]
    private static partial Regex Pattern();
}
