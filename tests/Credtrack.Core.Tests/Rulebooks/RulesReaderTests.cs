using Credtrack.Core.Rulebooks;

namespace Credtrack.Core.Tests.Rulebooks;

public sealed class RulesReaderTests
{
    private const string Plain = """ "applications": [{ "code": "cardiac", "require": [] }] """;

    [Theory] // the rest of a rulebook, then the paths at fault, in the order of reading
    [InlineData(Plain + """, "extra": 1 """, "$.extra")]
    [InlineData(Plain + """, "a key\n": 1 """, @"$['a key\n']")]
    [InlineData(Plain + """, "name": "again" """, "$.name")]
    [InlineData(Plain + """, "notes": null """, "$.notes")]
    [InlineData(Plain + """, "notes": "" """, "$.notes")]
    [InlineData(Plain + """, "sources": "one" """, "$.sources")]
    [InlineData(Plain + """, "sources": ["one", 2, ""] """, "$.sources[1]", "$.sources[2]")]
    [InlineData(Plain + """, "timeZone": "Europe/Nowhere" """, "$.timeZone")]
    [InlineData(Plain + """, "timeZone": "Eastern Standard Time" """, "$.timeZone")]
    [InlineData(Plain + """, "timeZone": "localtime" """, "$.timeZone")]
    [InlineData(Plain + """, "introductory": -1 """, "$.introductory")]
    [InlineData(Plain + """, "introductory": 1.5 """, "$.introductory")]
    [InlineData(Plain + """, "introductory": "1" """, "$.introductory")]
    [InlineData(Plain + """, "introductory": 1e-30 """, "$.introductory")]
    [InlineData(Plain + """, "introductory": 1e300 """, "$.introductory")]
    [InlineData(Plain + """, "onePerEncounter": "yes" """, "$.onePerEncounter")]
    [InlineData(Plain + """, "counting": [] """, "$.counting")]
    [InlineData(Plain + """, "counting": null """, "$.counting")]
    [InlineData(Plain + """, "counting": { "role": null } """, "$.counting.role")]
    [InlineData(Plain + """, "counting": { "role": [] , "setting": ["teaching"], "subtype": [""] } """, "$.counting.role", "$.counting.setting[0]", "$.counting.subtype[0]")]
    [InlineData(Plain + """, "counting": { "quality": { "min": 6 }, "views": 1, "read": 0 } """, "$.counting.quality.min", "$.counting.views", "$.counting.read")]
    [InlineData(Plain + """, "counting": { "quality": {}, "quality": {} } """, "$.counting.quality", "$.counting.quality.min")]
    [InlineData(Plain + """, "counting": { "result": ["tp"], "positive": "yes" } """, "$.counting.result[0]", "$.counting.positive")]
    [InlineData(Plain + """, "counting": { "performed": { "from": "2026-02-01", "to": "2026-01-01" } } """, "$.counting.performed")]
    [InlineData(Plain + """, "counting": { "performed": { "from": "2026-2-1", "to": null } } """, "$.counting.performed.to", "$.counting.performed.from")]
    [InlineData(""" "applications": {} """, "$.applications")]
    [InlineData(""" "notes": "none listed" """, "$.applications")]
    [InlineData(""" "applications": [1, {}] """, "$.applications[0]", "$.applications[1].code", "$.applications[1].require")]
    [InlineData(""" "applications": [{ "code": "a", "require": [] }, { "code": "a", "require": [] }] """, "$.applications[1].code")]
    [InlineData(""" "applications": [{ "code": "a", "require": [], "counting": null }] """, "$.applications[0].counting")]
    [InlineData(""" "applications": [{ "code": "a", "require": [], "caps": [{ "where": { "x": 1 }, "max": -1 }] }] """,
        "$.applications[0].caps[0].where.x", "$.applications[0].caps[0].max", "$.applications[0].caps[0].label")]
    [InlineData(Plain + """, "groups": [{ "name": "both", "applications": ["cardiac", "lung", "cardiac"], "require": [] }] """, "$.groups[0].applications[1]", "$.groups[0].applications[2]")]
    [InlineData(Plain + """, "groups": [{ "require": [] }] """, "$.groups[0].applications", "$.groups[0].name")]
    public void Every_fault_is_named_with_its_path(string rest, params string[] paths) => Assert.Equal(paths, Faults(Book.Json(rest)).Select(f => f.Path));

    [Theory] // one requirement of an application
    [InlineData("{}", "kind")]
    [InlineData("""{ "kind": "number", "min": 1 }""", "kind")]
    [InlineData("""{ "kind": 1 }""", "kind")]
    [InlineData("""{ "kind": "applications", "min": 1, "meeting": "own" }""", "kind")]
    [InlineData("""{ "kind": "hours", "of": "course", "min": 1 }""", "kind")]
    [InlineData("""{ "kind": "count" }""", "min")]
    [InlineData("""{ "kind": "count", "kind": "count", "min": 1 }""", "kind")]
    [InlineData("""{ "kind": "count", "min": -1, "target": 0.5, "max": 3 }""", "max", "min", "target")]
    [InlineData("""{ "kind": "count", "min": 1, "within": { "days": 3 }, "recent": { "months": 1 } }""", "within", "recent")]
    [InlineData("""{ "kind": "share", "min": 0.5 }""", "where")]
    [InlineData("""{ "kind": "share", "where": {}, "min": 1.5, "max": -0.1 }""", "min", "max")]
    [InlineData("""{ "kind": "share", "where": {}, "min": 0.5, "max": 0.4 }""", "min")]
    [InlineData("""{ "kind": "share", "where": {}, "of": { "role": "performed" }, "min": 0 }""", "of.role")]
    public void A_requirement_at_fault_is_named_by_its_key(string requirement, params string[] keys) =>
        Assert.Equal(keys.Select(key => $"$.applications[0].require[0].{key}"), Faults(Book.Json($$""" "applications": [{ "code": "cardiac", "require": [{{requirement}}] }] """)).Select(f => f.Path));

    [Fact]
    public void A_share_without_bounds_is_a_fault_of_the_whole() =>
        Assert.Equal("$.overall[0]: expected min, max or both", Assert.Single(Faults(Book.Json(Plain + """, "overall": [{ "kind": "share", "where": {} }] """))).ToString());

    [Theory]
    [InlineData("overall", """{ "kind": "accuracy", "measure": "accuracy", "min": 0.9 }""", "'accuracy' is not evaluated by this version; expected count or share or applications")]
    [InlineData("overall", """{ "kind": "quality", "min": 3 }""", "'quality' is not evaluated by this version; expected count or share or applications")]
    [InlineData("overall", """{ "kind": "competence" }""", "'competence' is not evaluated by this version; expected count or share or applications")]
    [InlineData("items", """{ "kind": "hours", "of": "course", "min": 2 }""", "'hours' is not evaluated by this version; expected no requirement")]
    [InlineData("items", """{ "kind": "times", "of": "course", "min": 2 }""", "'times' is not evaluated by this version; expected no requirement")]
    [InlineData("items", """{ "kind": "passed", "of": "exam", "min": 1 }""", "'passed' is not evaluated by this version; expected no requirement")]
    public void What_this_version_does_not_evaluate_is_refused_and_never_met(string list, string requirement, string expected) =>
        Assert.Equal([new Fault($"$.{list}[0].kind", expected)], Faults(Book.Json($$"""{{Plain}}, "{{list}}": [{{requirement}}] """)));

    [Theory]
    [InlineData("\"own\"")]
    [InlineData("{ \"count\": 0 }")]
    [InlineData("\"all\"", "")]
    [InlineData("5", "")]
    [InlineData("{}", ".count")]
    [InlineData("{ \"count\": -1, \"x\": 1 }", ".x", ".count")]
    public void Meeting_is_own_or_a_count(string meeting, params string[] paths) => Assert.Equal(paths.Select(path => "$.overall[0].meeting" + path),
        Faults(Book.Json($$"""{{Plain}}, "overall": [{ "kind": "applications", "min": 8.0, "meeting": {{meeting}} }] """)).Select(f => f.Path));

    [Theory]
    [InlineData("")]
    [InlineData("{ \"format\": ")]
    [InlineData("{} {}")]
    [InlineData("{ // comment\n }")]
    [InlineData("{ \"name\": \"\\ud800\" }")]
    [InlineData("{ \"\\ud800\": 1 }")]
    [InlineData("[]")]
    [InlineData("null")]
    public void What_is_no_JSON_object_is_one_fault(string text) => Assert.Equal("$", Assert.Single(Faults(text)).Path);

    [Fact]
    public void A_file_that_is_far_too_long_is_not_even_read() => Assert.Equal("$", Assert.Single(Faults(new string(' ', RulesReader.LongestText + 1))).Path);

    [Fact]
    public void An_empty_object_lacks_what_every_rulebook_has() =>
        Assert.Equal(["$.format", "$.name", "$.version", "$.effective", "$.applications"], Faults("{}").Select(f => f.Path));

    [Fact]
    public void The_zone_is_known_beside_other_faults() => Assert.Equal("Asia/Kathmandu", RulesReader.Read("""{ "timeZone": "Asia/Kathmandu" }""", "UTC").Zone!.Id);

    [Fact]
    public void What_is_left_out_has_its_default()
    {
        var rules = RulesReader.Read(Book.Json(Plain), "Europe/Lisbon").Rules!;
        Assert.Equal(("Europe/Lisbon", true, 0L, null), (rules.Zone.Id, rules.OnePerEncounter, rules.Applications[0].Introductory, rules.Applications[0].Counting.Read));
        Assert.Empty(rules.Groups.AsEnumerable<object>().Concat(rules.Overall).Concat(rules.Items).Concat(rules.Sources).Concat(rules.Applications[0].Caps));
    }

    [Fact]
    public void An_application_has_its_own_introductory_number_or_the_rulebooks()
    {
        var rules = Book.Read(""" "introductory": 5.0, "applications": [{ "code": "a", "require": [] }, { "code": "b", "introductory": 0, "require": [] }] """);
        Assert.Equal([5, 0], rules.Applications.Select(a => a.Introductory));
    }

    private static IReadOnlyList<Fault> Faults(string json) => RulesReader.Read(json, "UTC").Faults;
}
