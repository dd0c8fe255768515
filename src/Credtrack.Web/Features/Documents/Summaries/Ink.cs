using PdfSharp.Drawing;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>Greys only: a hospital printer must lose nothing.</summary>
internal static class Ink
{
    public static readonly XColor Dark = XColor.FromGrayScale(.08), Second = XColor.FromGrayScale(.30), Faint = XColor.FromGrayScale(.62),
        Hairline = XColor.FromGrayScale(.78), Solid = XColor.FromGrayScale(.32), Over = XColor.FromGrayScale(.84), Track = XColor.FromGrayScale(.94), Paper = XColor.FromGrayScale(1), Black = XColor.FromGrayScale(0);

    public static XBrush Brush(this XColor grey) => new XSolidBrush(grey);

    /// <param name="width">In points.</param>
    public static XPen Pen(this XColor grey, double width = .6) => new(grey, width);
}

/// <summary>A face in a size and a grey, with the height of its line; sizes in points.</summary>
internal sealed record Style(XFont Font, double Leading, XColor Grey)
{
    public static readonly Style
        Title = new(SummaryFonts.Regular(24), 28, Ink.Dark),
        Lead = new(SummaryFonts.Semibold(13), 18, Ink.Dark),
        Count = new(SummaryFonts.Semibold(12), 17, Ink.Dark),
        Heading = new(SummaryFonts.Semibold(10), 13.5, Ink.Dark),
        Text = new(SummaryFonts.Regular(10), 13.5, Ink.Dark),
        Strong = new(SummaryFonts.Semibold(10), 13.5, Ink.Dark),
        Label = new(SummaryFonts.Regular(10), 13.5, Ink.Second),
        Note = new(SummaryFonts.Regular(8.5), 11.5, Ink.Second),
        NoteStrong = new(SummaryFonts.Semibold(8.5), 11.5, Ink.Dark),
        Code = new(SummaryFonts.Semibold(17), 22, Ink.Dark);

    /// <summary>From the top of a line to the foot of its letters.</summary>
    public double Base => (Leading + Font.Size * .66) / 2;
}
