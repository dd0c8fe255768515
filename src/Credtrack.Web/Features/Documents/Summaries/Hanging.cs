using PdfSharp.UniversalAccessibility;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>A section hangs from a hairline: heading and explanation in the margin, what is said to the right of it.</summary>
internal static class Hanging
{
    private const double Over = 7, Under = 6;

    /// <param name="note">Explains the heading, under it; may be empty.</param>
    /// <param name="least">The height, in points, that must follow on the same page, so that no heading stands alone.</param>
    /// <param name="aside">Drawn in the margin under the heading; its height in points counts towards the section's.</param>
    public static void Section(this Sheet sheet, string heading, string note, double least, Action matter, (double Height, Action Draw)? aside = null)
    {
        var words = sheet.Tall(Sheet.MarginWidth, heading, Style.Heading) + (note.Length == 0 ? 0 : sheet.Tall(Sheet.MarginWidth, note, Style.Note));
        var margin = words + (aside?.Height ?? 0);
        // At the top of a page the skin line is there already.
        if (!sheet.Need(Over + Under + Math.Max(margin, least)))
        {
            sheet.Y += Over;
            sheet.Line(Sheet.Left, sheet.Y, sheet.Right, Ink.Hairline.Pen());
            sheet.Y += Under;
        }
        sheet.Grouped(PdfGroupingElementTag.Section, () =>
        {
            var (top, page) = (sheet.Y, sheet.Page);
            sheet.Paragraph(Sheet.Left, Sheet.MarginWidth, heading, Style.Heading, PdfBlockLevelElementTag.Heading2);
            if (note.Length > 0) sheet.Paragraph(Sheet.Left, Sheet.MarginWidth, note, Style.Note);
            aside?.Draw();
            sheet.Y = top;
            matter();
            if (sheet.Page == page) sheet.Y = Math.Max(sheet.Y, top + margin);
        });
    }

    /// <summary>A label and what it stands for, side by side and read as one.</summary>
    public static void Pair(this Sheet sheet, double x, double indent, string label, string value, Style style)
    {
        var lines = sheet.Wrap(sheet.Right - x - indent, value, style);
        sheet.Need(lines.Count * style.Leading);
        sheet.Tagged(PdfBlockLevelElementTag.Paragraph, () =>
        {
            sheet.Write(x, sheet.Y, label + " ", Style.Label);
            sheet.Y = sheet.Lines(x + indent, sheet.Y, lines, style);
        });
    }
}
