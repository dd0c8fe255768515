using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;
using Credtrack.Core.Tests.Rulebooks;

namespace Credtrack.Core.Tests.Measures.Standings;

public sealed class TraceTests
{
    [Fact]
    public void Scans_are_walked_by_instant_and_then_by_the_ordinal_of_their_id()
    {
        var standing = Book.Cardiac(""" "require": [] """).On(Book.Scan("b", 2), Book.Scan("a", 2), Book.Scan("B", 2), Book.Scan("z", 1));
        Assert.Equal(["z", "B", "a", "b"], standing.Findings.Select(f => f.Scan));
    }

    [Fact]
    public void What_comes_after_the_day_does_not_exist_yet()
    {
        var rules = Book.Cardiac(""" "counting": { "result": ["TP"] }, "require": [] """);
        var late = Book.Scan("late", 30).As(Result.TP);
        var outcome = new OutcomeEvidence(late.PerformedAt.AddDays(3), Result.FP);
        Assert.Equal(["late Counts"], Standing.Of(rules, [late with { Outcome = outcome }, Book.Scan("next") with { PerformedAt = late.PerformedAt.AddDays(2) }], [], Book.Day).Verdicts());
        Assert.Equal(["late Excluded: result"], Standing.Of(rules, [late with { Outcome = outcome }], [], Book.Day.AddDays(2)).Verdicts());
        Assert.Equal(["late Pending"], Standing.Of(rules, [late with { Reading = late.Reading! with { At = late.PerformedAt.AddDays(2) } }], [], Book.Day).Verdicts());
        Assert.Empty(Standing.Of(rules, [late], [], Book.Day.AddDays(-2)).Findings);
    }

    [Fact]
    public void An_outcome_replaces_the_result_even_if_older_than_the_reading_but_waits_for_one()
    {
        var rules = Book.Cardiac(""" "counting": { "positive": true }, "require": [] """);
        var outcome = new OutcomeEvidence(Book.Scan("a").PerformedAt, Result.FN);
        Assert.Equal(["a Counts", "b Pending", "c Counts"], rules.On(Book.Scan("a", 1).As(Result.TN) with { Outcome = outcome }, Book.Scan("b", 2) with { Outcome = outcome },
            Book.Scan("c", 3).As(null) with { Outcome = outcome }).Verdicts());
        Assert.Null(SeenScan.On(Book.Day, Book.Scan("b", 2) with { Outcome = outcome }, TimeZoneInfo.Utc)!.Result);
    }

    [Fact]
    public void Days_are_those_of_the_rulebooks_zone()
    {
        var rules = Book.Read(""" "timeZone": "Asia/Kathmandu", "counting": { "performed": { "from": "2026-03-31" } }, "applications": [{ "code": "cardiac", "require": [] }] """);
        // 18:15 UTC is midnight in Kathmandu.
        DateTime At(int day, int minute) => new(2026, 3, day, 18, minute, 0, DateTimeKind.Utc);
        Assert.Equal(["a Excluded: performed", "b Pending"],
            rules.On(Book.Scan("a") with { PerformedAt = At(30, 14) }, Book.Scan("b") with { PerformedAt = At(30, 15) }, Book.Scan("c") with { PerformedAt = At(31, 15) }).Verdicts());
    }

    [Fact]
    public void A_second_scan_of_an_encounter_does_not_count_whatever_became_of_the_first()
    {
        var rules = Book.Read(""" "counting": { "assisted": false }, "applications": [{ "code": "cardiac", "require": [] }, { "code": "lung", "require": [] }] """);
        var scans = new[]
        {
            Book.Scan("a", 1).As(Result.TP) with { Encounter = "e", Assisted = true }, Book.Scan("b", 2).As(Result.TP) with { Encounter = "e" },
            Book.Scan("c", 3).As(Result.TP) with { Encounter = "e" }, Book.Scan("d", 4).As(Result.TP) with { Encounter = "e", Application = "lung" },
            Book.Scan("f", 5).As(Result.TP), Book.Scan("g", 6).As(Result.TP), Book.Scan("h", 7).As(Result.TP) with { Encounter = "E" },
        };
        var standing = rules.On(scans);
        Assert.Equal(["a Excluded: assisted", "b Excluded: duplicate encounter", "c Excluded: duplicate encounter", "d Counts", "f Counts", "g Counts", "h Counts"], standing.Verdicts());
        Assert.Equal([null, "a", "a", null, null, null, null], standing.Findings.Select(f => f.Earlier));
        Assert.DoesNotContain((rules with { OnePerEncounter = false }).On(scans).Findings, f => f.Reason == Finding.Duplicate);
    }

    [Fact]
    public void The_first_scans_that_are_no_duplicates_are_introductory()
    {
        var rules = Book.Cardiac(""" "introductory": 2, "counting": { "assisted": false }, "require": [] """);
        Assert.Equal(["a Excluded: introductory", "b Excluded: duplicate encounter", "c Excluded: introductory", "d Counts"], rules.On(
            Book.Scan("a", 1) with { Encounter = "e", Assisted = true }, Book.Scan("b", 2) with { Encounter = "e" }, Book.Scan("c", 3), Book.Scan("d", 4).As(Result.TP)).Verdicts());
    }

    [Fact]
    public void A_cap_lets_the_first_so_many_count_and_pending_scans_use_none_of_it()
    {
        var rules = Book.Cardiac("""
            "caps": [{ "where": { "setting": ["education"] }, "max": 2, "label": "teaching" }, { "where": {}, "max": 3, "label": "all" }], "require": []
            """);
        ScanEvidence Teaching(string id, int day) => Book.Scan(id, day) with { Setting = Setting.Education };
        var scans = new[] { Teaching("a", 1).As(Result.TP), Teaching("b", 2), Teaching("c", 3).As(Result.TP), Teaching("d", 4).As(Result.TP), Book.Scan("e", 5).As(Result.TP), Book.Scan("f", 6).As(Result.TP) };
        Assert.Equal(["a Counts", "b Pending", "c Counts", "d Excluded: cap: teaching", "e Counts", "f Excluded: cap: all"], rules.On(scans).Verdicts());
        // The late reading of b turns c, which counted, into one that is over the cap.
        scans[1] = scans[1].As(Result.TN);
        Assert.Equal("c Excluded: cap: teaching", rules.On(scans).Verdicts().ElementAt(2));
    }

    [Fact]
    public void An_application_that_is_not_listed_appears_among_the_scans_only()
    {
        var standing = Book.Cardiac(""" "require": [] """).On(Book.Scan("a") with { Application = "Cardiac" });
        Assert.Equal(["a Excluded: application not in rulebook"], standing.Verdicts());
        Assert.Empty(Assert.Single(standing.Applications).Excluded);
    }

    [Fact]
    public void An_application_without_requirements_takes_one_scan_that_counts()
    {
        var rules = Book.Cardiac(""" "require": [] """);
        Assert.False(rules.On(Book.Scan("a")).Met);
        Assert.True(rules.On(Book.Scan("a").As(null)).Met);
    }

    [Fact]
    public void The_population_is_what_was_read_and_performed_beyond_the_introduction()
    {
        var rules = Book.Cardiac(""" "introductory": 1, "counting": { "assisted": true }, "require": [] """);
        var standing = rules.On(Book.Scan("a", 1).As(Result.TP), Book.Scan("b", 2).As(Result.TP) with { Encounter = "e" }, Book.Scan("c", 3).As(Result.TP) with { Encounter = "e" },
            Book.Scan("d", 4).As(Result.TP) with { Role = Role.Interpreted }, Book.Scan("f", 5));
        Assert.Equal(["b"], new Basis(Book.Day, standing.Findings).Population.Select(scan => scan.Evidence.Scan));
    }

    [Fact]
    public void Every_reason_has_words()
    {
        var rules = Book.Cardiac("""
            "introductory": 1, "counting": { "quality": { "min": 3 } }, "caps": [{ "where": { "setting": ["education"] }, "max": 1, "label": "t" }], "require": []
            """);
        var standing = rules.On(Book.Scan("a", 1) with { Encounter = "e" }, Book.Scan("b", 2) with { Encounter = "e" }, Book.Scan("c", 3), Book.Scan("d", 4).As(null, 2),
            Book.Scan("f", 5).As(null) with { Setting = Setting.Education }, Book.Scan("g", 6).As(null) with { Setting = Setting.Education }, Book.Scan("h", 7) with { Application = "x" });
        Assert.Equal(["introductory: the first one", "same encounter as an earlier scan", "waits for a reading", "image quality below 3", null,
            "over the cap: at most 1 teaching scan counts", "its application is not in the rulebook"], standing.Findings.Select(f => f.Words()));
        Assert.Equal(("t", 1L), (standing.Findings[5].Cap!.Label, standing.Findings[5].Cap!.Max));
    }
}
