using System.Text;
using Credtrack.Web.Features.Documents.Seals;

namespace Credtrack.Web.Tests.Features.Documents.Seals;

public sealed class SealTests
{
    [Fact]
    public void A_sealed_document_is_ours_and_says_when_it_was_sealed()
    {
        var finding = SealPress.Check(SealPress.Press());
        Assert.Equal(SealVerdict.OursAndUnaltered, finding.Verdict);
        Assert.Equal(new DateTime(2026, 3, 1, 12, 0, 0, DateTimeKind.Utc), finding.SealedAt);
        Assert.Equal("Sealed by Document seal of this site at 2026-03-01 12:00:00 UTC, and not altered since.", finding.Sentence);
    }

    [Fact]
    public void What_was_drawn_stays_byte_for_byte_and_the_seal_follows()
    {
        var drawn = PlainPdf.Make();
        var pressed = SealPress.Press(drawn);
        Assert.Equal(drawn, pressed[..drawn.Length]);
        Assert.InRange(pressed.Length - drawn.Length, 2 * 16_384, 2 * 16_384 + 2_000);
    }

    [Theory] // fields that stand ready for people, and notes on the page, in each way that a PDF may hold them
    [InlineData("/AcroForm<</Fields[7 0 R]/DA(/Helv \\(0\\) Tf)>>", "/Annots[7 0 R]", "/Fields [7 0 R ", "/Annots [7 0 R ")]
    [InlineData("/AcroForm 8 0 R", "/Annots 9 0 R", "/Fields [7 0 R ", "/Annots [7 0 R ")]
    [InlineData("/AcroForm 10 0 R", "", "/Fields [7 0 R ", "/Annots [")]
    [InlineData("/Lang(en) /AcroForm << >>", "", "/Fields [", "/Annots [")]
    public void Fields_that_are_there_stay(string inCatalog, string inPage, string fields, string annotations)
    {
        var drawn = PlainPdf.Make(inCatalog, inPage,
            "<</Type/Annot/Subtype/Widget/FT/Sig/T(Director)/Rect[72 72 200 100]/F 4/P 3 0 R>>", "<</Fields[7 0 R]>>", "[7 0 R]", "<</Fields 9 0 R>>");
        var pressed = SealPress.Press(drawn);
        var update = Encoding.Latin1.GetString(pressed)[drawn.Length..];
        Assert.Contains(fields, update, StringComparison.Ordinal);
        Assert.Contains(annotations, update, StringComparison.Ordinal);
        Assert.True(SealPress.Check(pressed).IsGood);
        OutsideSealTests.PassesQpdf(pressed);
    }

    [Fact]
    public void A_document_is_sealed_once() =>
        Assert.Equal("This PDF is not sealed: it was changed or encrypted after it was drawn.", Assert.Throws<InvalidDataException>(() => SealPress.Press(SealPress.Press())).Message);

    [Theory]
    [InlineData(-2)]
    [InlineData(5 * 366)]
    public void Nothing_is_sealed_outside_the_time_of_the_certificate(int days)
    {
        var refused = Assert.Throws<InvalidOperationException>(() => SealPress.Press(at: SealPress.Now.AddDays(days)));
        Assert.Equal("Documents cannot be sealed now, because of the certificate: NotTimeValid.", refused.Message);
    }

    [Fact]
    public void The_seal_of_another_site_is_not_ours_and_is_theirs()
    {
        using var others = SealPress.Open(SealPress.NewPath());
        var pressed = SealPress.Press(certificate: others);
        Assert.Equal((SealVerdict.NotOurs, "This document is not sealed by this site: the certificate in the seal is not one of this site."), (SealPress.Check(pressed).Verdict, SealPress.Check(pressed).Sentence));
        Assert.True(SealPress.Check(pressed, others).IsGood);
    }

    [Fact]
    public void A_file_without_a_seal_is_told_from_one_that_is_no_pdf()
    {
        Assert.Equal(SealVerdict.NotOurs, SealPress.Check(PlainPdf.Make()).Verdict);
        Assert.Equal(SealVerdict.NoPdf, SealPress.Check("a letter"u8.ToArray()).Verdict);
        Assert.Equal(SealVerdict.NoPdf, SealPress.Check([]).Verdict);
    }

    [Fact]
    public void Strangers_judge_alike_by_the_published_certificates()
    {
        Assert.DoesNotContain("PRIVATE", SealPress.Certificate.Trust.Pem, StringComparison.Ordinal);
        Assert.True(SealCheck.Of(SealPress.Press(), SealTrust.Of(SealPress.Certificate.Trust.Pem)!).IsGood);
        Assert.Null(SealTrust.Of("no certificate"));
        Assert.Null(SealTrust.Of("-----BEGIN CERTIFICATE-----\nAAAA\n-----END CERTIFICATE-----\n"));
    }
}
