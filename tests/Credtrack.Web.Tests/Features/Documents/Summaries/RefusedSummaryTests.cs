using Credtrack.Core;
using Credtrack.Web.Features.Documents.Summaries;

namespace Credtrack.Web.Tests.Features.Documents.Summaries;

public sealed class RefusedSummaryTests
{
    [Theory]
    [InlineData("漢字 Li", "The document's font has no 漢 (U+6F22), 字 (U+5B57), which stands in the name of the holder.")]
    [InlineData("שלום", "The document's font has no ש (U+05E9), ל (U+05DC), ו (U+05D5), ם (U+05DD), which stands in the name of the holder.")]
    [InlineData("Li 😀", "The document's font has no 😀 (U+1F600), which stands in the name of the holder.")]
    [InlineData("Li\u202Eil", "The name of the holder holds what cannot be seen on paper: U+202E. Take it out.")]
    [InlineData("Li\u0000\u200B", "The name of the holder holds what cannot be seen on paper: U+0000, U+200B. Take it out.")]
    [InlineData("Li\nLo", "The name of the holder holds what cannot be seen on paper: U+000A. Take it out.")]
    [InlineData("x\u0301", "The name of the holder holds marks that the document cannot set on their letter: \u0301 (U+0301).")]
    [InlineData(" ", "The name of the holder is empty.")]
    public void What_the_paper_cannot_show_is_refused_by_name_and_place(string holder, string why)
    {
        var facts = Samples.Met with { Holder = holder };
        Assert.Equal(why, CompetencySummary.WhyNotDraw(facts));
        Assert.Equal(why, Assert.Throws<RuleBroken>(() => CompetencySummary.Draw(facts)).Message);
    }

    [Fact]
    public void Half_a_letter_is_refused() =>
        Assert.Equal("The name of the holder holds what cannot be seen on paper: U+FFFD. Take it out.", CompetencySummary.WhyNotDraw(Samples.Met with { Holder = "Li \ud800" }));

    [Fact]
    public void Every_text_is_looked_at()
    {
        const string bad = "漢";
        (string Where, SummaryFacts Facts)[] all =
        [
            ("name of the programme", Samples.Met with { Programme = bad }), ("name of the site", Samples.Met with { Site = bad }), ("document code", Samples.Met with { DocumentCode = bad }),
            ("address of the check page", Samples.Met with { CheckAddress = $"https://{bad}.example" }), ("privilege", Samples.Met with { Privilege = bad }),
            ("name of the rulebook", Samples.Met with { RulebookName = bad }), ("version of the rulebook", Samples.Met with { RulebookVersion = bad }),
            ("name of the signer", Samples.Met with { SignerName = bad }), ("role of the signer", Samples.Met with { SignerRole = bad }), ("time zone", Samples.Met with { ZoneId = bad }),
            ("meaning of the signature", Samples.Met with { Meaning = bad }), ("fingerprint of the certificate", Samples.Met with { CertificateFingerprint = bad }),
            ("reason for the gap", Samples.Met with { GapReason = bad }), ("head of the ledger", Samples.Met with { LedgerHead = bad }),
            ("name of the application", Samples.Met with { Lines = [Samples.Biliary with { Application = bad }] }),
            ("requirement of Biliary", Samples.Met with { Lines = [Samples.Biliary with { Requirements = [(bad, "1", true)] }] }),
            ("value found for Biliary", Samples.Met with { Lines = [Samples.Biliary with { Requirements = [("Scans", bad, true)] }] }),
        ];
        Assert.All(all, one => Assert.Equal($"The document's font has no 漢 (U+6F22), which stands in the {one.Where}.", CompetencySummary.WhyNotDraw(one.Facts)));
        // A text that is added later and not looked at would be missing here.
        Assert.Equal(typeof(SummaryFacts).GetProperties().Count(p => p.PropertyType == typeof(string)), all.Length - 3 + 1);
    }

    [Fact]
    public void Facts_that_lead_nowhere_are_refused()
    {
        Assert.Equal("The summary names no application.", CompetencySummary.WhyNotDraw(Samples.Met with { Lines = [] }));
        Assert.Equal("There is no time zone Mars/Olympus; take an IANA name such as Europe/Dublin.", CompetencySummary.WhyNotDraw(Samples.Met with { ZoneId = "Mars/Olympus" }));
        Assert.Equal("The address of the check page must be absolute, such as https://credtrack.example/check.", CompetencySummary.WhyNotDraw(Samples.Met with { CheckAddress = "/check/K7QX" }));
        Assert.Equal("The document code has 25 characters; 24 at most fit.", CompetencySummary.WhyNotDraw(Samples.Met with { DocumentCode = new string('M', 25) }));
        Assert.Equal("The meaning of the signature has 301 characters; 300 at most fit.", CompetencySummary.WhyNotDraw(Samples.Met with { Meaning = new string('x', 301) }));
    }

    [Fact]
    public void An_accent_typed_as_a_mark_of_its_own_is_set_on_its_letter()
    {
        using var printout = new Printout(Samples.Met with { Holder = "Zoe\u0301 Nguye\u0302\u0303n" });
        Assert.Contains("Zoé Nguyễn", printout.Text, StringComparison.Ordinal);
    }
}
