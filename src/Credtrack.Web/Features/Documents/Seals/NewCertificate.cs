using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;

namespace Credtrack.Web.Features.Documents.Seals;

/// <summary>
/// The certificate of a site that brings none: a root of its own and one certificate under it. The key of the root is forgotten at once,
/// so that nobody can ever make a second certificate under it.
/// </summary>
internal static class NewCertificate
{
    public const int Years = 5;
    private const int RootYears = 10;
    private const int Bits = 3072;

    // Longer names are refused by readers: ub-organization-name of RFC 5280, appendix A.1.
    private const int LongestName = 64;

    // Clocks differ: what is sealed while the certificate is being made, or by a machine a little behind, is good too.
    private static readonly TimeSpan Slack = TimeSpan.FromDays(1);

    /// <summary>Key, certificate and root as PFX, good from a day before <paramref name="now"/> on.</summary>
    public static byte[] Make(string site, DateTime now, string? password)
    {
        var at = now - Slack;
        using var rootKey = RSA.Create(Bits);
        using var root = Root(rootKey, site, at);
        using var key = RSA.Create(Bits);
        var asked = Request("Document seal", site, key);
        asked.CertificateExtensions.Add(new X509BasicConstraintsExtension(false, false, 0, true));
        asked.CertificateExtensions.Add(new X509KeyUsageExtension(X509KeyUsageFlags.DigitalSignature | X509KeyUsageFlags.NonRepudiation, true));
        // Many readers know no documentSigning yet (RFC 9336) and trust a seal only with emailProtection beside it; tried out with pdfsig.
        asked.CertificateExtensions.Add(new X509EnhancedKeyUsageExtension([new Oid(SealTrust.DocumentSigning), new Oid("1.3.6.1.5.5.7.3.4")], false));
        asked.CertificateExtensions.Add(X509AuthorityKeyIdentifierExtension.CreateFromCertificate(root, true, false));
        using var bare = asked.Create(root, at, at.AddYears(Years), RandomNumberGenerator.GetBytes(16));
        using var signer = bare.CopyWithPrivateKey(key);
        return new X509Certificate2Collection { signer, X509CertificateLoader.LoadCertificate(root.RawData) }.ExportPkcs12(Pkcs12ExportPbeParameters.Pbes2Aes256Sha256, password);
    }

    private static X509Certificate2 Root(RSA key, string site, DateTime at)
    {
        var asked = Request("Root of the document seal", site, key);
        asked.CertificateExtensions.Add(new X509BasicConstraintsExtension(true, true, 0, true));
        asked.CertificateExtensions.Add(new X509KeyUsageExtension(X509KeyUsageFlags.KeyCertSign | X509KeyUsageFlags.CrlSign, true));
        return asked.CreateSelfSigned(at, at.AddYears(RootYears));
    }

    private static CertificateRequest Request(string name, string site, RSA key)
    {
        var names = new X500DistinguishedNameBuilder();
        names.AddCommonName(name);
        names.AddOrganizationName(site.Length > LongestName ? site[..LongestName] : site);
        var asked = new CertificateRequest(names.Build(), key, HashAlgorithmName.SHA256, RSASignaturePadding.Pkcs1);
        asked.CertificateExtensions.Add(new X509SubjectKeyIdentifierExtension(asked.PublicKey, false));
        return asked;
    }
}
