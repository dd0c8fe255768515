using System.Formats.Asn1;
using System.Security.Cryptography;
using System.Security.Cryptography.Pkcs;
using System.Security.Cryptography.X509Certificates;

namespace Credtrack.Web.Features.Documents.Seals;

/// <summary>
/// The signature inside a seal: CMS (RFC 5652) as ETSI EN 319 142-1 asks for level B-B. The time of sealing stands in the PDF, not in here
/// (6.3 there). The library makes it; <see cref="Written"/> writes the same once more, so that a check compares bytes and parses nothing.
/// </summary>
internal static class SealCms
{
    private const string Data = "1.2.840.113549.1.7.1";
    private const string SignedData = "1.2.840.113549.1.7.2";
    private const string ContentType = "1.2.840.113549.1.9.3";
    private const string MessageDigest = "1.2.840.113549.1.9.4";
    /// <summary>id-aa-signingCertificateV2, RFC 5035: binds the signature to one certificate, so that no other of the same key can take its place.</summary>
    private const string SigningCertificateV2 = "1.2.840.113549.1.9.16.2.47";
    private const string Sha256 = "2.16.840.1.101.3.4.2.1";
    private const string RsaEncryption = "1.2.840.113549.1.1.1";

    private static readonly Asn1Tag First = new(TagClass.ContextSpecific, 0);

    public static byte[] Sign(byte[] covered, SealingCertificate certificate)
    {
        var cms = new SignedCms(new ContentInfo(covered), detached: true);
        var signer = new CmsSigner(SubjectIdentifierType.IssuerAndSerialNumber, certificate.Signer) { DigestAlgorithm = new Oid(Sha256), IncludeOption = X509IncludeOption.None };
        signer.Certificates.AddRange(certificate.Trust.ChainOf(certificate.Signer));
        signer.SignedAttributes.Add(new AsnEncodedData(SigningCertificateV2, Encoded(asn => WriteNameOf(asn, certificate.Signer))));
        cms.ComputeSignature(signer, silent: true);
        return cms.Encode();
    }

    /// <summary>What is signed, in DER: kind of content, its SHA-256, and which certificate signs (RFC 5652, 5.4).</summary>
    public static byte[] Attributes(byte[] digest, X509Certificate2 signer) => Encoded(asn => WriteAttributes(asn, digest, signer, Asn1Tag.SetOf));

    /// <summary>The whole signature from its parts, byte for byte as <see cref="Sign"/> makes it.</summary>
    public static byte[] Written(byte[] digest, X509Certificate2 signer, X509Certificate2Collection chain, byte[] signature) => Encoded(asn =>
    {
        using var content = asn.PushSequence();
        asn.WriteObjectIdentifier(SignedData);
        using var wrapped = asn.PushSequence(First);
        using var signed = asn.PushSequence();
        asn.WriteInteger(1);
        using (asn.PushSetOf()) WriteAlgorithm(asn, Sha256);
        WriteAlgorithm(asn, Data); // content that stands elsewhere has the form of an algorithm: its kind alone
        using (asn.PushSetOf(First))
            foreach (var certificate in chain) asn.WriteEncodedValue(certificate.RawData);
        using var signers = asn.PushSetOf();
        using var only = asn.PushSequence();
        asn.WriteInteger(1);
        using (asn.PushSequence())
        {
            asn.WriteEncodedValue(signer.IssuerName.RawData);
            asn.WriteInteger(signer.SerialNumberBytes.Span);
        }
        WriteAlgorithm(asn, Sha256);
        WriteAttributes(asn, digest, signer, First);
        WriteAlgorithm(asn, RsaEncryption); // the library leaves the NULL behind it out
        asn.WriteOctetString(signature);
    });

    private static void WriteAttributes(AsnWriter asn, byte[] digest, X509Certificate2 signer, Asn1Tag tag)
    {
        using var all = asn.PushSetOf(tag);
        WriteAttribute(asn, ContentType, () => asn.WriteObjectIdentifier(Data));
        WriteAttribute(asn, MessageDigest, () => asn.WriteOctetString(digest));
        WriteAttribute(asn, SigningCertificateV2, () => WriteNameOf(asn, signer));
    }

    private static void WriteAttribute(AsnWriter asn, string kind, Action writeValue)
    {
        using var attribute = asn.PushSequence();
        asn.WriteObjectIdentifier(kind);
        using var values = asn.PushSetOf();
        writeValue();
    }

    // SigningCertificateV2 with one ESSCertIDv2; SHA-256 is its default and goes unwritten (RFC 5035, section 4).
    private static void WriteNameOf(AsnWriter asn, X509Certificate2 certificate)
    {
        using var name = asn.PushSequence();
        using var all = asn.PushSequence();
        using var only = asn.PushSequence();
        asn.WriteOctetString(SHA256.HashData(certificate.RawData));
    }

    private static void WriteAlgorithm(AsnWriter asn, string kind)
    {
        using var algorithm = asn.PushSequence();
        asn.WriteObjectIdentifier(kind);
    }

    private static byte[] Encoded(Action<AsnWriter> write)
    {
        var asn = new AsnWriter(AsnEncodingRules.DER);
        write(asn);
        return asn.Encode();
    }
}
