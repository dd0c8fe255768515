using System.Text.RegularExpressions;

namespace Credtrack.Core.People;

/// <summary>
/// What a password must be, after NIST SP 800-63B-4 (section 3.1.1.2, from memory of its text): 15 characters where it stands alone, no rules of
/// composition, and none that is common, repetitive, sequential or made of the names around it.
/// </summary>
public static partial class PasswordRule
{
    public const int Shortest = 15;
    public const int Longest = 200;

    // A word this long with figures around it is no longer the first thing that is tried.
    private const int ShortWord = 12;
    private const string Rows = "qwertyuiopasdfghjklzxcvbnm1234567890qwertzuiopasdfghjklyxcvbnmazertyuiopqsdfghjklmwxcvbn";

    private static readonly Lazy<HashSet<string>> Common = new(Read);

    /// <param name="around">what stands around the account and is guessed first: the person's name, the address, the site's name</param>
    public static string? WhyNot(string password, params IEnumerable<string> around)
    {
        var folded = password.ToLowerInvariant();
        return password.Length < Shortest ? $"Use at least {Shortest} characters; a few words with spaces between them are fine."
            : password.Length > Longest ? $"Use at most {Longest} characters."
            : Common.Value.Contains(folded) ? "This password is among those that are tried first. Choose another one."
            : Repeats(folded) || Repeats(Ends().Replace(folded, "")) || Repeats(folded[..^1]) ? "This password repeats itself. Choose one that does not."
            : IsRow(folded) ? "These are keys or figures in a row. Choose something less regular."
            : Plain(folded) is { } word && (Common.Value.Contains(word) || Words(around).Contains(word)) ? "This is one well-known word or name with figures around it. Add words of your own."
            : null;
    }

    // Some shorter piece, written again and again.
    private static bool Repeats(string text) => Enumerable.Range(1, text.Length / 2).Any(period => text.AsSpan(period).SequenceEqual(text.AsSpan(0, text.Length - period)));

    private static bool IsRow(string text)
    {
        var steps = Enumerable.Range(1, text.Length - 1).Count(i => Math.Abs(text[i] - text[i - 1]) <= 1 || (text[i - 1], text[i]) is ('9', '0') or ('0', '9'));
        return steps >= text.Length - 2 || Rows.Contains(text, StringComparison.Ordinal);
    }

    private static string? Plain(string text) => Ends().Replace(text, "") is { Length: < ShortWord } word ? word : null;

    private static HashSet<string> Words(IEnumerable<string> around) => [.. around.Append("credtrack").SelectMany(text => Between().Split(text.ToLowerInvariant())).Where(word => word.Length > 2)];

    private static HashSet<string> Read()
    {
        using var file = new StreamReader(typeof(PasswordRule).Assembly.GetManifestResourceStream("Credtrack.Core.People.common-passwords.txt")!);
        return [.. file.ReadToEnd().Split('\n', StringSplitOptions.RemoveEmptyEntries)];
    }

    [GeneratedRegex(@"^[^\p{L}]+|[^\p{L}]+$")]
    private static partial Regex Ends();

    [GeneratedRegex(@"[^\p{L}]+")]
    private static partial Regex Between();
}
