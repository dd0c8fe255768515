using Credtrack.Core.Measures.Standings;

namespace Credtrack.Core.Rulebooks;

/// <summary>One key of a filter.</summary>
/// <param name="Key">As the rulebook writes it, and the reason of a scan that fails here.</param>
/// <param name="OfReading">Known only after a reading.</param>
/// <param name="Holds">Whether the scan has what is asked; a read scan without the value has not.</param>
/// <param name="Before">Words that stand before "scans", such as "positive"; null if the words follow.</param>
/// <param name="After">Words that follow "scans", such as "of image quality 3 or better".</param>
/// <param name="WhyNot">The reason in words for a scan that fails.</param>
public sealed record Condition(string Key, bool OfReading, Func<SeenScan, bool> Holds, string? Before, string? After, Func<SeenScan, string> WhyNot);
