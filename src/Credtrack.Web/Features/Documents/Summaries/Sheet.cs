using PdfSharp;
using PdfSharp.Drawing;
using PdfSharp.Pdf;
using PdfSharp.UniversalAccessibility;
using Tag = PdfSharp.UniversalAccessibility.PdfBlockLevelElementTag;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>The pages of one document, filled from the top: places in points, tags as they are drawn, a new page when the room ends.</summary>
internal sealed class Sheet : IDisposable
{
    private const double Side = 56, Top = 42, Foot = 54, Margin = 112, Gutter = 16;
    private readonly PdfDocument document;
    private readonly StructureBuilder tags;
    private readonly Action<Sheet> head, foot;
    private XGraphics? page;

    /// <param name="head">Draws what stands over every page, from the top down.</param>
    /// <param name="foot">Draws what stands under every page, from <see cref="End"/> down.</param>
    public Sheet(PdfDocument document, Paper paper, Action<Sheet> head, Action<Sheet> foot)
    {
        (this.document, this.head, this.foot) = (document, head, foot);
        (Width, Height) = paper == Paper.A4 ? (595.28, 841.89) : (612, 792);
        tags = UAManager.ForDocument(document).StructureBuilder;
        Turn();
    }

    public double Width { get; }
    public double Height { get; }
    public double Y { get; set; }
    public int Page => document.PageCount;

    public static double Left => Side;
    public double Right => Width - Side;
    public double End => Height - Foot;

    /// <summary>What is said hangs right of the margin in which its heading stands.</summary>
    public static double Matter => Side + Margin + Gutter;
    public double MatterWidth => Right - Matter;
    public static double MarginWidth => Margin;

    public XGraphics Pen => page!;

    /// <summary>Goes to a new page if less than this is left.</summary>
    /// <returns>Whether it is a new page.</returns>
    /// <exception cref="InvalidOperationException">No page has room for it: rather no document than one that is cut.</exception>
    public bool Need(double height)
    {
        if (Y + height <= End) return false;
        Turn();
        return Y + height <= End ? true : throw new InvalidOperationException("A part of the document is taller than a page.");
    }

    public void Tagged(Tag tag, Action draw) => Within(() => tags.BeginElement(tag), draw);
    public void Grouped(PdfGroupingElementTag tag, Action draw) => Within(() => tags.BeginElement(tag), draw);

    /// <summary>What a screen reader passes over: lines, and what is repeated on each page.</summary>
    public void Artifact(Action draw) => Within(tags.BeginArtifact, draw);

    /// <summary>A picture, with the words that stand for it; its box in points from the upper left.</summary>
    public void Figure(string words, XRect box, Action draw) => Within(
        () => tags.BeginElement(PdfIllustrationElementTag.Figure, words, new XRect(box.X, Height - box.Bottom, box.Width, box.Height)), draw);

    /// <summary>The header of a column or a row, which a screen reader says before each cell.</summary>
    public void Header(string scope, Action draw) => Within(() =>
    {
        tags.BeginElement(Tag.TableHeaderCell);
        tags.CurrentStructureElement.TableAttributes.Elements.SetName("/Scope", scope);
    }, draw);

    public void Write(double x, double y, string text, Style style) => Pen.DrawString(text, style.Font, style.Grey.Brush(), x, y + style.Base);
    public void WriteTo(double right, double y, string text, Style style) => Write(right - Wide(text, style), y, text, style);

    public double Wide(string text, Style style) => Pen.MeasureString(text, style.Font).Width;
    public List<string> Wrap(double width, string text, Style style) => Wrapped.Into(width, text, style.Font, Pen);
    public double Tall(double width, string text, Style style) => Wrap(width, text, style).Count * style.Leading;

    /// <summary>Lines one under the other, from a height on; it ends where the next would begin.</summary>
    public double Lines(double x, double y, IEnumerable<string> lines, Style style)
    {
        foreach (var line in lines)
        {
            Write(x, y, line, style);
            y += style.Leading;
        }
        return y;
    }

    /// <summary>A paragraph; where the page ends inside it, it goes on as a further one.</summary>
    public void Paragraph(double x, double width, string text, Style style, Tag tag = Tag.Paragraph)
    {
        for (var rest = Wrap(width, text, style); rest.Count > 0;)
        {
            Need(style.Leading);
            var fits = Math.Clamp((int)((End - Y) / style.Leading + .01), 1, rest.Count);
            Tagged(tag, () => Y = Lines(x, Y, rest.Take(fits), style));
            rest = rest[fits..];
        }
    }

    public void Line(double left, double y, double right, XPen pen) => Artifact(() => Pen.DrawLine(pen, left, y, right, y));

    public void Dispose() => page?.Dispose();

    private void Within(Action begin, Action draw)
    {
        begin();
        draw();
        tags.End();
    }

    private void Turn()
    {
        page?.Dispose();
        var next = document.AddPage();
        (next.Width, next.Height) = (XUnit.FromPoint(Width), XUnit.FromPoint(Height));
        next.Elements.SetName("/Tabs", "/S");
        page = XGraphics.FromPdfPage(next);
        Y = Top;
        var start = Y;
        Artifact(() => foot(this));
        Y = start;
        head(this);
    }
}
