using System.Text.Json;
using System.Text.Json.Serialization;

namespace Credtrack.Core.Catalogue;

/// <summary>An application as the shipped file describes it: starting values that a site edits.</summary>
public sealed record CatalogueEntry(
    string Code, string Name, ApplicationKind Kind, string Transducer, double[] FrequencyMHz, double[] DepthCm, string? Note,
    IReadOnlyList<View> Views, IReadOnlyList<Question> Questions, IReadOnlyList<string>? Subtypes)
{
    private static readonly JsonSerializerOptions Names = new()
    {
        PropertyNameCaseInsensitive = true,
        Converters = { new JsonStringEnumConverter(JsonNamingPolicy.KebabCaseLower) },
    };

    public static IReadOnlyList<CatalogueEntry> Shipped { get; } = Read();

    private static IReadOnlyList<CatalogueEntry> Read()
    {
        using var file = typeof(CatalogueEntry).Assembly.GetManifestResourceStream("Credtrack.Core.Catalogue.catalogue.json")!;
        return JsonSerializer.Deserialize<CatalogueFile>(file, Names)!.Applications;
    }

    private sealed record CatalogueFile(IReadOnlyList<CatalogueEntry> Applications);
}
