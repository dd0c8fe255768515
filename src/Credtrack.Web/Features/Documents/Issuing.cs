using Credtrack.Core.Grants;
using Credtrack.Web.Features.Documents.Checks;
using Credtrack.Web.Features.Documents.Seals;
using Credtrack.Web.Features.Documents.Summaries;

namespace Credtrack.Web.Features.Documents;

/// <summary>From a signed grant to the sealed paper that leaves the house: drawn, sealed and kept, once.</summary>
public sealed class Issuing(SealingCertificate certificate, Settings settings)
{
    /// <summary>Why nothing could be sealed, whatever it is, in words, or null.</summary>
    public string? WhyNotSeal(DateTime at) => certificate.WhyNot(at);

    /// <summary>Why this paper could not be drawn and sealed, in words, or null; asked before anything is signed.</summary>
    public string? WhyNot(Statement statement, Person signer, string? gapReason, Site site, DateTime at) =>
        WhyNotSeal(at) ?? CompetencySummary.WhyNotDraw(Facts(statement, signer, Meaning.Granted, gapReason, at, site, DocumentCode.New()));

    public void Issue(Grant grant, Statement statement, Person signer, Site site)
    {
        var (signature, code) = (grant.Signature!, DocumentCode.New());
        var drawn = CompetencySummary.Draw(Facts(statement, signer, signature.Meaning, signature.GapReason, signature.At, site, code));
        var bytes = Seal.Apply(drawn, certificate, signature.At, site.Name, "Competency summary");
        grant.Issue(signer, code, bytes, CheckAnswer.Digest(bytes), signature.At);
    }

    private SummaryFacts Facts(Statement statement, Person signer, Meaning meaning, string? gapReason, DateTime at, Site site, string code) => new()
    {
        Holder = statement.Holder,
        Programme = statement.Programme,
        Site = site.Name,
        DocumentCode = code,
        CheckAddress = $"{settings.PublicAddress.TrimEnd('/')}/documents/checks?code={code}",
        Lines = [new(statement.Application, statement.Performed, statement.Read, statement.Counted, [.. statement.Requirements.Select(r => (r.Asked, r.Value, r.Met))]) { Required = statement.Required }],
        Privilege = statement.Privilege,
        GrantedFrom = at.DayIn(TimeZoneInfo.FindSystemTimeZoneById(site.TimeZone)),
        RulebookName = statement.Rulebook,
        RulebookVersion = $"{statement.Edition}",
        AsOf = at,
        SignerName = signer.Name,
        SignerRole = "programme director",
        SignedAt = at,
        ZoneId = site.TimeZone,
        Meaning = meaning.Printed(),
        CertificateFingerprint = certificate.Fingerprint,
        GapReason = gapReason,
        IsDemonstration = settings.Demo,
        Paper = settings.Paper,
    };
}
