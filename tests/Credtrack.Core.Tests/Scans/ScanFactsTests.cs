using System.Globalization;
using System.Text.Json;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class ScanFactsTests
{
    private readonly Cast cast = new();

    [Fact]
    public void Each_verb_leaves_its_fact_and_its_state()
    {
        var scan = cast.Draft(cast.Entry("msk"), pictures: 0);
        Left(ScanState.Draft, "Tariq logged a scan (Musculoskeletal) performed at 2026-03-01 11:00 UTC.");
        scan.Attach(cast.Trainee, Cast.Still, Cast.Noon);
        Left(ScanState.Draft, "Tariq attached picture 1 and confirmed that no patient is named in it.");
        scan.Submit(cast.Trainee, Cast.Noon);
        Left(ScanState.Waiting, "Tariq submitted the scan for reading.");
        scan.Change(cast.Trainee, cast.Entry("msk") with { Subtype = "hip" }, [scan.Pictures[0].Id], [Cast.Still], Cast.Noon);
        Left(ScanState.Waiting, "Tariq changed the scan: part from none to hip.", "Tariq removed picture 1.", "Tariq attached picture 2 and confirmed that no patient is named in it.");
        scan.SendBack(cast.Reader, "More.", Cast.Noon);
        Left(ScanState.Returned, "Ruth returned the scan and said what is missing.");
        scan.Submit(cast.Trainee, Cast.Noon);
        Left(ScanState.Waiting, "Tariq submitted the scan for reading.");
        scan.Read(cast.Reader, cast.Agreeing(scan), Cast.Noon);
        Left(ScanState.Read, "Ruth read the scan: image quality 4 of 5, result TN, nothing corrected.");

        void Left(ScanState state, params string[] sentences)
        {
            Assert.Equal(state, scan.State);
            Assert.Equal(sentences, scan.TakeFacts().Select(f => f.Sentence));
        }
    }

    [Fact]
    public void A_discarded_draft_leaves_its_fact()
    {
        var scan = cast.Draft(pictures: 0);
        scan.TakeFacts();
        scan.Discard(cast.Trainee, Cast.Noon);
        Assert.Equal(["Tariq discarded the draft."], scan.NewFacts.Select(f => f.Sentence));
    }

    [Fact]
    public void A_fact_says_who_and_when()
    {
        var scan = cast.Waiting();
        scan.SendBack(cast.Reader, "More.", Cast.Noon.AddHours(1));
        Assert.Equal((cast.Reader, Cast.Noon.AddHours(1)), (scan.NewFacts[^1].By, scan.NewFacts[^1].At));
    }

    [Fact] // Thai years are 543 ahead, and Finnish writes the time with a point
    public void The_ledger_reads_alike_wherever_the_server_stands()
    {
        var (scan, here) = (cast.Draft(pictures: 0), CultureInfo.CurrentCulture);
        try
        {
            foreach (var culture in new[] { "th-TH", "fi-FI", "en-US" })
            {
                CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
                Assert.Equal("Tariq logged a scan (Focused cardiac) performed at 2026-03-01 11:00 UTC.", scan.NewFacts[0].Sentence);
            }
        }
        finally
        {
            CultureInfo.CurrentCulture = here;
        }
    }

    [Fact]
    public void Taking_the_facts_moves_the_version_on()
    {
        var scan = cast.Waiting();
        Assert.Equal(["ScanLogged", "PictureAttached", "ScanSubmitted"], scan.TakeFacts().Select(f => f.GetType().Name));
        Assert.Empty(scan.NewFacts);
        Assert.Equal(1, scan.Version);
    }

    [Fact]
    public void A_refused_verb_leaves_no_fact()
    {
        var scan = cast.Read();
        scan.TakeFacts();
        Assert.Throws<RuleBroken>(() => scan.Read(cast.Reader, cast.Agreeing(scan), Cast.Noon));
        Assert.Throws<RuleBroken>(() => scan.Change(cast.Trainee, cast.Entry() with { Assisted = true }, [], [], Cast.Noon));
        Assert.Empty(scan.NewFacts);
        Assert.False(scan.Assisted);
    }

    [Fact]
    public void Free_text_is_never_quoted_in_a_fact()
    {
        var scan = cast.Waiting(cast.Entry() with { Note = "quillfeather, twice" });
        scan.Change(cast.Trainee, cast.Entry() with { Note = "quillfeather, once" }, [], [], Cast.Noon);
        scan.Change(cast.Trainee, cast.Entry(), [], [], Cast.Noon);
        scan.Change(cast.Trainee, cast.Entry("lung") with { Note = "quillfeather" }, [], [], Cast.Noon);
        scan.SendBack(cast.Reader, "Ask quillfeather.", Cast.Noon);
        scan.Submit(cast.Trainee, Cast.Noon);
        scan.Read(cast.Reader, cast.Agreeing(scan) with { Feedback = "quillfeather was sent home." }, Cast.Noon);
        Assert.Equal(9, scan.NewFacts.Count);
        Assert.All(scan.NewFacts, f => Assert.DoesNotContain("Quillfeather", f.Sentence + JsonSerializer.Serialize(f, f.GetType()), StringComparison.OrdinalIgnoreCase));
    }
}
