using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class TakingOutTests
{
    private readonly Cast cast = new();

    [Theory]
    [InlineData(MembershipKind.Coordinator)]
    [InlineData(MembershipKind.Reader)]
    public void A_picture_is_taken_out_with_who_when_and_why(MembershipKind kind)
    {
        var (person, scan) = (cast.Enrol("Cora", kind), cast.Read());
        scan.TakeOut(person, scan.Pictures[0], "A name can be read.", Cast.Noon.AddDays(1));
        var gone = Assert.Single(scan.TakenOutPictures);
        Assert.Equal((person.Id, Cast.Noon.AddDays(1), "A name can be read."), (gone.RemovedById, gone.RemovedAt, gone.RemovedBecause));
        Assert.Empty(scan.ShownPictures);
        Assert.Equal("Cora took picture 1 out for good and said why.", scan.NewFacts[^1].Sentence);
    }

    [Fact]
    public void Also_of_a_scan_that_was_withdrawn()
    {
        var scan = cast.Waiting();
        scan.Withdraw(cast.Trainee, "Logged twice.", Cast.Noon);
        Assert.Null(scan.WhyNotTakeOut(cast.Reader, scan.Pictures[0]));
    }

    [Fact]
    public void What_a_trainee_takes_off_an_own_scan_needs_no_reason()
    {
        var scan = cast.Draft();
        scan.Change(cast.Trainee, cast.Entry(), [scan.Pictures[0].Id], [], Cast.Noon);
        Assert.Empty(scan.TakenOutPictures);
        Assert.NotNull(scan.Pictures[0].RemovedAt);
    }

    [Fact]
    public void Who_may_not_is_told_why()
    {
        var both = cast.Enrol("Bo", MembershipKind.Trainee, MembershipKind.Coordinator);
        var own = Scan.Log(both, cast.Programme, Guid.CreateVersion7(Cast.Noon), cast.Entry(), null, Cast.Noon);
        own.Attach(both, Cast.Still, Cast.Noon);
        IsRefused("Of a scan of your own, take pictures off by changing it.", own, both);
        IsRefused("Only this programme's coordinators and readers take a picture out.", cast.Waiting(), cast.Director);
        IsRefused("Only this programme's coordinators and readers take a picture out.", cast.Waiting(), cast.Enrol("Cy", cast.Elsewhere, MembershipKind.Coordinator));
        IsRefused("This scan is a draft; nobody else sees it.", cast.Draft(), cast.Reader);
        var scan = cast.Waiting();
        scan.TakeOut(cast.Reader, scan.Pictures[0], "A name can be read.", Cast.Noon);
        IsRefused("This picture is removed already.", scan, cast.Reader);
    }

    [Fact]
    public void It_takes_a_reason() => Refused.With("Give the reason.", () => Reasonless(cast.Waiting()));

    private void Reasonless(Scan scan) => scan.TakeOut(cast.Reader, scan.Pictures[0], "", Cast.Noon);

    private static void IsRefused(string why, Scan scan, Person by) =>
        Refused.With(why, scan.WhyNotTakeOut(by, scan.Pictures[0]), () => scan.TakeOut(by, scan.Pictures[0], "A name can be read.", Cast.Noon));
}
