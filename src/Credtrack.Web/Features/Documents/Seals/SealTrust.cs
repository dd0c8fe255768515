using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;

namespace Credtrack.Web.Features.Documents.Seals;

/// <summary>
/// The public certificates by which a seal is judged: those that seal or sealed for this site, with their roots. Signers are taken one by
/// one, because a root of a whole hospital also signs for others.
/// </summary>
public sealed class SealTrust
{
    /// <summary>id-kp-documentSigning, RFC 9336.</summary>
    public const string DocumentSigning = "1.3.6.1.5.5.7.3.36";

    private readonly X509Certificate2Collection all = [];
    private readonly Dictionary<X509Certificate2, X509Certificate2Collection> chains;

    public SealTrust(IEnumerable<X509Certificate2> certificates)
    {
        foreach (var certificate in certificates.Distinct()) all.Add(X509CertificateLoader.LoadCertificate(certificate.RawData));
        chains = all.Where(c => !IsAuthority(c)).ToDictionary(c => c, Built);
    }

    /// <summary>From the PEM text of certificates; null if it holds none or is damaged.</summary>
    public static SealTrust? Of(string pem) => Decoded.OrNull(() =>
    {
        var read = new X509Certificate2Collection();
        read.ImportFromPem(pem);
        return read.Count == 0 ? throw new CryptographicException() : new SealTrust(read);
    });

    /// <summary>What strangers need in order to check a document without this site.</summary>
    public string Pem => all.ExportCertificatePems() + "\n";

    public IReadOnlyList<X509Certificate2> Certificates => [.. all];

    public IEnumerable<X509Certificate2> Signers => chains.Keys;

    /// <summary>One of the signers and what stands above it, up to its root.</summary>
    public X509Certificate2Collection ChainOf(X509Certificate2 signer) => chains[signer];

    /// <summary>Why a certificate could not seal at an instant, or null. Whether it was withdrawn is not asked: nobody keeps a list.</summary>
    public string? WhyNot(X509Certificate2 signer, DateTime at)
    {
        using var chain = Chain(at);
        return chain.Build(signer) ? null : string.Join(", ", chain.ChainStatus.Select(s => s.Status));
    }

    /// <summary>Whether nothing speaks against a certificate but the time.</summary>
    public bool IsOutOfTime(X509Certificate2 signer, DateTime at)
    {
        using var chain = Chain(at);
        return !chain.Build(signer) && chain.ChainStatus.All(s => s.Status == X509ChainStatusFlags.NotTimeValid);
    }

    private X509Certificate2Collection Built(X509Certificate2 signer)
    {
        using var chain = Chain(signer.NotBefore);
        chain.Build(signer);
        return [.. chain.ChainElements.Select(e => e.Certificate)];
    }

    private X509Chain Chain(DateTime at)
    {
        var chain = new X509Chain();
        chain.ChainPolicy.TrustMode = X509ChainTrustMode.CustomRootTrust;
        chain.ChainPolicy.CustomTrustStore.AddRange(all.Where(c => c.SubjectName.RawData.AsSpan().SequenceEqual(c.IssuerName.RawData)).ToArray());
        chain.ChainPolicy.ExtraStore.AddRange(all);
        chain.ChainPolicy.RevocationMode = X509RevocationMode.NoCheck;
        chain.ChainPolicy.DisableCertificateDownloads = true;
        chain.ChainPolicy.VerificationTime = at;
        chain.ChainPolicy.ApplicationPolicy.Add(new Oid(DocumentSigning));
        return chain;
    }

    private static bool IsAuthority(X509Certificate2 certificate) => certificate.Extensions.OfType<X509BasicConstraintsExtension>().Any(b => b.CertificateAuthority);
}
