using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Readings;

public sealed class WhyNotReadTests
{
    private const string NoReader = "Only this programme's readers read its scans.";

    private readonly Cast cast = new();

    [Fact]
    public void A_reader_of_the_programme_reads_what_waits() => Assert.Null(cast.Waiting().WhyNotRead(cast.Reader));

    [Fact]
    public void Nobody_reads_their_own_scan()
    {
        cast.Trainee.Join(cast.Director, cast.Programme, MembershipKind.Reader, Cast.Noon);
        IsRefused("Nobody reads their own scan.", cast.Waiting(), cast.Trainee);
    }

    [Theory]
    [InlineData(MembershipKind.Trainee)]
    [InlineData(MembershipKind.Director)]
    [InlineData(MembershipKind.Coordinator)]
    [InlineData(MembershipKind.Chair)]
    public void Who_is_no_reader_does_not_read(MembershipKind kind) => IsRefused(NoReader, cast.Waiting(), cast.Enrol("Olu", kind));

    [Fact]
    public void A_reader_of_another_programme_does_not_read() => IsRefused(NoReader, cast.Waiting(), cast.Enrol("Rhea", cast.Elsewhere, MembershipKind.Reader));

    [Fact]
    public void Nobody_reads_a_scan_twice() => IsRefused("You have already read this scan.", cast.Read(), cast.Reader);

    [Fact]
    public void A_read_scan_is_not_read_by_another_unasked() => IsRefused(
        "This scan has been read meanwhile; a second reading is given only when it is asked for.", cast.Read(), cast.Enrol("Rhea", MembershipKind.Reader));

    [Fact]
    public void A_draft_is_not_read() => IsRefused("This scan is a draft: it has not been submitted.", cast.Draft(), cast.Reader);

    [Fact]
    public void A_withdrawn_scan_is_not_read() => IsRefused("This scan is withdrawn.", cast.Discarded(), cast.Reader);

    [Fact]
    public void A_returned_scan_is_read_when_it_is_submitted_again()
    {
        var scan = cast.Returned();
        IsRefused("This scan went back to its trainee; it can be read when it is submitted again.", scan, cast.Reader);
        scan.Submit(cast.Trainee, Cast.Noon);
        Assert.Null(scan.WhyNotRead(cast.Reader));
    }

    [Fact]
    public void Without_pictures_only_the_supervisor_reads()
    {
        var scan = cast.Waiting(cast.Entry() with { Supervision = Supervision.Direct, Supervisor = cast.Reader }, pictures: 0);
        IsRefused("This scan has no pictures; only the person who supervised it can read it.", scan, cast.Enrol("Rhea", MembershipKind.Reader));
        Assert.Null(scan.WhyNotRead(cast.Reader));
        scan.Attach(cast.Trainee, Cast.Still, Cast.Noon);
        Assert.Null(scan.WhyNotRead(cast.Enrol("Rhea", MembershipKind.Reader)));
    }

    [Fact]
    public void Without_shown_pictures_a_removed_one_does_not_help()
    {
        var direct = cast.Entry() with { Supervision = Supervision.Direct, Supervisor = cast.Reader };
        var scan = cast.Waiting(direct);
        scan.Change(cast.Trainee, direct, [scan.Pictures[0].Id], [], Cast.Noon);
        IsRefused("This scan has no pictures; only the person who supervised it can read it.", scan, cast.Enrol("Rhea", MembershipKind.Reader));
    }

    private void IsRefused(string why, Scan scan, Person by) => Refused.With(why, scan.WhyNotRead(by), () => scan.Read(by, cast.Agreeing(scan), Cast.Noon));
}
