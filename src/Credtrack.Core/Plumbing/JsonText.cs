using System.Text.Json;

namespace Credtrack.Core.Plumbing;

/// <summary>Text that may be JSON. The one place of the core that answers an exception: the language's own reader has no other way to say no.</summary>
public static class JsonText
{
    /// <summary>The document, which keeps keys that occur twice; or null and a sentence that says where the text breaks off being JSON.</summary>
    public static JsonDocument? Read(string text, out string? fault)
    {
        fault = null;
        try
        {
            var document = JsonDocument.Parse(text);
            ReadEveryText(document.RootElement);
            return document;
        }
        catch (JsonException broken)
        {
            fault = $"expected JSON, but the text breaks off being JSON in line {broken.LineNumber + 1}";
        }
        catch (InvalidOperationException)
        {
            fault = "expected JSON, but a text in it has half of a surrogate pair";
        }
        return null;
    }

    // A lone surrogate passes the parser and fails only where the text is asked for.
    private static void ReadEveryText(JsonElement element)
    {
        if (element.ValueKind == JsonValueKind.String) _ = element.GetString();
        if (element.ValueKind == JsonValueKind.Array)
            foreach (var item in element.EnumerateArray()) ReadEveryText(item);
        if (element.ValueKind != JsonValueKind.Object) return;
        foreach (var property in element.EnumerateObject())
        {
            _ = property.Name;
            ReadEveryText(property.Value);
        }
    }
}
