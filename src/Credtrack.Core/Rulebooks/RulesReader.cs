using System.Text.Json;
using Credtrack.Core.Plumbing;
using Credtrack.Core.Rulebooks.Requirements;

namespace Credtrack.Core.Rulebooks;

/// <summary>What came of reading a rulebook's file: the rules, or every fault in it.</summary>
/// <param name="Zone">Known even beside faults, as long as the time zone itself is none.</param>
public sealed record RulesRead(Rules? Rules, IReadOnlyList<Fault> Faults, TimeZoneInfo? Zone);

/// <summary>Reads the format credtrack-rulebook/1.</summary>
public static class RulesReader
{
    /// <summary>Far above any rulebook that people can keep in their heads; bounds the work on a file that is none.</summary>
    public const int LongestText = 1_000_000;

    private static readonly string[] Top =
        ["format", "name", "version", "effective", "timeZone", "notes", "sources", "counting", "introductory", "onePerEncounter", "applications", "groups", "overall", "items"];

    /// <param name="json">The text of the file, at most <see cref="LongestText"/> characters.</param>
    /// <param name="defaultTimeZone">The IANA name of the zone that holds where the rulebook names none.</param>
    public static RulesRead Read(string json, string defaultTimeZone)
    {
        if (json.Length > LongestText) return new(null, [new Fault("$", $"expected at most {LongestText} characters")], null);
        using var document = JsonText.Read(json, out var fault);
        if (document is null) return new(null, [new Fault("$", fault!)], null);
        var faults = new List<Fault>();
        var rules = Read(new JsonPart(document.RootElement, "$", faults), defaultTimeZone, out var zone);
        return new(faults.Count == 0 ? rules : null, faults, zone);
    }

    private static Rules Read(JsonPart root, string defaultTimeZone, out TimeZoneInfo? zone)
    {
        var keys = root.Keys(Top);
        if (keys.Required("format") is { } format && !format.IsText(Rules.Format)) format.Fault($"expected \"{Rules.Format}\"");
        var name = keys.Required("name")?.Text();
        var version = keys.Required("version")?.Whole(1);
        var effective = keys.Required("effective")?.Day();
        zone = keys.Has("timeZone") ? keys["timeZone"] is { } named ? Zone(named) : null : TimeZoneInfo.FindSystemTimeZoneById(defaultTimeZone);
        var notes = keys["notes"]?.Text();
        var sources = (keys["sources"]?.List() ?? []).Select(part => part.Text()).OfType<string>().ToList();
        var counting = keys["counting"] is { } filter ? FilterReader.Read(filter) : new([]);
        var introductory = keys["introductory"]?.Whole(0) ?? 0;
        var onePerEncounter = keys["onePerEncounter"]?.YesNo() ?? true;
        var listed = new HashSet<string>(StringComparer.Ordinal);
        var applications = (keys.Required("applications")?.List() ?? []).Select(part => Application(part, counting, introductory, listed)).ToList();
        var groups = (keys["groups"]?.List() ?? []).Select(part => Group(part, listed)).ToList();
        var overall = Kinds.ReadAll(keys["overall"], Place.Overall);
        var items = Kinds.ReadAll(keys["items"], Place.Items);
        return new(name ?? "", version ?? 1, effective ?? default, zone ?? TimeZoneInfo.Utc, notes, sources, onePerEncounter, applications, groups, overall, items);
    }

    // Every IANA name begins with a capital; the machine's own files of other names do not.
    private static TimeZoneInfo? Zone(JsonPart part)
    {
        if (part.IsText(out var name) && name is [>= 'A' and <= 'Z', ..] && TimeZoneInfo.TryFindSystemTimeZoneById(name, out var zone) && zone.HasIanaId && zone.Id == name) return zone;
        part.Fault("expected the IANA name of a time zone, such as Europe/Lisbon");
        return null;
    }

    private static ApplicationRules Application(JsonPart part, Filter counting, long introductory, HashSet<string> listed)
    {
        var keys = part.Keys(["code", "name", "privilege", "counting", "introductory", "caps", "require"]);
        var code = keys.Required("code")?.Text();
        if (code is not null && !listed.Add(code)) keys.Fault("code", "expected each application once");
        var removed = new HashSet<string>();
        var own = keys["counting"] is { } filter ? FilterReader.Read(filter, removed) : new([]);
        var caps = (keys["caps"]?.List() ?? []).Select(Cap).ToList();
        return new(code ?? "", keys["name"]?.Text(), keys["privilege"]?.Text(), own.Over(counting, removed),
            keys["introductory"]?.Whole(0) ?? introductory, caps, Kinds.ReadAll(keys.Required("require"), Place.Application));
    }

    private static Cap Cap(JsonPart part)
    {
        var keys = part.Keys(["where", "max", "label"]);
        var where = keys.Required("where") is { } filter ? FilterReader.Read(filter) : new([]);
        return new(where, keys.Required("max")?.Whole(0) ?? 0, keys.Required("label")?.Text() ?? "");
    }

    private static GroupRules Group(JsonPart part, HashSet<string> listed)
    {
        var keys = part.Keys(["name", "applications", "require"]);
        var codes = new List<string>();
        foreach (var item in keys.Required("applications")?.List() ?? [])
        {
            if (item.Text() is not { } code) continue;
            if (!listed.Contains(code)) item.Fault("expected the code of an application of this rulebook");
            else if (codes.Contains(code)) item.Fault("expected each code once");
            codes.Add(code);
        }
        return new(keys.Required("name")?.Text() ?? "", codes, Kinds.ReadAll(keys.Required("require"), Place.Group));
    }
}
