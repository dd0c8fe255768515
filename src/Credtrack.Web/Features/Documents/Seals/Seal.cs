using System.Globalization;
using System.Text;

namespace Credtrack.Web.Features.Documents.Seals;

/// <summary>The site's seal on a document: a certification signature (PAdES B-B) that covers every byte but itself.</summary>
public static class Seal
{
    /// <summary>Bytes kept free for the signature; with a chain of two certificates of 3,072 bits it takes about 3,500.</summary>
    internal const int Room = 16_384;

    internal const string Kind = "/SubFilter /ETSI.CAdES.detached";
    private static readonly string NoRange = $"/ByteRange [0 {new string('0', 32)}]";

    /// <summary>The sealed document: the given bytes, unchanged, with one revision behind them.</summary>
    /// <param name="pdf">A freshly drawn PDF of one revision with a classic cross-reference table.</param>
    /// <param name="at">UTC; the certificate has to be good then.</param>
    /// <param name="name">Who seals: the name of the site.</param>
    /// <param name="reason">What the seal means.</param>
    /// <exception cref="InvalidOperationException">The certificate is not good at that time.</exception>
    /// <exception cref="InvalidDataException">The PDF is not of the kind that we draw.</exception>
    public static byte[] Apply(byte[] pdf, SealingCertificate certificate, DateTime at, string name, string reason)
    {
        if (certificate.Trust.WhyNot(certificate.Signer, at) is { } whyNot) throw new InvalidOperationException($"Documents cannot be sealed now, because of the certificate: {whyNot}.");
        var written = Prepared(pdf, at, name, reason);

        var text = Encoding.Latin1.GetString(written, pdf.Length, written.Length - pdf.Length);
        var range = pdf.Length + text.IndexOf(NoRange, StringComparison.Ordinal);
        var start = pdf.Length + text.IndexOf("/Contents <", StringComparison.Ordinal) + "/Contents ".Length;
        var end = start + 2 * Room + 2;
        Encoding.Latin1.GetBytes(string.Create(CultureInfo.InvariantCulture, $"/ByteRange [0 {start} {end} {written.Length - end}").PadRight(NoRange.Length - 1)).CopyTo(written, range);

        var signature = Convert.ToHexString(SealCms.Sign([.. written.AsSpan(0, start), .. written.AsSpan(end)], certificate));
        if (signature.Length > 2 * Room) throw new InvalidOperationException($"The certificate chain is too long for the seal: {signature.Length / 2} bytes, {Room} at most.");
        Encoding.Latin1.GetBytes(signature).CopyTo(written, start + 1);
        return written;
    }

    private static byte[] Prepared(byte[] pdf, DateTime at, string name, string reason)
    {
        var revision = new PdfRevision(pdf);
        var (catalog, firstPage) = (revision.Dictionary(revision.Root), revision.FirstPage());
        var (form, page) = (catalog["AcroForm"] is { } found ? revision.Dictionary(found) : revision.Dictionary("<< >>"), revision.Dictionary(firstPage));
        var time = at.ToString("yyyyMMddHHmmss", CultureInfo.InvariantCulture);
        // P 2: whatever else changes breaks the seal, but empty fields may be filled and signed (ISO 32000-1, table 254).
        var seal = revision.Add($"<< /Type /Sig /Filter /Adobe.PPKLite {Kind} /M (D:{time}Z) {NoRange} /Contents <{new string('0', 2 * Room)}> /Name {Text(name)} /Reason {Text(reason)} "
            + "/Reference [<< /Type /SigRef /TransformMethod /DocMDP /TransformParams << /Type /TransformParams /P 2 /V /1.2 >> >>] >>");
        // Without extent and off the page: the seal is not drawn, and needs no place among the tags.
        var field = revision.Add($"<< /Type /Annot /Subtype /Widget /FT /Sig /T (Seal) /TU {Text(reason)} /F 132 /Rect [-1 -1 -1 -1] /P {firstPage} /V {seal} >>");

        page["Annots"] = $"[{string.Join(' ', [.. page["Annots"] is { } annotations ? revision.Items(annotations) : [], field])}]";
        form["Fields"] = $"[{string.Join(' ', [.. form["Fields"] is { } fields ? revision.Items(fields) : [], field])}]";
        form["SigFlags"] = "3";
        catalog["AcroForm"] = form.ToString();
        catalog["Perms"] = $"<< /DocMDP {seal} >>";
        revision.Replace(firstPage, page);
        revision.Replace(revision.Root, catalog);
        return revision.Written();
    }

    // As UTF-16 in hexadecimal, which needs no escapes and holds every language.
    private static string Text(string words) => $"<FEFF{Convert.ToHexString(Encoding.BigEndianUnicode.GetBytes(words))}>";
}
