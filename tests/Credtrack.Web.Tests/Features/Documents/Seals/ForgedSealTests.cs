using System.Security.Cryptography;
using System.Security.Cryptography.Pkcs;
using System.Security.Cryptography.X509Certificates;
using Credtrack.Web.Features.Documents.Seals;

namespace Credtrack.Web.Tests.Features.Documents.Seals;

/// <summary>Signatures that hold by themselves for a reader of PDF, made with a good key, but not as a seal has to be.</summary>
public sealed class ForgedSealTests
{
    private static readonly X509Certificate2 Signer = SealPress.Certificate.Signer;

    [Fact]
    public void Made_here_as_a_seal_has_to_be_the_signature_is_good() => Assert.True(SealPress.Check(Forged(_ => { })).IsGood);

    [Fact]
    public void A_signature_that_does_not_name_its_certificate_is_refused() => Refused(Forged(signer => signer.SignedAttributes.Remove(signer.SignedAttributes[0])));

    [Fact]
    public void A_signature_that_names_another_certificate_is_refused() => Refused(Forged(signer =>
    {
        signer.SignedAttributes.Remove(signer.SignedAttributes[0]);
        signer.SignedAttributes.Add(NameOf(SealPress.Certificate.Trust.ChainOf(Signer)[1]));
    }));

    [Fact]
    public void A_signature_with_more_in_it_is_refused()
    {
        Refused(Forged(signer => signer.SignedAttributes.Add(new Pkcs9SigningTime(SealPress.Now))));
        Refused(Forged(signer => signer.UnsignedAttributes.Add(new Pkcs9DocumentDescription("Director"))));
    }

    [Fact]
    public void A_weaker_digest_is_refused() => Refused(Forged(signer => signer.DigestAlgorithm = new Oid("1.3.14.3.2.26"))); // SHA-1

    [Fact]
    public void A_foreign_certificate_brought_along_is_refused()
    {
        using var others = SealPress.Open(SealPress.NewPath());
        Refused(Forged(signer => signer.Certificates.Add(others.Signer)));
    }

    [Theory]
    [InlineData("1.3.6.1.5.5.7.3.36", 0, null)]
    [InlineData("1.3.6.1.5.5.7.3.4", 0, "NotValidForUsage")] // e-mail, not documents
    [InlineData("1.3.6.1.5.5.7.3.36", 400, "NotTimeValid")] // for a year, long before
    public void The_certificate_has_to_be_for_documents_and_good_at_the_time(string usage, int daysAgo, string? whyNot)
    {
        using var rootKey = RSA.Create(2048);
        using var key = RSA.Create(2048);
        var (from, to) = (SealPress.Clock.Now.AddDays(-daysAgo), SealPress.Clock.Now.AddDays(365 - daysAgo));
        var root = new CertificateRequest("CN=A root", rootKey, HashAlgorithmName.SHA256, RSASignaturePadding.Pkcs1);
        root.CertificateExtensions.Add(new X509BasicConstraintsExtension(true, false, 0, true));
        using var above = root.CreateSelfSigned(from.AddDays(-1), to.AddDays(900));
        var asked = new CertificateRequest("CN=A signer", key, HashAlgorithmName.SHA256, RSASignaturePadding.Pkcs1);
        asked.CertificateExtensions.Add(new X509EnhancedKeyUsageExtension([new Oid(usage)], false));
        using var bare = asked.Create(above, from, to, [1, 2, 3]);
        using var signer = bare.CopyWithPrivateKey(key);
        var trust = new SealTrust([signer, above]);

        var finding = SealCheck.Of(SealParts.Exchange(SealPress.Press(), covered => Signed(covered, signer, trust, _ => { })), trust);
        Assert.Equal(whyNot is null ? SealVerdict.OursAndUnaltered : SealVerdict.NotOurs, finding.Verdict);
        Assert.Contains(whyNot ?? "not altered since", finding.Sentence, StringComparison.Ordinal);
    }

    [Fact]
    public void Another_certificate_under_the_same_root_is_not_ours()
    {
        var trust = new SealTrust(SealPress.Certificate.Trust.ChainOf(Signer).Skip(1));
        Assert.Equal(SealVerdict.NotOurs, SealCheck.Of(SealPress.Press(), trust).Verdict);
    }

    private static void Refused(byte[] file)
    {
        var finding = SealPress.Check(file);
        Assert.Equal((SealVerdict.Altered, "This document was altered after it was sealed: the signature is not made as we make it."), (finding.Verdict, finding.Sentence));
    }

    private static byte[] Forged(Action<CmsSigner> how) => SealParts.Exchange(SealPress.Press(), covered => Signed(covered, Signer, SealPress.Certificate.Trust, how));

    private static byte[] Signed(byte[] covered, X509Certificate2 certificate, SealTrust trust, Action<CmsSigner> how)
    {
        var signer = new CmsSigner(SubjectIdentifierType.IssuerAndSerialNumber, certificate) { DigestAlgorithm = new Oid("2.16.840.1.101.3.4.2.1"), IncludeOption = X509IncludeOption.None };
        signer.SignedAttributes.Add(NameOf(certificate));
        signer.Certificates.AddRange(trust.ChainOf(certificate));
        how(signer);
        var cms = new SignedCms(new ContentInfo(covered), detached: true);
        cms.ComputeSignature(signer);
        return cms.Encode();
    }

    // Three nested sequences around an OCTET STRING of 32 bytes (RFC 5035, section 4), written out by hand.
    private static AsnEncodedData NameOf(X509Certificate2 certificate) =>
        new("1.2.840.113549.1.9.16.2.47", [0x30, 0x26, 0x30, 0x24, 0x30, 0x22, 0x04, 0x20, .. SHA256.HashData(certificate.RawData)]);
}
