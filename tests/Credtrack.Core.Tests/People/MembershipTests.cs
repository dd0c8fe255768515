using Credtrack.Core.People;

namespace Credtrack.Core.Tests.People;

public sealed class MembershipTests
{
    private readonly Cast cast = new();
    private readonly Site site;
    private readonly Person cora;
    private readonly Person administrator;

    public MembershipTests()
    {
        administrator = Person.Enrol("Ada", null, Cast.Noon);
        site = Site.Found(administrator, "Harbour Hospital", "Europe/Dublin", Cast.Noon);
        cora = cast.Enrol("Cora", MembershipKind.Coordinator);
    }

    [Fact]
    public void A_coordinator_admits_with_days_year_and_stand_in_and_the_fact_says_all_of_it()
    {
        var person = Person.Enrol("Tess", cora, Cast.Noon);
        person.Admit(cora, site, cast.Programme, new(MembershipKind.Reader, March(10), March(20), null, cast.Reader), Cast.Noon);
        Assert.Equal("Cora made Tess a Reader of Harbour, from 2026-03-10 to 2026-03-20, standing in for Ruth.", person.NewFacts[^1].Sentence);
        var membership = Assert.Single(person.Memberships);
        Assert.Equal((March(10), March(20), cast.Reader.Id), (membership.FirstDay, membership.LastDay, membership.StandsInForId));
        Assert.All([10, 20], day => Assert.True(membership.IsOn(March(day))));
        Assert.All([9, 21], day => Assert.False(membership.IsOn(March(day))));
    }

    [Fact]
    public void Nobody_else_edits_a_programmes_people()
    {
        const string only = "Only this programme's coordinator edits its people.";
        var elsewhere = cast.Enrol("Edda", cast.Elsewhere, MembershipKind.Coordinator);
        foreach (var by in new[] { cast.Director, cast.Reader, cast.Trainee, elsewhere })
            Refused.With(only, cast.Trainee.WhyNotAdmit(by, site, cast.Programme, MembershipKind.Reader), () => cast.Trainee.Admit(by, site, cast.Programme, Reader, Cast.Noon));
        Refused.With("Nobody changes their own memberships.", cora.WhyNotAdmit(cora, site, cast.Programme, MembershipKind.Director), () => cora.Admit(cora, site, cast.Programme, new(MembershipKind.Director, Cast.Today), Cast.Noon));
        Refused.With(only, () => cast.Trainee.NoteLeave(elsewhere, site, cast.Programme, March(1), March(2), Cast.Noon));
    }

    [Fact]
    public void An_administrator_sees_to_it_that_there_is_a_coordinator_and_to_nothing_else()
    {
        Refused.With("An administrator appoints the coordinator, who edits the other people.", cast.Reader.WhyNotAdmit(administrator, site, cast.Programme, MembershipKind.Director),
            () => cast.Reader.Admit(administrator, site, cast.Programme, new(MembershipKind.Director, Cast.Today), Cast.Noon));
        cast.Reader.Admit(administrator, site, cast.Programme, new(MembershipKind.Coordinator, Cast.Today), Cast.Noon);
        Assert.True(cast.Reader.Is(MembershipKind.Coordinator, cast.Programme.Id));
    }

    [Theory]
    [InlineData(1, 9, null, "A membership ends on or after the day on which it begins.", MembershipKind.Reader, false, 10)]
    [InlineData(1, null, "year 1", "Only trainees have a year group.", MembershipKind.Reader, false, null)]
    [InlineData(1, null, null, "Standing in for somebody has a last day.", MembershipKind.Reader, true, null)]
    [InlineData(1, 9, null, "Nobody stands in for a trainee.", MembershipKind.Trainee, true, null)]
    public void What_cannot_be_so_is_refused(int first, int? last, string? year, string why, MembershipKind kind, bool standsIn, int? from)
    {
        var terms = new MembershipTerms(kind, March(from ?? first), last is { } day ? March(day) : null, year, standsIn ? cast.Director : null);
        Refused.With(why, () => Person.Enrol("Tess", cora, Cast.Noon).Admit(cora, site, cast.Programme, terms, Cast.Noon));
    }

    [Fact]
    public void The_same_membership_never_covers_a_day_twice()
    {
        var person = Person.Enrol("Tess", cora, Cast.Noon);
        person.Admit(cora, site, cast.Programme, new(MembershipKind.Reader, March(10), March(20)), Cast.Noon);
        Assert.Equal("Tess is already a Reader of Harbour.", person.WhyNotJoin(cast.Programme, new(MembershipKind.Reader, March(20))));
        Assert.Equal("Tess is already a Reader of Harbour.", person.WhyNotJoin(cast.Programme, new(MembershipKind.Reader, March(1))));
        Assert.Null(person.WhyNotJoin(cast.Programme, new(MembershipKind.Reader, March(1), March(9))));
        person.Admit(cora, site, cast.Programme, new(MembershipKind.Reader, March(21)), Cast.Noon);
        Refused.With("Tess is already a Reader of Harbour on some of these days.", () => person.Change(cora, site, person.Memberships[0], new(MembershipKind.Reader, March(10), March(21)), [cora], Cast.Today, Cast.Noon));
    }

    [Fact]
    public void A_change_says_from_what_to_what()
    {
        var membership = cast.Trainee.Memberships[0];
        cast.Trainee.Change(cora, site, membership, new(MembershipKind.Trainee, Cast.Today, March(31), "year 3"), [cora], Cast.Today, Cast.Noon);
        Assert.Equal("Cora changed how Tariq is a Trainee of Harbour: year group from none to year 3; last day from none to 2026-03-31.", cast.Trainee.NewFacts[^1].Sentence);
        var before = cast.Trainee.NewFacts.Count;
        cast.Trainee.Change(cora, site, membership, new(MembershipKind.Trainee, Cast.Today, March(31), "year 3"), [cora], Cast.Today, Cast.Noon);
        Assert.Equal(before, cast.Trainee.NewFacts.Count);
    }

    [Fact]
    public void The_last_coordinator_stays_and_of_two_each_may_go()
    {
        var terms = new MembershipTerms(MembershipKind.Coordinator, Cast.Today, Cast.Today);
        Refused.With(Last, cora.WhyNotChange(administrator, site, cora.Memberships[0], terms, [cora], Cast.Today),
            () => cora.Change(administrator, site, cora.Memberships[0], terms, [cora], Cast.Today, Cast.Noon));
        var second = cast.Enrol("Cyril", MembershipKind.Coordinator);
        cora.Change(second, site, cora.Memberships[0], terms, [cora, second], Cast.Today, Cast.Noon);
        Assert.Equal(Cast.Today, cora.Memberships[0].LastDay);
        // Told by the programme too: two who let each other go at one moment change the same noun.
        Assert.Equal("Cyril let Cora be a coordinator of this programme until 2026-03-01.", cast.Programme.NewFacts[^1].Sentence);
    }

    [Fact]
    public void A_leave_is_taken_back_once_and_frees_its_days()
    {
        cast.Trainee.NoteLeave(cora, site, cast.Programme, March(10), March(20), Cast.Noon);
        var leave = cast.Trainee.Memberships[0].Leaves[0];
        cast.Trainee.TakeBack(cora, site, leave, Cast.Noon);
        Assert.Equal("Cora took back that Tariq is away from 2026-03-10 to 2026-03-20.", cast.Trainee.NewFacts[^1].Sentence);
        Refused.With("This leave is taken back already.", cast.Trainee.WhyNotTakeBack(cora, site, leave), () => cast.Trainee.TakeBack(cora, site, leave, Cast.Noon));
        Assert.Null(cast.Trainee.WhyNotBeAway(cast.Programme, March(10), March(20)));
    }

    [Fact]
    public void Nor_does_the_last_coordinator_go_by_beginning_later()
    {
        var later = new MembershipTerms(MembershipKind.Coordinator, Cast.Today.AddDays(1));
        Refused.With(Last, () => cora.Change(administrator, site, cora.Memberships[0], later, [cora], Cast.Today, Cast.Noon));
        Refused.With(Last, cora.WhyNotEnd(administrator, site, cora.Memberships[0], [], Cast.Today), () => cora.End(administrator, site, cora.Memberships[0], [], Cast.Today, Cast.Noon));
    }

    [Fact]
    public void A_membership_ends_at_once_also_on_the_day_it_began()
    {
        var membership = cast.Reader.Memberships[0];
        cast.Reader.End(cora, site, membership, [], Cast.Today, Cast.Noon);
        Assert.False(membership.IsOn(Cast.Today));
        Assert.Equal("Cora ended at once that Ruth is a Reader of Harbour.", cast.Reader.NewFacts[^1].Sentence);
        Refused.With("This membership is over.", cast.Reader.WhyNotEnd(cora, site, membership, [], Cast.Today), () => cast.Reader.End(cora, site, membership, [], Cast.Today, Cast.Noon));
        Assert.Equal("Ruth began as a Reader of Harbour on 2026-03-01 before; begin on another day.", cast.Reader.WhyNotJoin(cast.Programme, Reader));
        Assert.Null(cast.Reader.WhyNotJoin(cast.Programme, new(MembershipKind.Reader, March(2))));
    }

    [Fact]
    public void A_leave_lies_within_the_membership() =>
        Assert.Equal("These days lie outside the membership.", cast.Trainee.WhyNotBeAway(cast.Programme, new(1999, 1, 1), new(1999, 1, 5)));

    private const string Last = "The last coordinator stays: make somebody else one first, who has chosen a password.";

    private static MembershipTerms Reader => new(MembershipKind.Reader, Cast.Today);

    private static DateOnly March(int day) => new(2026, 3, day);
}
