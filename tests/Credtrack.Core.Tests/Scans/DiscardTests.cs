using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class DiscardTests
{
    private const string Submitted = "Only a draft that was never submitted is discarded.";

    private readonly Cast cast = new();

    [Fact]
    public void A_discarded_draft_keeps_its_row_with_who_and_when()
    {
        var scan = cast.Draft();
        scan.Discard(cast.Trainee, Cast.Noon.AddDays(1));
        Assert.Equal(ScanState.Withdrawn, scan.State);
        Assert.Equal((scan.Id, cast.Trainee.Id, Cast.Noon.AddDays(1)), (scan.Withdrawal!.ScanId, scan.Withdrawal.ById, scan.Withdrawal.At));
    }

    [Fact]
    public void What_was_once_submitted_is_not_discarded()
    {
        var again = cast.Returned();
        again.Submit(cast.Trainee, Cast.Noon);
        foreach (var scan in new[] { cast.Waiting(), cast.Returned(), again }) IsRefused(Submitted, scan);
        IsRefused("This scan has been read; what was read stays as it is.", cast.Read());
    }

    [Fact]
    public void A_draft_is_discarded_once_and_by_its_trainee_alone()
    {
        IsRefused("This scan is withdrawn.", cast.Discarded());
        var draft = cast.Draft();
        Refused.With("Only the person who logged a scan changes it.", draft.WhyNotDiscard(cast.Director), () => draft.Discard(cast.Director, Cast.Noon));
    }

    private void IsRefused(string why, Scan scan) => Refused.With(why, scan.WhyNotDiscard(cast.Trainee), () => scan.Discard(cast.Trainee, Cast.Noon));
}
