using Credtrack.Core.Catalogue;
using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class RetiredApplicationTests
{
    private const string Why = "Lung is retired; choose another application.";

    private readonly Cast cast = new();

    [Fact]
    public void A_retired_application_is_not_logged_nor_chosen_for_another_scan()
    {
        var scan = cast.Draft();
        Retire("lung");
        Refused.With(Why, Scan.WhyNotLog(cast.Trainee, cast.Programme, cast.Entry("lung"), Cast.Noon), () => cast.Draft(cast.Entry("lung")));
        Refused.With(Why, () => scan.Change(cast.Trainee, cast.Entry("lung"), [], [], Cast.Noon));
    }

    [Fact]
    public void A_scan_that_was_logged_before_goes_all_its_way()
    {
        var scan = cast.Draft(cast.Entry("lung"));
        Retire("lung");
        scan.Change(cast.Trainee, cast.Entry("lung", Answer.Yes), [], [], Cast.Noon);
        scan.Submit(cast.Trainee, Cast.Noon);
        scan.Read(cast.Reader, cast.Agreeing(scan), Cast.Noon);
        Assert.Equal((ScanState.Read, cast["lung"].Id), (scan.State, scan.Readings[0].ApplicationId));
    }

    [Fact]
    public void A_reader_corrects_to_a_retired_application_only_where_the_scan_has_it()
    {
        var (scan, read) = (cast.Waiting(), cast.Read(corrected: j => j with { Application = cast["lung"], Answers = cast["lung"].Questions.ToDictionary(q => q.Code, _ => Answer.No) }));
        Retire("lung");
        var judgement = cast.Agreeing(scan) with { Application = cast["lung"], Answers = cast["lung"].Questions.ToDictionary(q => q.Code, _ => Answer.No) };
        Assert.Equal([("Application", Why)], judgement.Faults(scan));
        Assert.Empty(judgement.Faults(read));
        Refused.With(Why, () => scan.Read(cast.Reader, judgement, Cast.Noon));
    }

    [Fact]
    public void A_part_that_the_catalogue_gave_up_stays_with_the_scan_that_has_it()
    {
        var entry = cast.Entry("msk") with { Subtype = "hip" };
        var (scan, without) = (cast.Waiting(entry), cast.Edited(cast["msk"], e => e with { Subtypes = ["knee"] }));
        Assert.Equal(["knee", "hip"], scan.PartsUnder(without));
        scan.Change(cast.Trainee, Cast.Entry(without) with { Subtype = "hip" }, [], [], Cast.Noon);
        scan.Read(cast.Reader, Cast.Agreeing(scan, without), Cast.Noon);
        Assert.Equal("hip", scan.Readings[0].Subtype);
        Refused.With("Choose a part that belongs to Musculoskeletal, or none.", () => cast.Draft(Cast.Entry(without) with { Subtype = "hip" }));
    }

    private void Retire(string code) => cast[code].Retire(cast.Enrol("Cora", MembershipKind.Coordinator), Cast.Noon);
}
