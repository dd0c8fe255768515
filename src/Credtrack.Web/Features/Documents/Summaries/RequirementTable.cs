using PdfSharp.Drawing;
using Tag = PdfSharp.UniversalAccessibility.PdfBlockLevelElementTag;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>What is required, what was found, and the result of it. Rows stay whole; on a further page the header stands again.</summary>
internal sealed class RequirementTable(Sheet sheet, IReadOnlyList<(string Asked, string Value, bool Met)> rows)
{
    private const double Pad = 1.75, Between = 12, Mark = 7;

    private double Result => sheet.Right - 46;
    private double Found => Result - Between - FoundWidth;
    private double FoundWidth => sheet.MatterWidth * .3;
    private double AskedWidth => Found - Between - Sheet.Matter;

    /// <summary>The header and a row, in points: less of a table is not begun.</summary>
    public double Least => HeaderHeight + rows.Take(1).Sum(Height);

    private static double HeaderHeight => Style.Note.Leading + 2 * Pad;

    public void Draw() => sheet.Tagged(Tag.Table, () =>
    {
        sheet.Need(Least);
        sheet.Tagged(Tag.TableRow, () => Header(draw => sheet.Header("/Column", draw)));
        for (var n = 0; n < rows.Count; n++)
        {
            // For a screen reader the table never breaks, so the header that stands again on paper is none.
            if (sheet.Need(Height(rows[n]))) sheet.Artifact(() => Header(draw => draw()));
            else if (n > 0) sheet.Line(Sheet.Matter, sheet.Y, sheet.Right, Ink.Hairline.Pen(.4));
            sheet.Tagged(Tag.TableRow, () => Row(rows[n]));
        }
    });

    private double Height((string Asked, string Value, bool Met) row) =>
        Math.Max(sheet.Tall(AskedWidth, row.Asked, Style.Text), sheet.Tall(FoundWidth, row.Value, Style.Strong)) + 2 * Pad;

    private void Header(Action<Action> cell)
    {
        foreach (var (x, name) in new[] { (Sheet.Matter, "Required"), (Found, "Found"), (Result, "Result") })
            cell(() => sheet.Write(x, sheet.Y + Pad, name, Style.Note));
        sheet.Y += HeaderHeight;
    }

    private void Row((string Asked, string Value, bool Met) row)
    {
        var (top, height) = (sheet.Y + Pad, Height(row));
        sheet.Header("/Row", () => sheet.Lines(Sheet.Matter, top, sheet.Wrap(AskedWidth, row.Asked, Style.Text), Style.Text));
        sheet.Tagged(Tag.TableDataCell, () => sheet.Lines(Found, top, sheet.Wrap(FoundWidth, row.Value, Style.Strong), Style.Strong));
        sheet.Tagged(Tag.TableDataCell, () =>
        {
            var middle = top + Style.Text.Leading / 2;
            XPoint[] notch = [new(Result, middle), new(Result + Mark, middle - Mark / 2), new(Result + Mark, middle + Mark / 2)];
            if (row.Met) sheet.Pen.DrawPolygon(Ink.Dark.Brush(), notch, XFillMode.Winding);
            else sheet.Pen.DrawPolygon(Ink.Dark.Pen(.8), notch);
            sheet.Write(Result + Mark + 4, top, row.Met ? "met" : "not met", row.Met ? Style.Text : Style.Strong);
        });
        sheet.Y += height;
    }
}
