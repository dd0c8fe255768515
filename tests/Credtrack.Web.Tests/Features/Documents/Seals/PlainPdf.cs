using System.Globalization;
using System.Text;

namespace Credtrack.Web.Tests.Features.Documents.Seals;

/// <summary>Small PDFs written by hand, object by object, with a classic cross-reference table.</summary>
internal static class PlainPdf
{
    private const string Words = "BT /F1 24 Tf 72 700 Td (Cardiac: 25 of 25 scans) Tj ET";

    /// <summary>Two pages with a line of text, and whatever else catalog and first page are to hold; further objects begin at number 7.</summary>
    public static byte[] Make(string inCatalog = "", string inPage = "", params string[] further) => File([
        $"<</Type/Catalog/Pages 2 0 R{inCatalog}>>",
        "<</Type/Pages/Count 2/Kids[3 0 R 4 0 R]>>",
        $"<</Type/Page/MediaBox[0 0 595 842]/Parent 2 0 R/Contents 5 0 R/Resources<</Font<</F1 6 0 R>>>>{inPage}>>",
        "<</Type /Page /MediaBox [0 0 595 842] /Parent 2 0 R>> % the second page (of two",
        $"<</Length {Words.Length}>>\nstream\n{Words}\nendstream",
        "<</Type/Font/Subtype/Type1/BaseFont/Helvetica>>",
        .. further]);

    /// <summary>The file with one more revision, as an editor would add it: the first page turned around.</summary>
    public static byte[] Updated(byte[] pdf)
    {
        var text = Encoding.Latin1.GetString(pdf);
        var before = text[(text.LastIndexOf("startxref\n", StringComparison.Ordinal) + 10)..text.LastIndexOf("\n%%EOF", StringComparison.Ordinal)];
        var page = "3 0 obj\n<</Type/Page/MediaBox[0 0 595 842]/Parent 2 0 R/Contents 5 0 R/Resources<</Font<</F1 6 0 R>>>>/Rotate 180>>\nendobj\n";
        var update = string.Create(CultureInfo.InvariantCulture, $"{page}xref\n3 1\n{text.Length:D10} 00000 n \ntrailer\n<</Root 1 0 R/Size 9/Prev {before}>>\nstartxref\n{text.Length + page.Length}\n%%EOF\n");
        return Encoding.Latin1.GetBytes(text + update);
    }

    private static byte[] File(string[] objects)
    {
        var (text, table) = (new StringBuilder("%PDF-1.7\n%\u00e2\u00e3\u00cf\u00d3\n"), new StringBuilder());
        foreach (var (index, value) in objects.Index())
        {
            table.Append(CultureInfo.InvariantCulture, $"{text.Length:D10} 00000 n \n");
            text.Append(CultureInfo.InvariantCulture, $"{index + 1} 0 obj\n{value}\nendobj\n");
        }
        var start = text.Length;
        text.Append(CultureInfo.InvariantCulture, $"xref\n0 {objects.Length + 1}\n0000000000 65535 f \n{table}trailer\n<</Root 1 0 R/Size {objects.Length + 1}>>% by hand\nstartxref\n{start}\n%%EOF\n");
        return Encoding.Latin1.GetBytes(text.ToString());
    }
}
