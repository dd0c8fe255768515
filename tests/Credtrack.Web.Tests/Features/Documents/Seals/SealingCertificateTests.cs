using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using Credtrack.Web.Features.Documents.Seals;
using Microsoft.Extensions.Logging;

namespace Credtrack.Web.Tests.Features.Documents.Seals;

public sealed class SealingCertificateTests
{
    [Fact]
    public void The_first_start_makes_one_and_says_so_and_the_next_takes_it()
    {
        var (path, log) = (SealPress.NewPath(), new Lines());
        using var first = SealPress.Open(path, log: log);
        using var next = SealPress.Open(path, log: log);
        Assert.Equal(first.Fingerprint, next.Fingerprint);
        Assert.Matches("^([0-9A-F]{4} ){15}[0-9A-F]{4}$", first.Fingerprint);
        Assert.Equal(["A new sealing certificate was made, good for 5 years. Its file holds the only copy of the key: back it up apart from the database"], log.Written);
    }

    [Fact]
    public void It_carries_the_name_of_the_site_and_what_readers_ask_for()
    {
        var chain = SealPress.Certificate.Trust.ChainOf(SealPress.Certificate.Signer);
        Assert.Equal(["CN=Document seal, O=Hospital of Saint Bríd", "CN=Root of the document seal, O=Hospital of Saint Bríd"], chain.Select(c => c.Subject));
        Assert.Equal([5, 10], chain.Select(c => c.NotAfter.Year - c.NotBefore.Year));
        Assert.All(chain, c => Assert.Equal(3072, c.GetRSAPublicKey()!.KeySize));
        Assert.Equal(["1.3.6.1.5.5.7.3.36", "1.3.6.1.5.5.7.3.4"], chain[0].Extensions.OfType<X509EnhancedKeyUsageExtension>().Single().EnhancedKeyUsages.Cast<Oid>().Select(o => o.Value));
    }

    [Fact]
    public async Task Several_programs_that_start_at_once_share_one()
    {
        var path = SealPress.NewPath();
        var opened = await Task.WhenAll(Enumerable.Range(0, 4).Select(_ => Task.Run(() => SealPress.Open(path).Fingerprint)));
        Assert.Single(opened.Distinct());
        Assert.Equal([path], Directory.EnumerateFileSystemEntries(Path.GetDirectoryName(path)!));
        Assert.Single(Directory.EnumerateFileSystemEntries(BlankSite.Folder, Path.GetFileName(Path.GetDirectoryName(path)!) + "*"));
    }

    [Fact]
    public void Only_the_owner_of_the_process_can_read_it()
    {
        if (OperatingSystem.IsWindows()) return;
        var path = SealPress.NewPath();
        SealPress.Open(path).Dispose();
        Assert.Equal(UnixFileMode.UserRead | UnixFileMode.UserWrite, File.GetUnixFileMode(path));
        Assert.Equal(UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute, File.GetUnixFileMode(Path.GetDirectoryName(path)!));
        File.SetUnixFileMode(path, UnixFileMode.UserRead | UnixFileMode.OtherRead);
        Assert.Contains("everybody on this machine may read or change", Assert.Throws<InvalidOperationException>(() => SealPress.Open(path)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_password_holds_if_one_is_set()
    {
        var path = SealPress.NewPath();
        SealPress.Open(path, "word of the keeper").Dispose();
        SealPress.Open(path, "word of the keeper").Dispose();
        Assert.EndsWith("is no PFX file, or Seal:Password is not its password.", Assert.Throws<InvalidOperationException>(() => SealPress.Open(path, "another")).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void It_is_made_in_a_folder_of_its_own_be_that_there_or_not()
    {
        var path = SealPress.NewPath();
        Directory.CreateDirectory(Path.GetDirectoryName(path)!);
        SealPress.Open(path).Dispose();
        var beside = Path.Combine(Path.GetDirectoryName(path)!, "other.pfx");
        Assert.Contains("is to be made in a folder of its own", Assert.Throws<InvalidOperationException>(() => SealPress.Open(beside)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Seals_stay_good_when_the_certificate_was_exchanged_twice()
    {
        var (former, seals) = ("", new List<byte[]>());
        for (var year = 0; year < 3; year++)
        {
            var clock = new SiteClock();
            clock.Now = clock.Now.AddYears(year);
            using var certificate = SealPress.Open(SealPress.NewPath(), former: former.Length > 0 ? former : null, clock: clock);
            seals.Add(SealPress.Press(certificate: certificate, at: clock.Now.UtcDateTime));
            Assert.All(seals, seal => Assert.True(SealPress.Check(seal, certificate).IsGood));
            former = certificate.Trust.Pem;
        }
        Assert.Equal(6, SealTrust.Of(former)!.Certificates.Count);
    }

    [Fact]
    public void One_that_is_out_of_its_time_is_loaded_with_a_warning_and_seals_nothing_and_its_seals_stay_good()
    {
        var (path, log, late) = (SealPress.NewPath(), new Lines(), new SiteClock());
        byte[] pressed;
        using (var young = SealPress.Open(path)) pressed = SealPress.Press(certificate: young);
        late.Now = late.Now.AddYears(6);
        using var old = SealPress.Open(path, clock: late, log: log);
        Assert.StartsWith("The sealing certificate is out of its time: it ended 367 days ago", Assert.Single(log.Written), StringComparison.Ordinal);
        Assert.Equal("No paper can be sealed: the certificate of the seal was good until 2031-02-28. Whoever runs this site has to bring a new one.", old.WhyNot(late.Now.UtcDateTime));
        Assert.Null(old.WhyNot(SealPress.Now));
        Assert.True(SealPress.Check(pressed, old).IsGood);
    }

    [Theory]
    [InlineData("is not an RSA key.")]
    [InlineData("needs exactly one certificate with its private key.")]
    [InlineData("cannot seal documents now: NotValidForUsage.")]
    public void A_certificate_that_cannot_seal_stops_the_start_with_the_reason(string reason)
    {
        using var curve = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        using var key = RSA.Create(2048);
        var name = new X500DistinguishedName("CN=Brought along");
        var asked = reason.Contains("RSA", StringComparison.Ordinal) ? new CertificateRequest(name, curve, HashAlgorithmName.SHA256) : new CertificateRequest(name, key, HashAlgorithmName.SHA256, RSASignaturePadding.Pkcs1);
        asked.CertificateExtensions.Add(new X509EnhancedKeyUsageExtension([new Oid("1.3.6.1.5.5.7.3.4")], false)); // e-mail alone
        using var made = asked.CreateSelfSigned(SealPress.Clock.Now.AddDays(-1), SealPress.Clock.Now.AddDays(1));
        var path = SealPress.NewPath();
        Directory.CreateDirectory(Path.GetDirectoryName(path)!);
        File.WriteAllBytes(path, reason.Contains("exactly one", StringComparison.Ordinal)
            ? new X509Certificate2Collection(X509CertificateLoader.LoadCertificate(made.RawData)).Export(X509ContentType.Pkcs12)! : made.Export(X509ContentType.Pkcs12));
        if (!OperatingSystem.IsWindows()) File.SetUnixFileMode(path, UnixFileMode.UserRead);
        Assert.EndsWith(reason, Assert.Throws<InvalidOperationException>(() => SealPress.Open(path)).Message, StringComparison.Ordinal);
    }

    private sealed class Lines : ILogger
    {
        public List<string> Written { get; } = [];

        public IDisposable? BeginScope<TState>(TState state) where TState : notnull => null;
        public bool IsEnabled(LogLevel logLevel) => true;
        public void Log<TState>(LogLevel logLevel, EventId eventId, TState state, Exception? exception, Func<TState, Exception?, string> formatter) => Written.Add(formatter(state, exception));
    }
}
