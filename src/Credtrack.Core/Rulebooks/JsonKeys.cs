using System.Text.Json;
using System.Text.RegularExpressions;

namespace Credtrack.Core.Rulebooks;

/// <summary>The keys of one object of a rulebook's file. A key that is at fault is neither given nor missing: it is named once.</summary>
internal sealed partial class JsonKeys(string path, List<Fault> faults)
{
    private readonly Dictionary<string, JsonPart?> parts = [];
    private bool isObject;

    public JsonPart? this[string key] => parts.GetValueOrDefault(key);

    /// <summary>Whether the key stands there, at fault or not.</summary>
    public bool Has(string key) => parts.ContainsKey(key);

    public JsonPart? Required(string key)
    {
        if (isObject && !Has(key)) faults.Add(new Fault(PathOf(key), "expected this key, which is missing"));
        return this[key];
    }

    public void Fault(string key, string expected) => faults.Add(new Fault(PathOf(key), expected));

    public void Add(JsonElement json, IReadOnlyList<string> known, ISet<string>? nulls)
    {
        isObject = true;
        var seen = new HashSet<string>();
        foreach (var property in json.EnumerateObject())
        {
            var isNull = property.Value.ValueKind == JsonValueKind.Null;
            if (!seen.Add(property.Name)) Fault(property.Name, "expected this key once");
            else if (!known.Contains(property.Name)) Fault(property.Name, $"unknown key; expected one of {string.Join(", ", known)}");
            else parts[property.Name] = isNull ? null : new JsonPart(property.Value, PathOf(property.Name), faults);
            if (!isNull) continue;
            if (nulls is null) Fault(property.Name, "expected a value, not null");
            else nulls.Add(property.Name);
        }
    }

    // A key with odd characters is quoted and escaped, so that a fault stays on its line.
    private string PathOf(string key) => Plain().IsMatch(key) ? $"{path}.{key}" : $"{path}['{JsonEncodedText.Encode(key)}']";

    [GeneratedRegex(@"\A[A-Za-z_][A-Za-z0-9_]*\z")]
    private static partial Regex Plain();
}
