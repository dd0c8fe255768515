using System.Globalization;
using System.Text.RegularExpressions;
using Credtrack.Web.Features.Documents.Summaries;

namespace Credtrack.Web.Tests.Features.Documents.Summaries;

/// <summary>A drawn summary in a file of its own, as a stranger's programs see it.</summary>
internal sealed partial class Printout : IDisposable
{
    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("summary");

    public Printout(SummaryFacts facts) => File.WriteAllBytes(Path, CompetencySummary.Draw(facts));

    public string Path => System.IO.Path.Combine(folder.FullName, "summary.pdf");

    /// <summary>All words in the order in which they were drawn, each gap one space.</summary>
    public string Text => Flat(Tool.Says("pdftotext", "-raw", Path, "-"));

    public string Info => Tool.Says("pdfinfo", Path);

    public int Pages => int.Parse(Regex.Match(Info, @"^Pages:\s+(\d+)", RegexOptions.Multiline).Groups[1].Value, CultureInfo.InvariantCulture);

    public string PageText(int page) => Flat(Tool.Says("pdftotext", "-raw", "-f", $"{page}", "-l", $"{page}", Path, "-"));

    /// <summary>The first page as a scanner would deliver it.</summary>
    /// <returns>The path of the picture.</returns>
    public string Scanned(int dotsPerInch, string kind)
    {
        var picture = System.IO.Path.Combine(folder.FullName, $"at-{dotsPerInch}");
        Tool.Says("pdftoppm", ["-r", $"{dotsPerInch}", "-singlefile", .. kind == "ppm" ? Array.Empty<string>() : [$"-{kind}"], Path, picture]);
        return $"{picture}.{kind}";
    }

    public static string Flat(string text) => Gaps().Replace(text, " ").Trim();

    public void Dispose() => folder.Delete(recursive: true);

    [GeneratedRegex(@"\s+")]
    private static partial Regex Gaps();
}
