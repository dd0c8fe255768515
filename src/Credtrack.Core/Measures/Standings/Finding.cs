using Credtrack.Core.Rulebooks;

namespace Credtrack.Core.Measures.Standings;

public enum Verdict { Counts, Pending, Excluded }

/// <summary>What became of one scan towards the rulebook, and why: one line of the trace.</summary>
/// <param name="Reason">For an excluded scan, in the words of the standing's format: "quality", "duplicate encounter", "cap: LABEL"; else null.</param>
public sealed record Finding(string Scan, string Application, Verdict Verdict, string? Reason)
{
    public const string Unlisted = "application not in rulebook";
    public const string Duplicate = "duplicate encounter";
    public const string Introduction = "introductory";

    /// <summary>The scan as it was seen on the day.</summary>
    public required SeenScan Seen { get; init; }

    /// <summary>For a duplicate encounter: the id of the first scan of that encounter.</summary>
    public string? Earlier { get; init; }

    /// <summary>For an introductory scan: how many the rulebook sets aside.</summary>
    public long? Introductory { get; init; }

    /// <summary>For a scan beyond a cap: the cap, with its label and maximum.</summary>
    public Cap? Cap { get; init; }

    /// <summary>For a scan that fails the counting filter: the condition that it fails.</summary>
    public Condition? Failed { get; init; }

    internal static Finding Of(SeenScan scan, Verdict verdict, string? reason = null) =>
        new(scan.Evidence.Scan, scan.Evidence.Application, verdict, reason) { Seen = scan };
}
