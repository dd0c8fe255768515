using System.Text.Json;
using Credtrack.Core.Measures;
using Credtrack.Core.Plumbing;

namespace Credtrack.Core.Rulebooks;

/// <summary>One value of a rulebook's file, which knows its path. What is not as expected becomes a fault, and the answer is null.</summary>
internal sealed class JsonPart(JsonElement json, string path, List<Fault> faults)
{
    public string Path => path;

    public void Fault(string expected) => faults.Add(new Fault(path, expected));

    public string? Text() => !Is(JsonValueKind.String) || json.GetString() is not { Length: > 0 } text ? Refuse<string>("expected a text that is not empty")
        : TextLine.WhyNot(text, Rulebook.LongestText) is null ? text : Refuse<string>("expected a text in one line, without control characters and marks that turn its direction");

    public bool? YesNo() => json.ValueKind switch
    {
        JsonValueKind.True => true,
        JsonValueKind.False => false,
        _ => RefuseValue<bool>("expected true or false"),
    };

    /// <summary>A whole number from the least to 2^53; 8.0 is whole too.</summary>
    public long? Whole(long least) =>
        Is(JsonValueKind.Number) && json.TryGetDecimal(out var exact) && decimal.IsInteger(exact) && json.GetDouble() == (double)exact
        && exact >= least && exact <= 1L << 53 ? (long)exact : RefuseValue<long>($"expected a whole number, {least} or more (2^53 at most)");

    public double? Number(double least, double most) =>
        Is(JsonValueKind.Number) && json.TryGetDouble(out var number) && number >= least && number <= most ? number
        : RefuseValue<double>($"expected a number from {least} to {most}");

    public DateOnly? Day() => Is(JsonValueKind.String) && TimeText.ReadDay(json.GetString()!) is { } day ? day
        : RefuseValue<DateOnly>("expected a date, YYYY-MM-DD");

    public T? OneOf<T>(IReadOnlyDictionary<string, T> words) where T : struct =>
        Is(JsonValueKind.String) && words.TryGetValue(json.GetString()!, out var value) ? value
        : RefuseValue<T>($"expected one of {string.Join(", ", words.Keys)}");

    /// <summary>The parts of a list; none if it is no list.</summary>
    public IReadOnlyList<JsonPart> List()
    {
        if (Is(JsonValueKind.Array)) return [.. json.EnumerateArray().Select((item, at) => new JsonPart(item, $"{path}[{at}]", faults))];
        Fault("expected a list");
        return [];
    }

    /// <summary>A list that must hold something, as lists in a filter must.</summary>
    public IReadOnlyList<JsonPart> FilledList()
    {
        if (!Is(JsonValueKind.Array) || json.GetArrayLength() > 0) return List();
        Fault("expected a list that is not empty");
        return [];
    }

    /// <summary>The keys of an object. Unknown keys, keys twice and null are faults, unless <paramref name="nulls"/> asks which keys are null.</summary>
    public JsonKeys Keys(IEnumerable<string> known, ISet<string>? nulls = null)
    {
        var keys = new JsonKeys(path, faults);
        if (!Is(JsonValueKind.Object)) Fault("expected an object");
        else keys.Add(json, [.. known], nulls);
        return keys;
    }

    /// <summary>A key of an object before the object is read, and so without a fault.</summary>
    public JsonPart? Glance(string key) => Is(JsonValueKind.Object) && json.EnumerateObject().Where(p => p.Name == key).Select(p => p.Value).ToList() is [var value, ..]
        ? new JsonPart(value, $"{path}.{key}", faults) : null;

    public bool IsText(out string text)
    {
        text = Is(JsonValueKind.String) ? json.GetString()! : "";
        return Is(JsonValueKind.String);
    }

    public bool IsText(string wanted) => IsText(out var text) && text == wanted;

    private bool Is(JsonValueKind kind) => json.ValueKind == kind;

    private T? Refuse<T>(string expected) where T : class
    {
        Fault(expected);
        return null;
    }

    private T? RefuseValue<T>(string expected) where T : struct
    {
        Fault(expected);
        return null;
    }
}
