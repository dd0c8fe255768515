namespace Credtrack.Core.Rulebooks.Requirements;

/// <summary>All kinds of the format: where each may stand and what reads it. Without a reader it is a fault, so that it is never silently met.</summary>
internal static class Kinds
{
    private const Place OfScans = Place.Application | Place.Group | Place.Overall;

    private static readonly Dictionary<string, (Place Places, Func<JsonPart, Place, Requirement>? Read)> Table = new()
    {
        ["count"] = (OfScans, Count.Read),
        ["share"] = (OfScans, (part, _) => Share.Read(part)),
        ["accuracy"] = (OfScans, null),
        ["quality"] = (OfScans, null),
        ["competence"] = (OfScans, null),
        ["applications"] = (Place.Overall, (part, _) => ApplicationsMeeting.Read(part)),
        ["hours"] = (Place.Items, null),
        ["times"] = (Place.Items, null),
        ["passed"] = (Place.Items, null),
    };

    public static IReadOnlyList<Requirement> ReadAll(JsonPart? list, Place place) =>
        [.. (list?.List() ?? []).Select(part => Read(part, place)).OfType<Requirement>()];

    private static Requirement? Read(JsonPart part, Place place)
    {
        if (part.Glance("kind") is not { } kind) part.Keys(["kind"]).Required("kind");
        else if (!kind.IsText(out var name) || !Table.TryGetValue(name, out var row) || !row.Places.HasFlag(place))
            kind.Fault($"expected one of {string.Join(", ", At(place).Select(pair => pair.Key))}");
        else if (row.Read is null)
            kind.Fault($"'{name}' is not evaluated by this version; expected {string.Join(" or ", At(place).Where(pair => pair.Value.Read is not null).Select(pair => pair.Key).DefaultIfEmpty("no requirement"))}");
        else return row.Read(part, place);
        return null;
    }

    private static IEnumerable<KeyValuePair<string, (Place Places, Func<JsonPart, Place, Requirement>? Read)>> At(Place place) =>
        Table.Where(pair => pair.Value.Places.HasFlag(place));
}
