using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class ConfirmationTests
{
    private const string NotNamed = "Only the person named as direct supervisor answers for it.";

    private readonly Cast cast = new();

    private ScanEntry Supervised => cast.Entry() with { Supervision = Supervision.Direct, Supervisor = cast.Reader };

    [Fact]
    public void Direct_supervision_counts_once_the_person_named_confirms_it()
    {
        var scan = cast.Waiting(Supervised);
        Assert.Equal(Supervision.Later, scan.CountingSupervision);
        scan.Confirm(cast.Reader, wasThere: true, Cast.Noon);
        Assert.Equal(Supervision.Direct, scan.CountingSupervision);
        Assert.Equal("Ruth confirmed having supervised this scan at the bedside.", scan.NewFacts[^1].Sentence);
    }

    [Fact]
    public void A_no_lowers_it_for_good_and_what_was_said_stays()
    {
        var scan = cast.Waiting(Supervised);
        scan.Confirm(cast.Reader, wasThere: false, Cast.Noon);
        Assert.Equal((Supervision.Later, Supervision.Direct), (scan.CountingSupervision, scan.Supervision));
        Assert.Equal("Ruth said not to have been at the bedside, so the supervision counts as later.", scan.NewFacts[^1].Sentence);
        scan.Read(cast.Reader, cast.Agreeing(scan), Cast.Noon);
        Assert.Equal(Supervision.Later, scan.CountingSupervision);
    }

    [Fact]
    public void After_anothers_reading_it_still_counts_unless_that_reader_lowered_it()
    {
        var (other, scan) = (cast.Enrol("Rhea", MembershipKind.Reader), cast.Waiting(Supervised));
        scan.Read(other, cast.Agreeing(scan), Cast.Noon);
        scan.Confirm(cast.Reader, wasThere: true, Cast.Noon);
        Assert.Equal(Supervision.Direct, scan.CountingSupervision);
        var lowered = cast.Waiting(Supervised);
        lowered.Read(other, cast.Agreeing(lowered) with { AtMost = Supervision.Later }, Cast.Noon);
        IsRefused("A reader has lowered the supervision of this scan.", lowered, cast.Reader);
    }

    [Fact]
    public void A_yes_does_not_follow_the_scan_to_another_application_time_or_supervisor()
    {
        var other = cast.Enrol("Rhea", MembershipKind.Reader);
        foreach (var changed in new[] { Supervised with { Application = cast["lung"], Answers = cast.Entry("lung").Answers }, Supervised with { PerformedAt = Cast.Noon.AddHours(-2) }, Supervised with { Supervisor = other } })
        {
            var scan = cast.Waiting(Supervised);
            scan.Confirm(cast.Reader, wasThere: true, Cast.Noon);
            scan.Change(cast.Trainee, changed, [], [], Cast.Noon);
            Assert.Equal((Supervision.Later, null), (scan.CountingSupervision, scan.Confirmation));
            scan.Confirm(changed.Supervisor!, wasThere: true, Cast.Noon);
            Assert.Equal((Supervision.Direct, 2), (scan.CountingSupervision, scan.Confirmation!.Number));
        }
    }

    [Fact]
    public void Without_pictures_a_no_leaves_nobody_to_read_and_asks_for_a_picture()
    {
        var scan = cast.Waiting(Supervised, pictures: 0);
        Assert.Null(scan.WhyNotRead(cast.Reader));
        scan.Confirm(cast.Reader, wasThere: false, Cast.Noon);
        Assert.Equal("This scan has no pictures; only the person who supervised it can read it.", scan.WhyNotRead(cast.Reader));
        Assert.StartsWith("Attach a picture", scan.WhyIncomplete, StringComparison.Ordinal);
    }

    [Fact]
    public void Who_may_not_is_told_why()
    {
        foreach (var person in new[] { cast.Trainee, cast.Director, cast.Enrol("Rhea", MembershipKind.Reader) }) IsRefused(NotNamed, cast.Waiting(Supervised), person);
        IsRefused(NotNamed, cast.Waiting(), cast.Reader);
        IsRefused("This scan is a draft: it has not been submitted.", cast.Draft(Supervised), cast.Reader);
        IsRefused("Your reading of this scan has answered for it already.", cast.Read(Supervised), cast.Reader);
        var (answered, withdrawn) = (cast.Waiting(Supervised), cast.Waiting(Supervised));
        answered.Confirm(cast.Reader, wasThere: false, Cast.Noon);
        IsRefused("You have answered for this scan already.", answered, cast.Reader);
        withdrawn.Withdraw(cast.Trainee, "Logged twice.", Cast.Noon);
        IsRefused("This scan is withdrawn.", withdrawn, cast.Reader);
    }

    private static void IsRefused(string why, Scan scan, Person by) => Refused.With(why, scan.WhyNotConfirm(by), () => scan.Confirm(by, wasThere: true, Cast.Noon));
}
