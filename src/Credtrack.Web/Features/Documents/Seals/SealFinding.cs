namespace Credtrack.Web.Features.Documents.Seals;

public enum SealVerdict { OursAndUnaltered, Altered, NotOurs, NoPdf }

/// <summary>What a file is found to be: one plain sentence, where in the file that was seen, and for a good seal the instant it names (UTC).</summary>
public sealed record SealFinding(SealVerdict Verdict, string Sentence, string Place, DateTime? SealedAt = null)
{
    public bool IsGood => Verdict == SealVerdict.OursAndUnaltered;

    internal static SealFinding Altered(string how, string place) => new(SealVerdict.Altered, $"This document was altered after it was sealed: {how}.", place);

    internal static SealFinding NotOurs(string why, string place) => new(SealVerdict.NotOurs, $"This document is not sealed by this site: {why}.", place);
}
