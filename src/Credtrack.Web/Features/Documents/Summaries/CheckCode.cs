using PdfSharp.Drawing;
using QRCoder;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>
/// The address of the check page as a QR code (ISO/IEC 18004), drawn as rectangles. A module is always equally large, so that a coarse scan
/// of the paper still reads it; a longer address makes a larger code.
/// </summary>
internal sealed class CheckCode
{
    // In points; 0.85 mm, which is 2.7 dots of a scan at 80 dots per inch.
    private const double Module = 2.4;

    // Beyond this the code and its quiet zone of four modules would not fit beside the text.
    private const int Most = 49;

    private readonly bool[][] dark;

    private CheckCode(bool[][] dark) => this.dark = dark;

    /// <summary>In points, without the quiet zone, which is paper.</summary>
    public double Side => dark.Length * Module;

    /// <returns>Null if the address is too long: more than 152 bytes of UTF-8 (version 8, level M).</returns>
    public static CheckCode? Of(string address)
    {
        if (address.Length > 152) return null;
        using var code = QRCodeGenerator.GenerateQrCode(address, QRCodeGenerator.ECCLevel.M);
        const int quiet = 4;
        var size = code.ModuleMatrix.Count - 2 * quiet;
        if (size > Most) return null;
        return new([.. Enumerable.Range(quiet, size).Select(row => Enumerable.Range(quiet, size).Select(column => code.ModuleMatrix[row][column]).ToArray())]);
    }

    /// <summary>One path with neighbours joined, so that no seam shows between modules.</summary>
    public void Draw(XGraphics pen, double x, double y)
    {
        var modules = new XGraphicsPath { FillMode = XFillMode.Winding };
        for (var row = 0; row < dark.Length; row++)
        {
            for (var (from, to) = (0, 0); from < dark.Length; from = to + 1)
            {
                for (to = from; to < dark.Length && dark[row][to];) to++;
                if (to > from) modules.AddRectangle(x + from * Module, y + row * Module, (to - from) * Module, Module);
            }
        }
        pen.DrawPath(Ink.Black.Brush(), modules);
    }
}
