using Credtrack.Core;
using PdfSharp.Pdf;
using PdfSharp.UniversalAccessibility;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>The competency summary as a tagged PDF, not yet sealed. Two drawings of the same facts differ in their file identifier.</summary>
public static class CompetencySummary
{
    /// <returns>Why these facts cannot be drawn, or null.</returns>
    public static string? WhyNotDraw(SummaryFacts facts) => Drawable.WhyNot(facts);

    /// <exception cref="RuleBroken">The facts cannot be drawn; <see cref="WhyNotDraw"/> says why.</exception>
    public static byte[] Draw(SummaryFacts facts)
    {
        RuleBroken.If(WhyNotDraw(facts));
        var code = CheckCode.Of(facts.CheckAddress)!;
        // The first time only to learn how many pages there are.
        using var draft = Opened(facts);
        var pages = new SummaryPages(facts, code, "?").Draw(draft);
        using var document = Opened(facts);
        new SummaryPages(facts, code, pages.ToString(System.Globalization.CultureInfo.InvariantCulture)).Draw(document);
        using var drawn = new MemoryStream();
        document.Save(drawn, closeStream: false);
        return Finish.Of(drawn.ToArray(), Xmp.Of(facts.Title, facts.SignedAt, document.Info));
    }

    private static PdfDocument Opened(SummaryFacts facts)
    {
        var document = new PdfDocument();
        document.SetPdfA();
        (document.Info.Title, document.Info.Creator, document.Info.CreationDate) = (facts.Title, "Credtrack", facts.SignedAt);
        UAManager.ForDocument(document).SetDocumentLanguage("en");
        // A letter that the check let through and the font lacks would vanish from a sealed document: then rather no document.
        document.RenderEvents.RenderTextEvent += (_, text) =>
        {
            if (text.CodePointGlyphIndexPairs.Any(pair => pair.GlyphIndex == 0)) throw new InvalidOperationException("A letter without a glyph was about to be drawn.");
        };
        return document;
    }
}
