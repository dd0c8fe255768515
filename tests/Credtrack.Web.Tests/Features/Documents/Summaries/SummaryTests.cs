using Credtrack.Web.Features.Documents.Summaries;

namespace Credtrack.Web.Tests.Features.Documents.Summaries;

public sealed class SummaryTests
{
    [Theory]
    [InlineData(Paper.A4)]
    [InlineData(Paper.Letter)]
    public void Everything_that_must_be_said_is_on_the_paper(Paper paper)
    {
        using var printout = new Printout(Samples.Met with { Paper = paper, GrantedUntil = new(2028, 11, 3), LedgerHead = new string('a', 64) });
        string[] said =
        [
            "Tobias Achterkamp", "Emergency medicine residency", "Brindlemoor General", "Biliary ultrasound without supervision",
            "from Wednesday 4 November 2026, until Friday 3 November 2028", "41 scans performed, 40 read, 38 counted.", "25 required",
            "Brindlemoor emergency, version 4", "Tuesday 3 November 2026, 14:02:11 (UTC+01:00, Europe/Berlin)",
            "Dr Seraphine Okwuosa-Lund", "Programme director", "Tuesday 3 November 2026, 15:20:05 (UTC+01:00, Europe/Berlin)", "Approved: the holder may do this without supervision",
            "K7QX-4M2P-9TBD", "https://credtrack.brindlemoor.example/check/K7QX-4M2P-9TBD", Samples.Met.CertificateFingerprint, new string('a', 64),
            "Privileges are granted under local rules, by the people licensed to grant them.", "Credtrack counts and shows only; it does not decide.",
        ];
        var text = printout.Text;
        Assert.All(said.Concat(Samples.Biliary.Requirements.SelectMany(r => new[] { r.Asked, r.Value })), words => Assert.Contains(words, text, StringComparison.Ordinal));
        Assert.Equal(6, text.Split("met").Length - 1);
        Assert.DoesNotContain("gap", text, StringComparison.Ordinal);
        Assert.DoesNotContain("Demonstration", text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(Paper.A4, "595.28 x 841.89 pts (A4)")]
    [InlineData(Paper.Letter, "612 x 792 pts (letter)")]
    public void One_application_with_six_requirements_takes_one_page_even_over_a_gap(Paper paper, string size)
    {
        foreach (var facts in new[] { Samples.Met, Samples.OverAGap })
        {
            using var printout = new Printout(facts with { Paper = paper, IsDemonstration = true });
            Assert.Equal(1, printout.Pages);
            Assert.Contains(size, printout.Info, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void A_gap_is_named_with_its_reason()
    {
        using var printout = new Printout(Samples.OverAGap);
        Assert.Contains("Signed over a gap", printout.Text, StringComparison.Ordinal);
        Assert.Contains("Not met when this was signed: Biliary: Scans that count, at least 25; found: 22. Biliary: Written examination; found: not taken. "
            + $"Reason given by Dr Seraphine Okwuosa-Lund: {Samples.OverAGap.GapReason}", printout.Text, StringComparison.Ordinal);
        Assert.Equal(2, printout.Text.Split("not met").Length - 1);
    }

    [Fact]
    public void A_gap_without_a_reason_says_so()
    {
        using var printout = new Printout(Samples.OverAGap with { GapReason = null });
        Assert.Contains("No reason was recorded.", printout.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_demonstration_says_so_above_and_below()
    {
        using var printout = new Printout(Samples.Met with { IsDemonstration = true });
        Assert.Equal(2, printout.Text.Split("Demonstration: every person and figure here is invented").Length - 1);
    }

    // Offsets as the IANA time zone database has them: Nepal all year, Newfoundland in winter and summer.
    [Theory]
    [InlineData("Asia/Kathmandu", "2026-11-03T20:30:00Z", "Wednesday 4 November 2026, 02:15:00 (UTC+05:45, Asia/Kathmandu)")]
    [InlineData("America/St_Johns", "2026-01-01T03:00:00Z", "Wednesday 31 December 2025, 23:30:00 (UTC-03:30, America/St_Johns)")]
    [InlineData("America/St_Johns", "2026-07-01T03:00:00Z", "Wednesday 1 July 2026, 00:30:00 (UTC-02:30, America/St_Johns)")]
    public void Times_stand_on_the_clock_of_their_zone(string zone, string instant, string printed)
    {
        using var printout = new Printout(Samples.Met with { ZoneId = zone, SignedAt = DateTime.Parse(instant, null, System.Globalization.DateTimeStyles.AdjustToUniversal) });
        Assert.Contains(printed, printout.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Markup_and_letters_of_other_alphabets_are_printed_as_they_are()
    {
        const string holder = "<b>O’Brien</b> &amp; Zażółć (Nguyễn) Ελευθερία \\ Жуковская %PDF endobj";
        using var printout = new Printout(Samples.Met with { Holder = holder });
        Assert.Contains(holder, printout.Text, StringComparison.Ordinal);
        Assert.Contains($"Competency summary, {holder}, K7QX-4M2P-9TBD", printout.Info, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Many_may_be_drawn_at_once()
    {
        var drawn = await Task.WhenAll(Enumerable.Range(0, 24).Select(n => Task.Run(() => new Printout(n % 2 == 0 ? Samples.Met : Samples.Long))));
        var (met, many) = (drawn[0].Text, drawn[1].Text);
        for (var n = 0; n < drawn.Length; n++)
        {
            Assert.Equal(n % 2 == 0 ? met : many, drawn[n].Text);
            drawn[n].Dispose();
        }
        Assert.Contains(Samples.Met.Holder, met, StringComparison.Ordinal);
    }
}
