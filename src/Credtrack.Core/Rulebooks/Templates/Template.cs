using System.Reflection;
using System.Text.Json;

namespace Credtrack.Core.Rulebooks.Templates;

/// <summary>A rulebook to start from, built from published thresholds that its sources cite. Local rules override every number in it.</summary>
public sealed record Template(string Id, string Name, string Text)
{
    private const string Folder = "Credtrack.Core.Rulebooks.Templates.";

    /// <summary>All that are shipped, by id. The id is the name of the file.</summary>
    public static IReadOnlyList<Template> All { get; } = [.. from name in Assembly.GetExecutingAssembly().GetManifestResourceNames().Order(StringComparer.Ordinal)
                                                             where name.StartsWith(Folder, StringComparison.Ordinal)
                                                             select Load(name)];

    public static Template? Find(string id) => All.FirstOrDefault(template => template.Id == id);

    private static Template Load(string resource)
    {
        using var reader = new StreamReader(Assembly.GetExecutingAssembly().GetManifestResourceStream(resource)!);
        var text = reader.ReadToEnd();
        using var json = JsonDocument.Parse(text);
        return new(resource[Folder.Length..^".json".Length], json.RootElement.GetProperty("name").GetString()!, text);
    }
}
