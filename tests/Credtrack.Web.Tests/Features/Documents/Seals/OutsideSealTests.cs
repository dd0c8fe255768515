using System.Globalization;
using System.Security.Cryptography.X509Certificates;
using Credtrack.Web.Features.Documents.Seals;

namespace Credtrack.Web.Tests.Features.Documents.Seals;

/// <summary>The same documents before programs of others, which trust certificates by today's date.</summary>
public sealed class OutsideSealTests : IDisposable
{
    private const string Valid = "Signature is Valid.";
    private const string Total = "Total document signed";

    private static readonly DateTime Today = TimeProvider.System.GetUtcNow().UtcDateTime;
    private static readonly Lazy<SealingCertificate> Certificate = new(() => SealPress.Open(SealPress.NewPath(), clock: TimeProvider.System));
    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("credtrack-seal-");
    private readonly byte[] whole = SealPress.Press(certificate: Certificate.Value, at: Today.AddMinutes(1));

    [Fact] // poppler-utils
    public void Pdfsig_finds_the_signature_valid_and_over_the_total_document()
    {
        var said = Pdfsig(whole);
        Assert.Contains(Valid, said, StringComparison.Ordinal);
        Assert.Contains(Total, said, StringComparison.Ordinal);
        Assert.Contains("Signature Type: ETSI.CAdES.detached", said, StringComparison.Ordinal);
    }

    [Fact] // poppler-utils, libnss3-tools
    public void Pdfsig_trusts_the_certificate_once_the_root_is_trusted()
    {
        Assert.DoesNotContain("Certificate is Trusted", Pdfsig(whole, "-nssdir", NssFolder()), StringComparison.Ordinal);
        Assert.Equal(0, Tool.Run("certutil", "-A", "-d", NssFolder(), "-n", "root", "-t", "C,C,C", "-a", "-i", Write("root.pem", Root())).Code);
        Assert.Contains("Certificate is Trusted", Pdfsig(whole, "-nssdir", NssFolder()), StringComparison.Ordinal);
    }

    [Fact] // poppler-utils; its exit code is 0 also for a broken signature, so the text counts
    public void Pdfsig_never_calls_an_altered_document_valid_and_whole()
    {
        var (chance, parts) = (new Random(16), SealParts.Of(whole));
        var altered = Enumerable.Range(0, 20).Select(_ =>
        {
            var copy = whole.ToArray();
            copy[chance.Next(parts.Open)] ^= (byte)chance.Next(1, 256);
            return copy;
        }).Append(PlainPdf.Updated(whole));
        Assert.All(altered, file =>
        {
            var said = Pdfsig(file);
            Assert.False(said.Contains(Valid, StringComparison.Ordinal) && said.Contains(Total, StringComparison.Ordinal), said);
        });
    }

    [Fact] // openssl; -cades checks signing-certificate-v2 as well
    public void Openssl_verifies_signature_and_covered_bytes_cut_out_of_the_file()
    {
        var parts = SealParts.Of(whole);
        Assert.Equal(0, Openssl(parts.Covered, parts.Signature).Code);
        parts.Covered[99] ^= 1;
        Assert.NotEqual(0, Openssl(parts.Covered, parts.Signature).Code);
    }

    [Fact] // qpdf
    public void Qpdf_finds_nothing_wrong_with_the_form_of_the_file() => PassesQpdf(whole);

    internal static void PassesQpdf(byte[] file)
    {
        var path = Path.Combine(BlankSite.Folder, $"{Guid.NewGuid():N}.pdf");
        File.WriteAllBytes(path, file);
        var (code, output, error) = Tool.Run("qpdf", "--check", path);
        Assert.True(code == 0, output + error);
    }

    private (int Code, string Output, string Error) Openssl(byte[] covered, byte[] signature) => Tool.Run("openssl", "cms", "-verify", "-cades", "-binary", "-inform", "DER",
        "-in", Write("seal.p7", signature), "-content", Write("covered", covered), "-CAfile", Write("root.pem", Root()), "-out", Path.Combine(folder.FullName, "out"),
        "-attime", new DateTimeOffset(Today.AddMinutes(1)).ToUnixTimeSeconds().ToString(CultureInfo.InvariantCulture));

    private static byte[] Root() => System.Text.Encoding.ASCII.GetBytes(Certificate.Value.Trust.Certificates.Single(c => c.Subject == c.Issuer).ExportCertificatePem());

    private string Pdfsig(byte[] file, params string[] options) => Tool.Run("pdfsig", [.. options, Write($"{Guid.NewGuid():N}.pdf", file)]).Output;

    private string NssFolder()
    {
        var nss = Path.Combine(folder.FullName, "nss");
        if (Directory.Exists(nss)) return nss;
        Directory.CreateDirectory(nss);
        Assert.Equal(0, Tool.Run("certutil", "-N", "-d", nss, "--empty-password").Code);
        return nss;
    }

    private string Write(string name, byte[] bytes)
    {
        var path = Path.Combine(folder.FullName, name);
        File.WriteAllBytes(path, bytes);
        return path;
    }

    public void Dispose() => folder.Delete(recursive: true);
}
