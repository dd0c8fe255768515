using Credtrack.Core.People;

namespace Credtrack.Core.Tests.People;

public sealed class InvitationTests
{
    private readonly Cast cast = new();

    [Theory]
    [InlineData(InvitationKind.Administrator, 24)]
    [InlineData(InvitationKind.Reset, 24)]
    [InlineData(InvitationKind.Member, 24 * 7)]
    public void A_link_is_good_once_and_for_its_time(InvitationKind kind, int hours)
    {
        var link = cast.Reader.Invite(cast.Director, kind, "digest", Cast.Noon);
        Assert.Equal($"Dana made a link ({kind}) with which Ruth chooses a password.", cast.Reader.NewFacts[^1].Sentence);
        var last = Cast.Noon.AddHours(hours).AddMilliseconds(-1);
        Assert.Null(Person.WhyNotChoosePassword(link, last));
        Refused.With("This link is no longer good: its time is over, or a newer one has replaced it.", Person.WhyNotChoosePassword(link, last.AddMilliseconds(1)), () => cast.Reader.ChoosePassword(link, last.AddMilliseconds(1)));
        cast.Reader.ChoosePassword(link, last);
        Assert.Equal("Ruth chose a password.", cast.Reader.NewFacts[^1].Sentence);
        Refused.With("This link has been used. It works once only.", Person.WhyNotChoosePassword(link, last), () => cast.Reader.ChoosePassword(link, last));
    }

    [Fact]
    public void Of_several_links_the_newest_alone_is_good()
    {
        var first = cast.Reader.Invite(cast.Director, InvitationKind.Member, "1", Cast.Noon);
        var second = cast.Reader.Invite(cast.Director, InvitationKind.Reset, "2", Cast.Noon.AddMinutes(1));
        Assert.Equal([false, true], new[] { first, second }.Select(i => i.IsOpen(Cast.Noon.AddMinutes(1))));
    }

    [Fact]
    public void A_new_name_is_told_and_the_same_name_is_not()
    {
        cast.Reader.Rename(cast.Director, "Ruth", Cast.Noon);
        cast.Reader.Rename(cast.Director, "Ruth Ann", Cast.Noon);
        Assert.Equal(["Dana corrected the name Ruth to Ruth Ann."], cast.Reader.NewFacts.OfType<PersonRenamed>().Select(f => f.Sentence));
    }
}
