using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Readings;

public sealed class ClosedTests
{
    private readonly Cast cast = new();

    [Theory]
    [InlineData(true, true, MembershipKind.Reader)]
    [InlineData(true, true, MembershipKind.Reader, MembershipKind.Chair)]
    [InlineData(true, true, MembershipKind.Reader, MembershipKind.Trainee)]
    [InlineData(true, false, MembershipKind.Reader, MembershipKind.Director)]
    [InlineData(true, false, MembershipKind.Reader, MembershipKind.Coordinator)]
    [InlineData(false, false, MembershipKind.Director)]
    [InlineData(false, false, MembershipKind.Coordinator)]
    [InlineData(false, false, MembershipKind.Chair)]
    [InlineData(false, false, MembershipKind.Trainee)]
    public void A_scan_is_closed_to_readers_until_it_is_read_and_to_mere_readers_afterwards(bool before, bool after, params MembershipKind[] kinds)
    {
        var person = cast.Enrol("Olu", kinds);
        Assert.All([cast.Draft(), cast.Waiting(), cast.Returned()], scan => Assert.Equal(before, scan.IsClosedTo(person)));
        Assert.Equal(after, cast.Read().IsClosedTo(person));
    }

    [Fact]
    public void A_scan_opens_to_the_reader_who_read_it()
    {
        var scan = cast.Waiting();
        Assert.True(scan.IsClosedTo(cast.Reader));
        scan.Read(cast.Reader, cast.Agreeing(scan), Cast.Noon);
        Assert.False(scan.IsClosedTo(cast.Reader));
    }

    [Fact]
    public void A_return_opens_nothing_to_the_reader_who_returned_it() => Assert.True(cast.Returned().IsClosedTo(cast.Reader));

    [Fact]
    public void Nobodys_own_scan_is_closed_to_them()
    {
        cast.Trainee.Join(cast.Director, cast.Programme, MembershipKind.Reader, Cast.Noon);
        Assert.All([cast.Draft(), cast.Waiting(), cast.Read()], scan => Assert.False(scan.IsClosedTo(cast.Trainee)));
    }

    [Fact]
    public void A_membership_elsewhere_neither_closes_nor_opens()
    {
        Assert.False(cast.Waiting().IsClosedTo(cast.Enrol("Rhea", cast.Elsewhere, MembershipKind.Reader)));
        var reader = cast.Enrol("Rhea", MembershipKind.Reader);
        reader.Join(cast.Director, cast.Elsewhere, MembershipKind.Director, Cast.Noon);
        Assert.True(cast.Read().IsClosedTo(reader));
    }
}
