using nietras.SeparatedValues;

namespace Credtrack.Web.Commands;

/// <summary>Something wrong in a table: the first line of the record, the column where it is one column's fault, and what was expected.</summary>
public sealed record CsvFault(int Line, string? Column, string Expected);

/// <summary>How a table that others made is read as one of ours.</summary>
/// <param name="FieldOf">our name of one of its columns, or null for one that is dropped</param>
/// <param name="Say">what a cell of that column of ours says, in our words</param>
/// <param name="MostRows">where reading ends with a fault</param>
public sealed record CsvMeaning(char Separator, Func<string, string?> FieldOf, Func<string, string, string> Say, int MostRows);

/// <summary>A table with a header row, by RFC 4180 with either line end. Cells are compared exactly: nothing is trimmed or folded.</summary>
public sealed class CsvTable(CsvMeaning? meaning = null)
{
    /// <summary>Below what Sep can hold, and far above any record of ours.</summary>
    public const int LongestRecord = 1_000_000;

    private readonly Dictionary<string, int> places = new(StringComparer.Ordinal);
    private string?[]? byPlace;

    public List<CsvFault> Faults { get; } = [];
    public List<CsvRow> Rows { get; } = [];

    /// <summary>The columns by the names that the table gives them.</summary>
    public List<string> Header { get; } = [];

    public int? PlaceOf(string column) => places.TryGetValue(column, out var place) ? place : null;

    public static CsvTable Read(string text, IEnumerable<string> required, CsvMeaning? meaning = null)
    {
        var table = new CsvTable(meaning);
        if (TooLong(text) is { } line)
        {
            table.Faults.Add(new(line, null, $"expected a record of at most {LongestRecord} characters; is a quote left open?"));
            return table;
        }
        // Sep keeps lines and cells; headers, counts and quotes are judged here, because a fault must name its line and column.
        using var reader = Sep.New(meaning?.Separator ?? ',').Reader(options => options with { HasHeader = false, DisableColCountCheck = true, Unescape = false }).FromText(text);
        var header = 0;
        foreach (var record in reader)
        {
            if (header == 0) header = table.AddHeader(record, required);
            else table.Add(record, header);
            if (table.Rows.Count <= meaning?.MostRows || meaning is null) continue;
            table.Faults.Add(new(record.LineNumberFrom, null, FormattableString.Invariant($"expected at most {meaning.MostRows:N0} rows; split the file")));
            break;
        }
        if (header == 0) table.Faults.Add(new(1, null, "expected a header row"));
        return table;
    }

    private int AddHeader(SepReader.Row record, IEnumerable<string> required)
    {
        for (var place = 0; place < record.ColCount; place++)
        {
            var name = Plain(record[place].Span);
            if (name is null) Faults.Add(new(1, null, $"expected quotes around the whole of column name {place + 1}, and doubled inside"));
            if (name is not null) Header.Add(name);
            if (name is null || (meaning is not null && meaning.FieldOf(name) is null)) continue;
            if (!places.TryAdd(meaning?.FieldOf(name) ?? name, place)) Faults.Add(new(1, name, "expected this column once"));
        }
        Faults.AddRange(required.Where(name => !places.ContainsKey(name)).Select(name => new CsvFault(1, name, "expected this column, which is missing")));
        return record.ColCount;
    }

    private void Add(SepReader.Row record, int width)
    {
        // A line without a single character holds no evidence; many editors leave one at the end.
        if (record.ColCount == 1 && record[0].Span.IsEmpty) return;
        if (record.ColCount != width)
        {
            Faults.Add(new(record.LineNumberFrom, null, $"expected {width} cells, found {record.ColCount}"));
            return;
        }
        var (cells, fields) = (new string[width], Fields(width));
        for (var place = 0; place < width; place++)
        {
            if (Plain(record[place].Span) is { } cell)
            {
                cells[place] = meaning is null || fields[place] is not { } field ? cell : meaning.Say(field, cell);
                continue;
            }
            Faults.Add(new(record.LineNumberFrom, fields[place], "expected quotes around the whole cell, and doubled inside"));
            cells[place] = "";
        }
        Rows.Add(new CsvRow(this, record.LineNumberFrom, cells));
    }

    private string?[] Fields(int width)
    {
        if (byPlace?.Length == width) return byPlace;
        byPlace = new string?[width];
        foreach (var (name, place) in places) byPlace[place] = name;
        return byPlace;
    }

    /// <summary>The first line of the first record that is too long, as one is whose quote is never closed.</summary>
    private static int? TooLong(string text)
    {
        var (line, first, start, quoted) = (1, 1, 0, false);
        for (var at = 0; at < text.Length; at++)
        {
            if (at - start >= LongestRecord) return first;
            if (text[at] == '"') quoted = !quoted;
            if (text[at] != '\n') continue;
            line++;
            if (!quoted) (first, start) = (line, at + 1);
        }
        return null;
    }

    /// <summary>What the cell means, or null where its quotes are out of place.</summary>
    private static string? Plain(ReadOnlySpan<char> raw)
    {
        if (!raw.Contains('"')) return raw.ToString();
        if (raw.Length < 2 || raw[0] != '"' || raw[^1] != '"') return null;
        var inner = raw[1..^1].ToString();
        return inner.Replace("\"\"", "", StringComparison.Ordinal).Contains('"') ? null : inner.Replace("\"\"", "\"", StringComparison.Ordinal);
    }
}
