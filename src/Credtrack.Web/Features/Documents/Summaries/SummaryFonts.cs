using PdfSharp.Drawing;
using PdfSharp.Fonts;
using PdfSharp.Pdf;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>The two faces of the document, carried inside the program. PDFsharp takes one source of fonts for the whole process.</summary>
internal sealed class SummaryFonts : IFontResolver
{
    private const string Family = "Source Sans 3";

    // A type is initialised once, whatever number of requests come together.
    static SummaryFonts()
    {
        GlobalFontSettings.FontResolver = new SummaryFonts();
        // Any other encoding embeds a face a second time.
        GlobalFontSettings.DefaultFontEncoding = PdfFontEncoding.Unicode;
    }

    private SummaryFonts() { }

    /// <param name="size">In points.</param>
    public static XFont Regular(double size) => new(Family, size, XFontStyleEx.Regular);

    /// <param name="size">In points.</param>
    public static XFont Semibold(double size) => new(Family, size, XFontStyleEx.Bold);

    /// <summary>Whether both faces can draw the character; PDFsharp itself leaves a missing one out without a word.</summary>
    public static bool Have(int codePoint) =>
        GlyphHelper.GlyphIndexFromCodePoint(codePoint, Regular(10)) != 0 && GlyphHelper.GlyphIndexFromCodePoint(codePoint, Semibold(10)) != 0;

    public FontResolverInfo? ResolveTypeface(string familyName, bool isBold, bool isItalic) =>
        familyName == Family && !isItalic ? new(isBold ? "Semibold" : "Regular") : null;

    public byte[]? GetFont(string faceName)
    {
        using var face = typeof(SummaryFonts).Assembly.GetManifestResourceStream($"SourceSans3-{faceName}.ttf");
        if (face is null) return null;
        using var bytes = new MemoryStream();
        face.CopyTo(bytes);
        return bytes.ToArray();
    }
}
