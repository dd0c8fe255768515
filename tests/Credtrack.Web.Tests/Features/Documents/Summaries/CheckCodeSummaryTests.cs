using Credtrack.Web.Features.Documents.Summaries;

namespace Credtrack.Web.Tests.Features.Documents.Summaries;

public sealed class CheckCodeSummaryTests
{
    private const string Longest = "https://ultrasound-training.department-of-emergency-medicine.university-hospital.brindlemoor.example/credtrack/documents/check/K7QX-4M2P-9TBD?from=paper";

    [Theory]
    [InlineData(80, "https://credtrack.brindlemoor.example/check/K7QX-4M2P-9TBD")]
    [InlineData(150, "https://credtrack.brindlemoor.example/check/K7QX-4M2P-9TBD")]
    [InlineData(300, "https://credtrack.brindlemoor.example/check/K7QX-4M2P-9TBD")]
    [InlineData(80, "https://a.example/K7QX-4M2P-9TBD")]
    [InlineData(80, Longest)]
    [InlineData(300, Longest)]
    public void A_scan_of_the_paper_leads_to_the_check_page(int dotsPerInch, string address)
    {
        foreach (var paper in new[] { Paper.A4, Paper.Letter })
        {
            using var printout = new Printout(Samples.Met with { CheckAddress = address, Paper = paper });
            Assert.Equal(address, Tool.Says("zbarimg", "-q", "--raw", printout.Scanned(dotsPerInch, "png")).Trim());
        }
    }

    // The capacity of version 8 at level M, 152 bytes: ISO/IEC 18004, from memory.
    [Fact]
    public void An_address_for_which_the_code_would_be_too_large_is_refused()
    {
        var most = Longest.PadRight(152, 'x');
        Assert.Null(CompetencySummary.WhyNotDraw(Samples.Met with { CheckAddress = most }));
        Assert.Equal("The address of the check page is too long for a code that still reads from paper; 150 plain letters are enough for it.", CompetencySummary.WhyNotDraw(Samples.Met with { CheckAddress = most + "x" }));
    }
}
