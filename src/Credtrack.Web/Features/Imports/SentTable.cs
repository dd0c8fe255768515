using Credtrack.Web.Commands;

namespace Credtrack.Web.Features.Imports;

/// <summary>A file as it was sent: its header and what its columns say, before anybody has said what they mean.</summary>
public sealed class SentTable
{
    private readonly CsvTable table;

    public string Text { get; }
    public char Separator { get; }
    public IReadOnlyList<string> Header => table.Header;

    /// <summary>In our own format, which is taken at its word: a word that is none of its words is a fault there, no question.</summary>
    public bool IsOurs => ScansCsv.Required.All(table.Header.Contains);

    private SentTable(string text, char separator)
    {
        (Text, Separator) = (text, separator);
        table = CsvTable.Read(text, [], new CsvMeaning(separator, name => name, (_, cell) => cell, Core.Imports.Import.MostRows));
    }

    /// <summary>The table, or null and a sentence that says why the file is none.</summary>
    public static SentTable? Read(byte[] content, out string? fault)
    {
        if (Utf8Text.Read(content, out fault) is not { } text)
        {
            if (!content.Contains((byte)0)) fault += FormattableString.Invariant($" The first letter in question stands in line {Utf8Text.FirstBadLine(content)}.");
            return null;
        }
        var header = text.AsSpan(0, text.AsSpan().IndexOfAny('\r', '\n') is >= 0 and var end ? end : text.Length);
        var sent = new SentTable(text, header.Contains(',') ? ',' : header.Contains(';') ? ';' : header.Contains('\t') ? '\t' : ',');
        fault = string.IsNullOrWhiteSpace(text)                      ? "This file is empty. Choose another one."
            : sent.table.Faults.Find(f => f.Column is null && (f.Line == 1 || sent.table.Rows.Count is 0 or > Core.Imports.Import.MostRows)) is { } f ? $"Line {f.Line}: {f.Expected.TrimEnd('?')}. Correct the file and send it again."
            : sent.Header.Distinct().Count() < sent.Header.Count     ? "A column stands twice in the first line. Give each column a name of its own and send the file again."
            : sent.Header.Count < 2                                  ? "The first line names fewer than two columns. Save the table as CSV, with the names of its columns in the first line."
            : sent.table.Rows.Count == 0                             ? "This file has a header and no row. Choose another one."
            : null;
        return fault is null ? sent : null;
    }

    /// <summary>What a column says, each once, in the order of the file; nothing where there is none.</summary>
    public IReadOnlyList<string> Says(string? header) => header is null || table.PlaceOf(header) is null ? [] : [.. table.Rows.Select(r => r[header]).OfType<string>().Distinct(StringComparer.Ordinal)];
}
