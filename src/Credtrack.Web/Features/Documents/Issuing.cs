using Credtrack.Core.Grants;
using Credtrack.Web.Features.Documents.Checks;
using Credtrack.Web.Features.Documents.Seals;
using Credtrack.Web.Features.Documents.Summaries;

namespace Credtrack.Web.Features.Documents;

/// <summary>From a signed grant to the sealed paper that leaves the house: drawn, sealed and kept, once.</summary>
public sealed class Issuing(SealingCertificate certificate, Settings settings)
{
    /// <summary>Why the paper could not be drawn, in words, or null; asked before anything is signed.</summary>
    public string? WhyNot(Statement statement, string signer, string? gapReason, Site site) =>
        CompetencySummary.WhyNotDraw(Facts(statement, signer, Meaning.Granted, gapReason, DateTime.UnixEpoch, site, DocumentCode.New()));

    public void Issue(Grant grant, Statement statement, Person signer, Site site)
    {
        var (signature, code) = (grant.Signature!, DocumentCode.New());
        var drawn = CompetencySummary.Draw(Facts(statement, signer.Name, signature.Meaning, signature.GapReason, signature.At, site, code));
        var bytes = Seal.Apply(drawn, certificate, signature.At, site.Name, "Competency summary");
        grant.Issue(signer, code, bytes, CheckAnswer.Digest(bytes), signature.At);
    }

    private SummaryFacts Facts(Statement statement, string signer, Meaning meaning, string? gapReason, DateTime at, Site site, string code) => new()
    {
        Holder = statement.Holder,
    };
}
