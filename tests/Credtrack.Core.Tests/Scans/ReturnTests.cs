using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class ReturnTests
{
    private readonly Cast cast = new();

    [Fact]
    public void A_returned_scan_says_who_wants_what()
    {
        var scan = cast.Waiting();
        scan.SendBack(cast.Reader, "The apical view is missing.", Cast.Noon.AddDays(1));
        Assert.Equal((ScanState.Returned, null), (scan.State, scan.WaitsSince));
        Assert.Equal((cast.Reader.Id, "The apical view is missing.", Cast.Noon.AddDays(1), 1),
            (scan.ReturnedWith!.ReaderId, scan.ReturnedWith.Missing, scan.ReturnedWith.At, scan.ReturnedWith.Number));
        Assert.Empty(scan.Readings);
    }

    [Fact]
    public void A_returned_scan_is_submitted_again_and_its_return_stays()
    {
        var scan = cast.Returned();
        scan.Submit(cast.Trainee, Cast.Noon.AddDays(2));
        Assert.Equal((ScanState.Waiting, Cast.Noon.AddDays(2), null), (scan.State, scan.WaitsSince, scan.ReturnedWith));
        Assert.Equal([(1, true), (2, false)], scan.Submissions.Select(s => (s.Number, s.Return is not null)));
    }

    [Fact]
    public void A_scan_may_go_back_more_than_once_and_is_read_in_the_end()
    {
        var scan = cast.Returned();
        scan.Submit(cast.Trainee, Cast.Noon);
        scan.SendBack(cast.Enrol("Rhea", MembershipKind.Reader), "Depth.", Cast.Noon);
        Assert.Equal(("Depth.", 2), (scan.ReturnedWith!.Missing, scan.ReturnedWith.Number));
        scan.Submit(cast.Trainee, Cast.Noon);
        scan.Read(cast.Reader, cast.Agreeing(scan), Cast.Noon);
        Assert.Equal((ScanState.Read, null, 3), (scan.State, scan.ReturnedWith, scan.Submissions.Count));
    }

    [Fact]
    public void A_returned_scan_may_be_incomplete_until_it_is_submitted_again()
    {
        var scan = cast.Returned();
        scan.Change(cast.Trainee, cast.Entry(), [scan.Pictures[0].Id], [], Cast.Noon);
        Assert.StartsWith("Attach a picture", scan.WhyNotSubmit(cast.Trainee), StringComparison.Ordinal);
        scan.Attach(cast.Trainee, Cast.Still, Cast.Noon);
        Assert.Null(scan.WhyNotSubmit(cast.Trainee));
    }

    [Fact]
    public void Who_may_not_read_a_scan_may_not_return_it()
    {
        IsRefused("This scan went back to its trainee; it can be read when it is submitted again.", cast.Returned(), cast.Reader);
        IsRefused("This scan is a draft: it has not been submitted.", cast.Draft(), cast.Reader);
        IsRefused("You have already read this scan.", cast.Read(), cast.Reader);
        IsRefused("Only this programme's readers read its scans.", cast.Waiting(), cast.Director);
        IsRefused("Nobody reads their own scan.", cast.Waiting(), cast.Trainee);
    }

    private static void IsRefused(string why, Scan scan, Person by) => Refused.With(why, scan.WhyNotReturn(by), () => scan.SendBack(by, "More.", Cast.Noon));
}
