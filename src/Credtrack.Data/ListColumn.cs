using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;
using Credtrack.Core.Catalogue;
using Credtrack.Core.Readings;
using Microsoft.EntityFrameworkCore.ChangeTracking;

namespace Credtrack.Data;

/// <summary>A short list that is only ever read and replaced whole lies in one bounded text column as JSON.</summary>
internal static class ListColumn
{
    public static Type[] Listed { get; } = [typeof(View), typeof(MarkedView), typeof(Question), typeof(Answered), typeof(Judged)];

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

    /// <summary>The same for one record that is kept as it was: two lists and what else it holds.</summary>
    public static PropertyBuilder<Judged> AsText(this PropertyBuilder<Judged> kept) =>
        kept.HasMaxLength(2 * Longest + Judgement.LongestFeedback * 2).HasConversion(value => JsonSerializer.Serialize(value, Compact), text => JsonSerializer.Deserialize<Judged>(text, Compact)!);
}
