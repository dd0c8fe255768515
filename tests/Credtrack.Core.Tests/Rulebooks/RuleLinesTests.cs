using Credtrack.Core.Rulebooks;

namespace Credtrack.Core.Tests.Rulebooks;

public sealed class RuleLinesTests
{
    private const string One = """
        "notes": "By heart.", "sources": ["A book"], "onePerEncounter": false, "counting": { "quality": { "min": 3 } },
        "applications": [
          { "code": "cardiac", "name": "Heart", "privilege": "Focused heart", "introductory": 2, "caps": [{ "where": { "setting": ["education"] }, "max": 2, "label": "two teaching scans" }], "require": [{ "kind": "count", "min": 25 }, { "kind": "count", "min": 3, "where": { "positive": true } }] },
          { "code": "lung", "require": [] }],
        "groups": [{ "name": "Chest", "applications": ["cardiac", "lung"], "require": [{ "kind": "count", "min": 40 }] }],
        "overall": [{ "kind": "count", "min": 150 }]
        """;

    [Fact]
    public void A_rulebook_is_told_line_by_line() => Assert.Equal(
    [
        "Called “Harbour”", "Effective 2026-01-01", "Days are those of UTC", "Notes: By heart.", "Source: A book", "Scans of one patient contact all count",
        "Focused cardiac: called “Heart”", "Focused cardiac: the privilege is “Focused heart”", "Focused cardiac: 25 scans", "Focused cardiac: 3 positive scans",
        "Focused cardiac: a scan counts if it is of image quality 3 or better", "Focused cardiac: scans set aside first, 2", "Focused cardiac: two teaching scans (at most 2 that are teaching)",
        "lung: a scan that counts", "lung: a scan counts if it is of image quality 3 or better", "Chest (Focused cardiac, lung): 40 scans", "All together: 150 scans in all applications",
    ], Lines(One));

    [Fact]
    public void Two_editions_differ_by_the_lines_that_only_one_of_them_has()
    {
        var difference = RuleDifference.Between(Lines(One), Lines(One.Replace("\"min\": 25", "\"min\": 30", StringComparison.Ordinal).Replace("\"overall\": [{ \"kind\": \"count\", \"min\": 150 }]", "\"overall\": []", StringComparison.Ordinal)));
        Assert.Equal(["Focused cardiac: 25 scans", "All together: 150 scans in all applications"], difference.Gone);
        Assert.Equal(["Focused cardiac: 30 scans"], difference.New);
        Assert.True(RuleDifference.Between(Lines(One), Lines(One)).IsNone);
        Assert.Equal(["a"], RuleDifference.Between(["a", "a", "b"], ["b", "a"]).Gone);
    }

    private static IReadOnlyList<string> Lines(string rest) => RuleLines.Of(Book.Read(rest), code => code == "cardiac" ? "Focused cardiac" : code);
}
