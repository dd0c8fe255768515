using Credtrack.Web.Commands;
using Credtrack.Web.Tests.Features.Grants;

namespace Credtrack.Web.Tests.Features.Documents.Certificates;

public sealed class CertificatesTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task With_the_public_certificates_alone_anybody_checks_a_file_without_us()
    {
        var (_, document) = await (await site.NewWorld()).Signed();
        using var stranger = site.Visitor();
        await stranger.Opens("/documents/certificates");
        var pem = await stranger.Response.Content.ReadAsStringAsync();
        Assert.DoesNotContain("PRIVATE", pem, StringComparison.Ordinal);
        var (certificate, file) = (Path.Combine(BlankSite.Folder, "site.pem"), Path.Combine(BlankSite.Folder, "paper.pdf"));
        await File.WriteAllTextAsync(certificate, pem);
        await File.WriteAllBytesAsync(file, document.Bytes);
        using var output = new StringWriter();
        Assert.Equal(0, await Check.Run(["--certificate", certificate, file], output, output));
        document.Bytes[100] ^= 1;
        await File.WriteAllBytesAsync(file, document.Bytes);
        Assert.Equal(1, await Check.Run(["--certificate", certificate, file], output, output));
    }
}
