using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;
using Credtrack.Core.Catalogue;
using Microsoft.EntityFrameworkCore.ChangeTracking;

namespace Credtrack.Data;

/// <summary>A short list that is only ever read and replaced whole lies in one bounded text column as JSON.</summary>
internal static class ListColumn
{
    public static Type[] Listed { get; } = [typeof(View), typeof(MarkedView), typeof(Question), typeof(Answered)];

    private const int Longest = 8000;

    // Letters of any script take one place each, so that a list of a given length fits whatever it is written in. The column is never read as HTML.
    private static readonly JsonSerializerOptions Compact = new()
    {
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
        Converters = { new JsonStringEnumConverter() },
    };

    public static PropertyBuilder<IReadOnlyList<T>> AsText<T>(this PropertyBuilder<IReadOnlyList<T>> list)
    {
        list.HasMaxLength(Longest).HasConversion(
            values => JsonSerializer.Serialize(values, Compact),
            text => JsonSerializer.Deserialize<List<T>>(text, Compact)!,
            new ValueComparer<IReadOnlyList<T>>((a, b) => a!.SequenceEqual(b!), values => values.Aggregate(0, (hash, v) => HashCode.Combine(hash, v)), values => values));
        return list;
    }
}
