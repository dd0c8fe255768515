using Credtrack.Core.Rulebooks;

namespace Credtrack.Core.Measures.Standings;

/// <summary>Gives every scan that is visible on a day its one verdict, application by application.</summary>
internal static class Trace
{
    /// <summary>One finding for each visible scan, by instant and then by id.</summary>
    public static IReadOnlyList<Finding> Of(Rules rules, IEnumerable<ScanEvidence> scans, DateOnly asOf)
    {
        var seen = scans.Select(scan => SeenScan.On(asOf, scan, rules.Zone)).OfType<SeenScan>().ToList();
        seen.Sort(SeenScan.InOrder);
        var places = seen.Select((scan, place) => (scan.Evidence.Application, place)).ToLookup(pair => pair.Application, pair => pair.place, StringComparer.Ordinal);
        var findings = seen.Select(scan => Finding.Of(scan, Verdict.Excluded, Finding.Unlisted)).ToArray();
        foreach (var application in rules.Applications)
        {
            Judge(application, rules.OnePerEncounter, [.. places[application.Code]], findings);
            foreach (var cap in application.Caps) Apply(cap, [.. places[application.Code]], findings);
        }
        return findings;
    }

    private static void Judge(ApplicationRules rules, bool onePerEncounter, int[] places, Finding[] findings)
    {
        var firsts = new Dictionary<string, string>(StringComparer.Ordinal);
        var introduced = 0;
        foreach (var place in places)
        {
            var scan = findings[place].Seen;
            if (onePerEncounter && scan.Evidence.Encounter is { Length: > 0 } encounter && !firsts.TryAdd(encounter, scan.Evidence.Scan))
            {
                findings[place] = Finding.Of(scan, Verdict.Excluded, Finding.Duplicate) with { Earlier = firsts[encounter] };
            }
            else if (introduced < rules.Introductory)
            {
                introduced++;
                findings[place] = Finding.Of(scan, Verdict.Excluded, Finding.Introduction) with { Introductory = rules.Introductory };
            }
            else
            {
                findings[place] = Filtered(scan, rules.Counting);
            }
        }
    }

    private static Finding Filtered(SeenScan scan, Filter counting) => counting.For(scan, out var failed) switch
    {
        Fit.Yes => Finding.Of(scan, Verdict.Counts),
        Fit.Open => Finding.Of(scan, Verdict.Pending),
        _ => Finding.Of(scan, Verdict.Excluded, failed!.Key) with { Failed = failed },
    };

    private static void Apply(Cap cap, int[] places, Finding[] findings)
    {
        var used = 0;
        foreach (var place in places.Where(place => findings[place].Verdict == Verdict.Counts && cap.Where.Matches(findings[place].Seen)))
        {
            if (used++ < cap.Max) continue;
            findings[place] = Finding.Of(findings[place].Seen, Verdict.Excluded, $"cap: {cap.Label}") with { Cap = cap };
        }
    }
}
