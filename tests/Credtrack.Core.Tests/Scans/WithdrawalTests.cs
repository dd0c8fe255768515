using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class WithdrawalTests
{
    private readonly Cast cast = new();

    [Fact]
    public void A_submitted_scan_is_withdrawn_in_any_state_and_keeps_who_when_and_why()
    {
        foreach (var scan in new[] { cast.Waiting(), cast.Returned(), cast.Read() })
        {
            scan.Withdraw(cast.Trainee, "Logged twice.", Cast.Noon.AddDays(1));
            Assert.Equal((ScanState.Withdrawn, null), (scan.State, scan.WaitsSince));
            Assert.Equal((cast.Trainee.Id, Cast.Noon.AddDays(1), "Logged twice."), (scan.Withdrawal!.ById, scan.Withdrawal.At, scan.Withdrawal.Reason));
            Assert.Equal("Tariq withdrew the scan and said why.", scan.NewFacts[^1].Sentence);
        }
    }

    [Fact]
    public void A_draft_is_discarded_instead() => IsRefused("This scan is a draft: discard it, there is nothing to withdraw.", cast.Draft(), cast.Trainee);

    [Fact]
    public void Nobody_else_withdraws_a_scan()
    {
        foreach (var person in new[] { cast.Reader, cast.Director, cast.Enrol("Tess", MembershipKind.Trainee) })
            IsRefused("Only the person who logged a scan withdraws it.", cast.Waiting(), person);
    }

    [Fact]
    public void It_is_withdrawn_once_and_nothing_is_done_with_it_afterwards()
    {
        var scan = cast.Read();
        scan.Withdraw(cast.Trainee, "Logged twice.", Cast.Noon);
        IsRefused("This scan is withdrawn.", scan, cast.Trainee);
        Assert.All([scan.WhyNotChange(cast.Trainee), scan.WhyNotSubmit(cast.Trainee), scan.WhyNotCorrect(cast.Reader, scan.Readings[0])], why => Assert.Equal("This scan is withdrawn.", why));
    }

    [Theory]
    [InlineData(" ", "Give the reason.")]
    [InlineData("Same as MRN 00482915", "This looks like a number of a person or a record. Take it out: nothing here may identify a patient.")]
    public void It_takes_a_reason_that_names_nobody(string reason, string why) => Refused.With(why, () => cast.Waiting().Withdraw(cast.Trainee, reason, Cast.Noon));

    private static void IsRefused(string why, Scan scan, Person by) => Refused.With(why, scan.WhyNotWithdraw(by), () => scan.Withdraw(by, "Logged twice.", Cast.Noon));
}
