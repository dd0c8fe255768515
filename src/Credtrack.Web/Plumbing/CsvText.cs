using System.Globalization;
using System.Text;

namespace Credtrack.Web.Plumbing;

/// <summary>
/// A table as CSV by RFC 4180, in UTF-8 with a byte order mark, for people who open it in a spreadsheet. Every text stands in quotes, and one that a
/// spreadsheet would take for a formula begins with an apostrophe (OWASP, CSV Injection; OWASP ASVS 5.0, requirement 1.2.10). Numbers and days stay what they are.
/// </summary>
public static class CsvText
{
    public const string Type = "text/csv; charset=utf-8";
    private const string Formulas = "=+-@\t\r\n\0＝＋－＠"; // the wide ones too: some spreadsheets fold them

    public static byte[] Of(IEnumerable<object?[]> rows)
    {
        var text = new StringBuilder();
        foreach (var row in rows) text.AppendJoin(',', row.Select(Cell)).Append("\r\n");
        return [.. Encoding.UTF8.Preamble, .. Encoding.UTF8.GetBytes(text.ToString())];
    }

    private static string Cell(object? value) => value switch
    {
        null => "",
        int number => number.ToString(CultureInfo.InvariantCulture),
        bool yes => yes ? "yes" : "no",
        DateOnly day => day.Iso(),
        var text => $"\"{Tame(text.ToString()!).Replace("\"", "\"\"", StringComparison.Ordinal)}\"",
    };

    private static string Tame(string text)
    {
        var first = text.AsSpan().IndexOfAnyExcept(Blanks);
        return first >= 0 && Formulas.Contains(text[first], StringComparison.Ordinal) ? $"'{text}" : text;
    }

    private static readonly System.Buffers.SearchValues<char> Blanks =
        System.Buffers.SearchValues.Create([.. Enumerable.Range(0, char.MaxValue + 1).Select(c => (char)c).Where(c => (char.IsWhiteSpace(c) || char.GetUnicodeCategory(c) == UnicodeCategory.Format) && !Formulas.Contains(c, StringComparison.Ordinal))]);
}
