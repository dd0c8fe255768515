using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Rulebooks.Requirements;

public sealed class RequirementTests
{
    // Counting: two positive (one of them teaching), one negative. Pending: two, one of them teaching.
    private static readonly ScanEvidence[] Scans =
    [
        Book.Scan("a", 1).As(Result.TP), Book.Scan("b", 2).As(Result.FN) with { Setting = Setting.Education }, Book.Scan("c", 3).As(Result.TN),
        Book.Scan("d", 4), Book.Scan("e", 5) with { Setting = Setting.Education },
    ];

    [Theory]
    [InlineData("""{ "kind": "count", "min": 3 }""", true, 3, 0, 2, "3 scans", null)]
    [InlineData("""{ "kind": "count", "min": 5, "target": 10 }""", false, 3, 2, 2, "5 scans (goal 10)", "2 scans")]
    [InlineData("""{ "kind": "count", "min": 3, "where": { "positive": true } }""", false, 2, 1, 2, "3 positive scans", "1 positive scan")]
    [InlineData("""{ "kind": "count", "min": 2, "where": { "setting": ["education"] } }""", false, 1, 1, 1, "2 teaching scans", "1 teaching scan")]
    [InlineData("""{ "kind": "count", "min": 0, "where": { "assisted": true } }""", true, 0, 0, 0, "0 assisted scans", null)]
    public void A_count_says_what_is_there_what_is_missing_and_what_may_come(string json, bool met, int value, int missing, int pending, string asks, string? lacks)
    {
        var standing = Measured(json, Scans);
        Assert.Equal((met, (double?)value, (double?)missing, pending, asks, lacks), (standing.Met, standing.Value, standing.Missing, standing.Pending, standing.Asks, standing.Lacks));
        Assert.Equal((null, null), (standing.Max, standing.N));
    }

    [Theory]
    [InlineData("""{ "kind": "share", "where": { "positive": true }, "min": 0.5 }""", true, 2.0 / 3, 3, "at least 50 % positive", null)]
    [InlineData("""{ "kind": "share", "where": { "positive": false }, "min": 0.5 }""", false, 1.0 / 3, 3, "at least 50 % negative", "at least 50 % negative; 33.33 % so far")]
    [InlineData("""{ "kind": "share", "where": { "positive": false }, "max": 0.2 }""", false, 1.0 / 3, 3, "at most 20 % negative", "at most 20 % negative; 33.33 % so far")]
    [InlineData("""{ "kind": "share", "where": {}, "min": 0.1, "max": 1 }""", true, 1.0, 3, "10 % to 100 % read", null)]
    [InlineData("""{ "kind": "share", "where": { "positive": true }, "of": { "setting": ["clinical"] }, "min": 0.5 }""", true, 0.5, 2, "at least 50 % positive, among clinical scans", null)]
    [InlineData("""{ "kind": "share", "where": {}, "of": { "setting": ["simulation"] }, "min": 0 }""", false, null, 0, "at least 0 % read, among simulation scans", "at least 0 % read, among simulation scans; no scan to take it from yet")]
    [InlineData("""{ "kind": "share", "where": {}, "of": { "setting": ["simulation"] }, "max": 0 }""", true, null, 0, "at most 0 % read, among simulation scans", null)]
    public void A_share_is_one_division_and_null_without_a_base(string json, bool met, double? value, int n, string asks, string? lacks)
    {
        var standing = Measured(json, Scans);
        Assert.Equal((met, value, n, asks, lacks), (standing.Met, standing.Value, standing.N, standing.Asks, standing.Lacks));
        Assert.Equal((null, null), (standing.Missing, standing.Pending));
    }

    [Theory] // cardiac: asks 3, has 3; lung: asks 1, has 0; aorta asks nothing and has 1
    [InlineData("""{ "kind": "applications", "min": 2, "meeting": "own" }""", true, 2, 0, "2 applications with all requirements met", null)]
    [InlineData("""{ "kind": "applications", "min": 3, "meeting": "own" }""", false, 2, 1, "3 applications with all requirements met", "1 application with all requirements met")]
    [InlineData("""{ "kind": "applications", "min": 5, "meeting": { "count": 1 } }""", false, 2, 3, "5 applications at 1 scan or more", "3 applications at 1 scan or more")]
    [InlineData("""{ "kind": "applications", "min": 1, "meeting": { "count": 3 } }""", true, 1, 0, "1 application at 3 scans or more", null)]
    [InlineData("""{ "kind": "count", "min": 150 }""", false, 4, 146, "150 scans in all applications", "146 scans")]
    public void Overall_looks_at_all_listed_applications(string json, bool met, int value, int missing, string asks, string? lacks)
    {
        var rules = Book.Read($$"""
            "applications": [{ "code": "cardiac", "require": [{ "kind": "count", "min": 3 }] }, { "code": "lung", "require": [{ "kind": "count", "min": 1 }] }, { "code": "aorta", "require": [] }],
            "overall": [{{json}}]
            """);
        var overall = rules.On([.. Scans, Book.Scan("f").As(Result.TN) with { Application = "aorta" }, Book.Scan("g").As(Result.TN) with { Application = "ocular" }]).Overall;
        var standing = Assert.Single(overall.Requirements);
        Assert.Equal((met, met, (double?)value, (double?)missing, asks, lacks), (overall.Met, standing.Met, standing.Value, standing.Missing, standing.Asks, standing.Lacks));
    }

    [Fact]
    public void A_group_counts_its_own_applications_together()
    {
        var rules = Book.Read("""
            "applications": [{ "code": "cardiac", "require": [] }, { "code": "lung", "require": [] }, { "code": "aorta", "require": [] }],
            "groups": [{ "name": "chest", "applications": ["lung", "cardiac"], "require": [{ "kind": "count", "min": 4 }] }, { "name": "none", "applications": [], "require": [] }]
            """);
        var groups = rules.On([.. Scans, Book.Scan("f").As(Result.TN) with { Application = "lung" }, Book.Scan("g").As(Result.TN) with { Application = "aorta" }]).Groups;
        Assert.Equal([("chest", true), ("none", true)], groups.Select(g => (g.Name, g.Met)));
        Assert.Equal((4.0, 2), (groups[0].Requirements[0].Value, groups[0].Requirements[0].Pending));
    }

    [Fact]
    public void Each_names_the_scans_behind_its_value_and_a_share_those_from_which_it_is_taken()
    {
        var rules = Book.Read("""
            "applications": [
              { "code": "cardiac", "require": [{ "kind": "count", "min": 2 }, { "kind": "count", "min": 1, "where": { "positive": true } }, { "kind": "share", "where": { "positive": true }, "of": { "setting": ["clinical"] }, "min": 0.5 }] },
              { "code": "lung", "require": [] }],
            "groups": [{ "name": "chest", "applications": ["cardiac", "lung"], "require": [{ "kind": "count", "min": 1, "where": { "positive": false } }] }],
            "overall": [{ "kind": "count", "min": 9 }, { "kind": "applications", "min": 1, "meeting": { "count": 2 } }]
            """);
        var standing = rules.On([Book.Scan("a").As(Result.TP), Book.Scan("b").As(Result.TN), Book.Scan("c").As(Result.FN) with { Setting = Setting.Simulation }, Book.Scan("d").As(Result.FP) with { Application = "lung" }]);
        Assert.Equal(["application:cardiac:1 a b c", "application:cardiac:2 a c", "application:cardiac:3 a of a b", "group:1:1 b d", "overall:1 a b c d", "overall:2 a b c"],
            standing.Requirements.Select(r => $"{r.Name} {Ids(r.Behind)}{(r.Among is null ? "" : $" of {Ids(r.Among)}")}"));
        Assert.All(standing.Requirements.Where(r => r.Kind == "count"), r => Assert.Equal(r.Behind.Count, r.Value));
        Assert.All(standing.Requirements.Where(r => r.Kind == "share"), r => Assert.Equal(((double)r.Behind.Count / r.N, r.N), (r.Value, r.Among?.Count)));

        static string Ids(IEnumerable<SeenScan> scans) => string.Join(' ', scans.Select(s => s.Evidence.Scan));
    }

    private static RequirementStanding Measured(string json, ScanEvidence[] scans) =>
        Book.Cardiac($$""" "require": [{{json}}] """).On(scans).Applications[0].Requirements[0];
}
