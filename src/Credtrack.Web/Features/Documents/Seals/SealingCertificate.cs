using System.Globalization;
using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;

namespace Credtrack.Web.Features.Documents.Seals;

/// <summary>
/// The key and certificate by which this site seals its documents. One that the program makes itself has no password unless one is set:
/// a password that lies in the settings beside the file keeps nobody out whom the file's mode lets in.
/// </summary>
public sealed class SealingCertificate : IDisposable
{
    private const string Rsa = "1.2.840.113549.1.1.1";

    private SealingCertificate(X509Certificate2 signer, SealTrust trust) => (Signer, Trust) = (signer, trust);

    public X509Certificate2 Signer { get; }

    /// <summary>By what seals are judged here: this certificate's chain and those of the certificates before it.</summary>
    public SealTrust Trust { get; }

    /// <summary>SHA-256 of the certificate, in groups of four hexadecimal digits, to be read out on the telephone.</summary>
    public string Fingerprint => string.Join(' ', Signer.GetCertHashString(HashAlgorithmName.SHA256).Chunk(4).Select(group => new string(group)));

    /// <summary>The certificate of the file, which is made first if there is none.</summary>
    /// <param name="path">A PFX with one key, its certificate and all above it; made alone in a folder of its own.</param>
    /// <param name="password">The password of the file, or null if it has none.</param>
    /// <param name="formerPem">The text of a PEM file with the certificates before this one and their roots, whose seals stay good; or null.</param>
    /// <param name="site">The name that a new certificate carries.</param>
    /// <exception cref="InvalidOperationException">The file is open to everybody, cannot be read, or is no certificate for documents. One that is out of its time seals nothing, but is no fault.</exception>
    public static SealingCertificate LoadOrMake(string path, string? password, string? formerPem, string site, TimeProvider clock, ILogger log)
    {
        var now = clock.UtcNow();
        if (!File.Exists(path) && SecretFile.Create(path, NewCertificate.Make(site, now, password))) Log.SealMade(log, NewCertificate.Years);
        if (SecretFile.IsOpenToAll(path)) throw Settings.Wrong($"everybody on this machine may read or change {path}, the key of the seal; take these rights away (chmod 600).");

        var read = Decoded.OrNull(() => X509CertificateLoader.LoadPkcs12CollectionFromFile(path, password, Keys))
            ?? throw Settings.Wrong($"{path} is no PFX file, or Seal:Password is not its password.");
        if (read.Where(c => c.HasPrivateKey).ToList() is not [var signer]) throw Settings.Wrong($"{path} needs exactly one certificate with its private key.");
        var former = formerPem is null ? null : SealTrust.Of(formerPem) ?? throw Settings.Wrong("Seal:Former is no PEM file of certificates.");
        var trust = new SealTrust([.. read, .. former?.Certificates ?? []]);
        if (!trust.Signers.Contains(signer)) throw Settings.Wrong($"the certificate of {path} is one for certificates, not for documents.");
        if (signer.GetKeyAlgorithm() != Rsa) throw Settings.Wrong($"the key of {path} is not an RSA key.");
        if (trust.WhyNot(signer, now) is { } reason && !trust.IsOutOfTime(signer, now)) throw Settings.Wrong($"the certificate of {path} cannot seal documents now: {reason}.");
        if (trust.IsOutOfTime(signer, now)) Log.SealOutOfTime(log, (int)(now - signer.NotAfter.ToUniversalTime()).TotalDays);
        return new SealingCertificate(signer, trust);
    }

    /// <summary>Why nothing can be sealed at an instant, in words, or null. What was sealed while the certificate was good stays good.</summary>
    public string? WhyNot(DateTime at) =>
          Trust.WhyNot(Signer, at) is null         ? null
        : at > Signer.NotAfter.ToUniversalTime()   ? string.Create(CultureInfo.InvariantCulture, $"No paper can be sealed: the certificate of the seal was good until {Signer.NotAfter.ToUniversalTime():yyyy-MM-dd}. Whoever runs this site has to bring a new one.")
        :                                            "No paper can be sealed: the certificate of the seal is not good at this time. Whoever runs this site has to look at it.";

    /// <summary>That of this site, by its settings and under its name.</summary>
    public static SealingCertificate OfSite(IServiceProvider services)
    {
        using var scope = services.CreateScope();
        var (settings, db) = (services.GetRequiredService<Settings>(), scope.ServiceProvider.GetRequiredService<CredtrackDb>());
        var former = settings.Seal.Former is { } file ? FileText.Read(file, out var fault) ?? throw Settings.Wrong($"Seal:Former, {file}: {fault}.") : null;
        var site = db.Sites.AsNoTracking().Select(s => s.Name).SingleOrDefault() ?? "Credtrack";
        return LoadOrMake(settings.Seal.Certificate, settings.Seal.Password, former, site, services.GetRequiredService<TimeProvider>(), services.GetRequiredService<ILogger<SealingCertificate>>());
    }

    public void Dispose() => Signer.Dispose();

    // The key stays in memory and goes into no store; macOS knows no such keys.
    private static X509KeyStorageFlags Keys => OperatingSystem.IsMacOS() ? X509KeyStorageFlags.DefaultKeySet : X509KeyStorageFlags.EphemeralKeySet;
}
