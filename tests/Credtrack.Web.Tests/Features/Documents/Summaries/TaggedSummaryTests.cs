using System.Text;
using System.Text.RegularExpressions;
using System.Xml.Linq;
using Credtrack.Web.Features.Documents.Summaries;

namespace Credtrack.Web.Tests.Features.Documents.Summaries;

public sealed class TaggedSummaryTests
{
    private static readonly string Checker = Path.Combine(Laws.Sources.Root, "tests/Credtrack.Web.Tests/Features/Documents/Summaries/tagcheck.py");

    public static TheoryData<string> Names => ["met", "gap", "long"];

    [Theory, MemberData(nameof(Names))]
    public void A_strict_reader_finds_nothing_to_complain_about(string name)
    {
        using var printout = new Printout(Facts(name));
        var (code, said, complaint) = Tool.Run("qpdf", "--check", printout.Path);
        Assert.True(code == 0 && complaint.Length == 0 && !said.Contains("WARNING", StringComparison.Ordinal), said + complaint);
    }

    [Theory, MemberData(nameof(Names))]
    public void All_that_is_drawn_is_tagged_and_every_tag_is_in_its_place(string name)
    {
        using var printout = new Printout(Facts(name));
        var said = Tool.Says("/usr/bin/python3", Checker, printout.Path);
        // One header for the whole table, then one for each row; the QR code and the depth row have words.
        Assert.Contains($"TH {3 + Facts(name).Lines[0].Requirements.Count}\n", said, StringComparison.Ordinal);
        Assert.Contains("Figure 2\n", said, StringComparison.Ordinal);
        Assert.Contains("QR code with the address https://credtrack.brindlemoor.example/check/K7QX-4M2P-9TBD", said, StringComparison.Ordinal);
        Assert.Contains($"Biliary: {Facts(name).Lines[0].Counted} count, 25 required.", said, StringComparison.Ordinal);
        Assert.Matches(@"Tagged:\s+yes", printout.Info);
    }

    [Theory]
    [InlineData("/Lang(en)", "/Lxng(en)", "Lang")]
    [InlineData("/DisplayDocTitle true", "/DisplayDocTitle null", "DisplayDocTitle")]
    [InlineData("/Scope/Column", "/Scxpe/Column", "TH without scope")]
    [InlineData("/Alt(QR", "/Axt(QR", "Figure without words")]
    [InlineData("/Tabs/S", "/Txbs/S", "Tabs")]
    public void The_tag_checker_itself_sees_what_is_wrong(string right, string wrong, string problem)
    {
        using var printout = new Printout(Samples.Met);
        var file = Encoding.Latin1.GetString(File.ReadAllBytes(printout.Path));
        Assert.Contains(right, file, StringComparison.Ordinal);
        File.WriteAllBytes(printout.Path, Encoding.Latin1.GetBytes(file.Replace(right, wrong, StringComparison.Ordinal)));
        var (code, said, _) = Tool.Run("/usr/bin/python3", Checker, printout.Path);
        Assert.Equal(1, code);
        Assert.Contains(problem, said, StringComparison.Ordinal);
    }

    [Fact]
    public void The_metadata_are_well_formed_and_claim_what_the_document_tries_to_be()
    {
        var facts = Samples.Met with { Holder = "<b>O'Brien</b> & \"Zażółć\"" };
        using var printout = new Printout(facts);
        var packet = XDocument.Parse(Tool.Says("pdfinfo", "-meta", printout.Path).TrimStart('\uFEFF'));
        string Of(string space, string name) => packet.Descendants(XName.Get(name, space)).Single().Value;
        // Namespaces and values: ISO 19005-3 (PDF/A-3, level B), ISO 14289-1 (PDF/UA-1); from memory.
        Assert.Equal("3", Of("http://www.aiim.org/pdfa/ns/id/", "part"));
        Assert.Equal("B", Of("http://www.aiim.org/pdfa/ns/id/", "conformance"));
        Assert.Equal("1", Of("http://www.aiim.org/pdfua/ns/id/", "part"));
        Assert.Equal("Competency summary, <b>O'Brien</b> & \"Zażółć\", K7QX-4M2P-9TBD", Of("http://purl.org/dc/elements/1.1/", "title"));
        Assert.Equal("2026-11-03T14:20:05Z", Of("http://ns.adobe.com/xap/1.0/", "CreateDate"));
        Assert.Matches(@"CreationDate:\s+2026-11-03T14:20:05Z", Tool.Says("pdfinfo", "-isodates", printout.Path).Replace("+00", "Z", StringComparison.Ordinal));
        Assert.Matches(@"Producer:\s+" + Regex.Escape(Of("http://ns.adobe.com/pdf/1.3/", "Producer")), printout.Info);
    }

    [Fact]
    public void Two_faces_are_embedded_and_no_other_is_used()
    {
        using var printout = new Printout(Samples.Long);
        var fonts = Tool.Says("pdffonts", printout.Path).Split('\n', StringSplitOptions.RemoveEmptyEntries).Skip(2).ToList();
        Assert.Equal(2, fonts.Count);
        Assert.All(fonts, font => Assert.Matches(@"\+Source Sans 3( Semi)?\s+CID TrueType\s+Identity-H\s+yes yes yes", font));
    }

    [Fact]
    public void The_paper_is_grey_so_that_no_printer_loses_anything()
    {
        using var printout = new Printout(Samples.OverAGap);
        var picture = File.ReadAllBytes(printout.Scanned(40, "ppm"));
        var pixels = picture.AsSpan(Regex.Match(Encoding.ASCII.GetString(picture, 0, 40), @"^P6\s+\d+\s+\d+\s+255\s").Length);
        var dark = 0;
        for (var n = 0; n < pixels.Length; n += 3)
        {
            Assert.True(pixels[n] == pixels[n + 1] && pixels[n] == pixels[n + 2], $"a colour at byte {n}");
            if (pixels[n] < 80) dark++;
        }
        Assert.True(dark > 100);
    }

    private static SummaryFacts Facts(string name) => name switch { "met" => Samples.Met, "gap" => Samples.OverAGap with { Paper = Paper.Letter }, _ => Samples.Long };
}
