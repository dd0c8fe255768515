using Credtrack.Core.Measures.Standings;

namespace Credtrack.Core.Rulebooks;

/// <summary>Filters as JSON: each key's meaning and words stand in one line or one small method here.</summary>
internal static class FilterReader
{
    // In the order of the format, which is the order in which a reason is looked for.
    private static readonly (string Key, Func<string, JsonPart, Condition?> Read)[] Table =
    [
        ("performed", Performed),
        ("role", (key, part) => Among(key, part, RuleWords.Roles, scan => scan.Evidence.Role, RuleWords.Said, RuleWords.Said, before: true)),
        ("setting", (key, part) => Among(key, part, RuleWords.Settings, scan => scan.Evidence.Setting, RuleWords.Said, RuleWords.Said, before: true)),
        ("indicated", (key, part) => YesNo(key, part, scan => scan.Evidence.Indicated, "clinically indicated", "not clinically indicated")),
        ("supervision", (key, part) => Among(key, part, RuleWords.Supervisions, scan => scan.Evidence.Supervision, RuleWords.Said, RuleWords.Named, before: false)),
        ("assisted", (key, part) => YesNo(key, part, scan => scan.Evidence.Assisted, "assisted", "unassisted")),
        ("subtype", Subtype),
        ("read", (_, _) => null),
        ("quality", Quality),
        ("views", Views),
        ("result", Result),
        ("positive", Positive),
    ];

    public static IEnumerable<string> Keys => Table.Select(row => row.Key);

    public static int PlaceOf(string key) => Array.FindIndex(Table, row => row.Key == key);

    /// <param name="part">The JSON of the filter.</param>
    /// <param name="removed">Where given, null is allowed, and the keys that are null are put in here.</param>
    public static Filter Read(JsonPart part, ISet<string>? removed = null)
    {
        var keys = part.Keys(Keys, removed);
        var conditions = Table.Select(row => keys[row.Key] is { } given ? row.Read(row.Key, given) : null).OfType<Condition>();
        return new([.. conditions], keys["read"]?.YesNo());
    }

    private static Condition Performed(string key, JsonPart part)
    {
        var keys = part.Keys(["from", "to"]);
        var (from, to) = (keys["from"]?.Day(), keys["to"]?.Day());
        if (from > to) part.Fault("expected from on or before to");
        var words = (from, to) switch
        {
            (null, null) => "performed on any day",
            (null, { } last) => $"performed up to {last:O}",
            ({ } first, null) => $"performed from {first:O}",
            var (first, last) => $"performed from {first:O} to {last:O}",
        };
        return new(key, false, scan => !(scan.Day < from) && !(scan.Day > to), null, words,
            scan => scan.Day < from ? $"performed before {from:O}" : $"performed after {to:O}");
    }

    private static Condition Among<T>(string key, JsonPart part, IReadOnlyDictionary<string, T> words, Func<SeenScan, T> of, Func<T, string> said, Func<T, string> named, bool before) where T : struct
    {
        var wanted = part.FilledList().Select(item => item.OneOf(words)).OfType<T>().ToHashSet();
        var phrase = string.Join(" or ", wanted.Select(said));
        return new(key, false, scan => wanted.Contains(of(scan)), before ? phrase : null, before ? null : phrase,
            scan => $"{key} is {named(of(scan))}, not {string.Join(" or ", wanted.Select(named))}");
    }

    private static Condition YesNo(string key, JsonPart part, Func<SeenScan, bool> of, string yes, string no)
    {
        var wanted = part.YesNo() ?? true;
        return new(key, false, scan => of(scan) == wanted, wanted ? yes : no, null, _ => wanted ? no : yes);
    }

    private static Condition Subtype(string key, JsonPart part)
    {
        var wanted = part.FilledList().Select(item => item.Text()).OfType<string>().ToHashSet(StringComparer.Ordinal);
        return new(key, false, scan => scan.Evidence.Subtype is { } subtype && wanted.Contains(subtype), null, $"of subtype {string.Join(" or ", wanted)}",
            scan => scan.Evidence.Subtype is { } subtype ? $"part is {subtype}, not {string.Join(" or ", wanted)}" : "no subtype given");
    }

    private static Condition Quality(string key, JsonPart part)
    {
        var least = part.Keys(["min"]).Required("min")?.Number(1, 5) ?? 1;
        return new(key, true, scan => scan.Reading?.Quality >= least, null, FormattableString.Invariant($"of image quality {least} or better"),
            scan => scan.Reading?.Quality is null ? "no image quality given" : FormattableString.Invariant($"image quality below {least}"));
    }

    private static Condition Views(string key, JsonPart part)
    {
        var wanted = part.YesNo() ?? true;
        return new(key, true, scan => scan.Reading?.Views == wanted, null, wanted ? "with all required views adequate" : "with a required view not adequate",
            scan => scan.Reading?.Views is null ? "the required views were not judged" : wanted ? "a required view is not adequate" : "all required views are adequate");
    }

    private static Condition Result(string key, JsonPart part)
    {
        var wanted = part.FilledList().Select(item => item.OneOf(RuleWords.Results)).OfType<Readings.Result>().ToHashSet();
        return new(key, true, scan => scan.Result is { } result && wanted.Contains(result), null, $"with result {string.Join(" or ", wanted)}",
            scan => scan.Result is { } result ? $"result is {result}, not {string.Join(" or ", wanted)}" : "no result given");
    }

    private static Condition Positive(string key, JsonPart part)
    {
        var wanted = part.YesNo() ?? true;
        var word = wanted ? "positive" : "negative";
        return new(key, true, scan => scan.Positive == wanted, word, null, scan => scan.Result is { } result ? $"result {result} is not {word}" : "no result given");
    }
}
