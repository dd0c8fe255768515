using Credtrack.Core.Measures;

namespace Credtrack.Web.Commands;

/// <summary>One record of a table. What is not as expected becomes a fault of the table at this line and column.</summary>
public sealed class CsvRow(CsvTable table, int line, string[] cells)
{
    /// <summary>The first physical line of the record.</summary>
    public int Line => line;

    /// <summary>The cell; null where it is empty or the column is not there.</summary>
    public string? this[string column] => table.PlaceOf(column) is { } place && cells[place].Length > 0 ? cells[place] : null;

    public void Fault(string column, string expected) => table.Faults.Add(new(line, column, expected));

    /// <summary>A missing column is one fault of the header, not one of every row.</summary>
    public string Required(string column)
    {
        if (this[column] is { } text) return text;
        if (table.PlaceOf(column) is not null) Fault(column, "expected a value");
        return "";
    }

    public T Word<T>(string column, IReadOnlyDictionary<string, T> words, T unless) where T : struct => Word(column, words) ?? unless;

    public T? Word<T>(string column, IReadOnlyDictionary<string, T> words) where T : struct
    {
        if (this[column] is not { } text) return null;
        if (words.TryGetValue(text, out var value)) return value;
        Fault(column, $"expected one of {string.Join(", ", words.Keys)}");
        return null;
    }

    public DateTime? Time(string column, TimeZoneInfo zone)
    {
        if (this[column] is not { } text) return null;
        if (TimeText.ReadUtc(text, zone) is { } utc) return utc;
        Fault(column, $"expected {TimeText.Expected}");
        return null;
    }
}
