using Credtrack.Core.People;

namespace Credtrack.Core.Tests.People;

public sealed class SiteTests
{
    private readonly Cast cast = new();

    [Fact]
    public void A_site_has_a_name_and_a_zone()
    {
        var site = Site.Found(cast.Director, "Harbour Hospital", "Europe/Dublin", Cast.Noon);
        Assert.Equal(("Harbour Hospital", "Europe/Dublin"), (site.Name, site.TimeZone));
        Assert.Equal("Dana set the site up as Harbour Hospital, time zone Europe/Dublin.", Assert.Single(site.NewFacts).Sentence);
    }

    [Theory]
    [InlineData("")]
    [InlineData("Dublin")]
    [InlineData("Europe/Nowhere")]
    [InlineData("+01:00")]
    public void A_zone_is_one_that_there_is(string zone) => Refused.With($"There is no time zone {zone}; take an IANA name such as Europe/Dublin.",
        Site.WhyNotFound(zone), () => Site.Found(cast.Director, "Harbour Hospital", zone, Cast.Noon));

    [Fact]
    public void A_programme_is_founded_with_its_fact()
    {
        Assert.Equal("Harbour", cast.Programme.Name);
        Assert.Equal(["Dana founded the programme Harbour."], cast.Programme.NewFacts.Select(f => f.Sentence));
        Assert.NotEqual(cast.Programme.Id, cast.Elsewhere.Id);
    }

    [Fact]
    public void Who_founds_it_looks_after_it_and_may_appoint_others()
    {
        var site = Harbour();
        Assert.True(site.IsAdministeredBy(cast.Director));
        Refused.With("Only an administrator changes the site.", site.WhyNotAppoint(cast.Reader, cast.Trainee), () => site.Appoint(cast.Reader, cast.Trainee, Cast.Noon));
        site.Appoint(cast.Director, cast.Reader, Cast.Noon);
        Assert.Equal("Dana made Ruth an administrator of the site.", site.NewFacts[^1].Sentence);
        Refused.With("Ruth is an administrator already.", site.WhyNotAppoint(cast.Director, cast.Reader), () => site.Appoint(cast.Director, cast.Reader, Cast.Noon));
    }

    [Fact]
    public void The_last_administrator_stays()
    {
        var site = Harbour();
        const string last = "The last administrator stays: appoint another one first, who has chosen a password.";
        Guid[] both = [cast.Director.Id, cast.Reader.Id];
        Refused.With(last, site.WhyNotDismiss(cast.Director, cast.Director, both), () => site.Dismiss(cast.Director, cast.Director, both, Cast.Noon));
        site.Appoint(cast.Director, cast.Reader, Cast.Noon);
        Refused.With(last, () => site.Dismiss(cast.Director, cast.Director, [cast.Director.Id], Cast.Noon)); // who was appointed cannot sign in yet
        site.Dismiss(cast.Reader, cast.Director, both, Cast.Noon);
        Assert.Equal("Ruth ended that Dana is an administrator of the site.", site.NewFacts[^1].Sentence);
        Assert.False(site.IsAdministeredBy(cast.Director));
        Assert.Equal("Dana is no administrator.", site.WhyNotDismiss(cast.Reader, cast.Director, both));
        Assert.Equal("Only an administrator changes the site.", site.WhyNotDismiss(cast.Director, cast.Reader, both));
        Assert.Equal(2, site.Administrators.Count); // who was one stays known
    }

    [Fact]
    public void Every_change_is_said_from_what_to_what_and_no_change_says_nothing()
    {
        var site = Harbour();
        site.Change(cast.Director, new("Harbour Hospital", "Europe/Dublin", null, 7), Cast.Noon);
        Assert.Single(site.NewFacts);
        site.Change(cast.Director, new("Harbour General", "Europe/Lisbon", "01 555 0100", 10), Cast.Noon);
        Assert.Equal("Dana changed the site: name from Harbour Hospital to Harbour General; time zone from Europe/Dublin to Europe/Lisbon; contact from none to 01 555 0100; days until a reading is late from 7 to 10.", site.NewFacts[^1].Sentence);
        Assert.Equal(("Harbour General", "Europe/Lisbon", "01 555 0100", 10), (site.Name, site.TimeZone, site.Contact, site.LateAfterDays));
    }

    [Theory]
    [InlineData("", "Europe/Dublin", 7, "Give the site a name.")]
    [InlineData("Harbour", "Mars/North", 7, "There is no time zone Mars/North; take an IANA name such as Europe/Dublin.")]
    [InlineData("Harbour", "Europe/Dublin", 0, "Give a number of days from 1 to 90.")]
    [InlineData("Harbour", "Europe/Dublin", 91, "Give a number of days from 1 to 90.")]
    public void What_cannot_be_so_is_refused(string name, string zone, int days, string why) =>
        Refused.With(why, () => Harbour().Change(cast.Director, new(name, zone, null, days), Cast.Noon));

    [Fact]
    public void Only_an_administrator_changes_the_site_or_a_programmes_name()
    {
        var site = Harbour();
        Refused.With("Only an administrator changes the site.", site.WhyNotChange(cast.Reader), () => site.Change(cast.Reader, new("Mine", "UTC", null, 7), Cast.Noon));
        Refused.With("Only an administrator renames a programme.", Programme.WhyNotRename(cast.Reader, site), () => cast.Programme.Rename(cast.Reader, site, "Mine", Cast.Noon));
        cast.Programme.Rename(cast.Director, site, "Haven", Cast.Noon);
        Assert.Equal(("Haven", "Dana renamed the programme Harbour to Haven."), (cast.Programme.Name, cast.Programme.NewFacts[^1].Sentence));
    }

    [Fact]
    public void The_command_line_appoints_whom_it_has_invited_as_that_alone()
    {
        var site = Harbour();
        var invited = cast.Enrol("Ines");
        Refused.With("This invitation is none for an administrator.", () => site.AppointInvited(invited, invited.Invite(cast.Director, InvitationKind.Member, "a", Cast.Noon), Cast.Noon));
        Refused.With("This invitation is none for an administrator.", () => site.AppointInvited(cast.Reader, invited.Invite(invited, InvitationKind.Administrator, "b", Cast.Noon), Cast.Noon));
        site.AppointInvited(invited, invited.Invitations[^1], Cast.Noon);
        Assert.True(site.IsAdministeredBy(invited));
    }

    private Site Harbour() => Site.Found(cast.Director, "Harbour Hospital", "Europe/Dublin", Cast.Noon);
}
