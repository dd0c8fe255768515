using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;
using Credtrack.Web.Commands;

namespace Credtrack.Web.Features.Imports;

/// <summary>What a file means: which of its columns is which field, what its words say, how its dates run, who its people are.</summary>
/// <param name="Columns">by field, the header in the file</param>
/// <param name="Words">by field, what the file says and what we say for it</param>
/// <param name="Dates">null while nobody has decided</param>
/// <param name="People">what the file calls a person: the id of a trainee, New or Out</param>
/// <param name="Enrolled">those that this import has enrolled; they become trainees when it is confirmed</param>
public sealed record Mapping(
    IReadOnlyDictionary<string, string> Columns, IReadOnlyDictionary<string, Dictionary<string, string>> Words, DateOrder? Dates,
    IReadOnlyDictionary<string, string> People, IReadOnlyList<Guid> Enrolled)
{
    public const string New = "new", Out = "out", Nothing = "(nothing)";

    private static readonly JsonSerializerOptions Compact = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping, Converters = { new JsonStringEnumConverter() } };

    public static Mapping None { get; } = new(new Dictionary<string, string>(), new Dictionary<string, Dictionary<string, string>>(), null, new Dictionary<string, string>(), []);

    public static Mapping Of(string? json) => json is null ? None : JsonSerializer.Deserialize<Mapping>(json, Compact)!;

    public string ToJson() => JsonSerializer.Serialize(this, Compact);

    /// <summary>The file as one of ours.</summary>
    public CsvMeaning Meaning(char separator)
    {
        var fields = Columns.ToDictionary(c => c.Value, c => c.Key, StringComparer.Ordinal);
        var times = Fields.All.Where(f => f.IsTime).Select(f => f.Name).ToHashSet();
        return new(separator, fields.GetValueOrDefault, (field, cell) => times.Contains(field) ? (Dates ?? DateOrder.YearFirst).Iso(cell.Trim())
            : Words.TryGetValue(field, out var words) && words.TryGetValue(cell, out var word) ? word == Nothing ? "" : word : cell, Core.Imports.Import.MostRows);
    }
}
