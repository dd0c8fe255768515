using Credtrack.Web.Features.Documents.Summaries;

namespace Credtrack.Web.Tests.Features.Documents.Summaries;

public sealed class LongSummaryTests
{
    [Theory]
    [InlineData(Paper.A4)]
    [InlineData(Paper.Letter)]
    public void Every_page_says_which_of_how_many_it_is_and_whose(Paper paper)
    {
        using var printout = new Printout(Samples.Long with { Paper = paper, IsDemonstration = true });
        var pages = printout.Pages;
        Assert.InRange(pages, 2, 5);
        Assert.All(Enumerable.Range(1, pages), page => Assert.All(
            [$"page {page} of {pages}", "K7QX-4M2P-9TBD Demonstration: every person", Samples.Long.Holder],
            words => Assert.Contains(words, printout.PageText(page), StringComparison.Ordinal)));
    }

    [Fact]
    public void Thirty_requirements_are_all_there_and_stand_under_their_header_on_every_page()
    {
        using var printout = new Printout(Samples.Long);
        var pages = Enumerable.Range(1, printout.Pages).Select(printout.PageText).ToList();
        Assert.All(Samples.Long.Lines[0].Requirements, r => Assert.Contains($"{r.Asked} {r.Value} {(r.Met ? "met" : "not met")}", string.Join(' ', pages), StringComparison.Ordinal));
        var withRows = pages.Where(p => p.Contains("Requirement number", StringComparison.Ordinal) && !p.Contains("Not met when", StringComparison.Ordinal)).ToList();
        Assert.True(withRows.Count > 1);
        Assert.All(withRows, page => Assert.Contains("Required Found Result", page, StringComparison.Ordinal));
    }

    [Fact]
    public void A_reason_of_many_pages_keeps_every_word_and_line()
    {
        var reason = string.Join("\r\n", Enumerable.Range(1, 120).Select(n => $"Line {n} of a reason that a committee has written, with word{n}word at its end."));
        using var printout = new Printout(Samples.OverAGap with { GapReason = reason });
        var words = string.Join(' ', Enumerable.Range(1, printout.Pages).Select(p => printout.PageText(p)));
        Assert.True(printout.Pages > 2);
        Assert.All(Enumerable.Range(1, 120), n => Assert.Contains($"Line {n} of a reason that a committee has written, with word{n}word at its end.", words, StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(Paper.A4)]
    [InlineData(Paper.Letter)]
    public void The_longest_words_of_the_widest_letter_lose_none(Paper paper)
    {
        var wide = new string('W', 300);
        var facts = Samples.Met with
        {
            Paper = paper, IsDemonstration = true, DocumentCode = new string('M', 24), Holder = wide, Programme = wide, Site = wide, Privilege = wide, RulebookName = wide, SignerName = wide,
            SignerRole = wide, Meaning = wide, GapReason = wide, CertificateFingerprint = wide, LedgerHead = wide, Lines = [new(wide, 1, 1, 1, [(wide, wide, true), (wide, wide, true)]) { Required = 1 }],
        };
        using var printout = new Printout(facts);
        // Each text once; the signer again with the reason, the holder again on every further page.
        var letters = 300 * (11 + 5 + 1 + printout.Pages - 1);
        Assert.Equal(letters, Wide(printout.Text));
        // What runs over an edge of the paper is still in the text, but not inside the margins of the page.
        Assert.Equal(letters, Wide(Tool.Says("pdftotext", "-x", "56", "-y", "40", "-W", paper == Paper.A4 ? "484" : "501", "-H", paper == Paper.A4 ? "750" : "700", printout.Path, "-")));

        static int Wide(string text) => text.Replace("Who", "", StringComparison.Ordinal).Replace("Wednesday", "", StringComparison.Ordinal).Count(letter => letter == 'W');
    }
}
