using Credtrack.Core.Rulebooks;

namespace Credtrack.Core.Measures.Standings;

/// <summary>Why a scan does not count, or not yet, in words for people.</summary>
public static class Reasons
{
    /// <summary>The reason, or null for a scan that counts.</summary>
    public static string? Words(this Finding finding) => finding switch
    {
        { Verdict: Verdict.Counts } => null,
        { Verdict: Verdict.Pending } => "waits for a reading",
        { Cap: { } cap } => $"over the cap: at most {cap.Where.Scans(cap.Max)} {(cap.Max == 1 ? "counts" : "count")}",
        { Failed: { } condition } => condition.WhyNot(finding.Seen),
        { Introductory: { } first } => first == 1 ? "introductory: the first one" : $"introductory: among the first {first}",
        { Earlier: not null } => "same encounter as an earlier scan",
        _ => "its application is not in the rulebook",
    };
}
