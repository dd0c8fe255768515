using Credtrack.Core.People;

namespace Credtrack.Core.Tests.People;

public sealed class LeaveTests
{
    private const string Overlap = "Tariq is already away on some of these days.";

    private readonly Cast cast = new();

    [Theory] // away already from the 10th to the 20th of March; both ends are part of a leave
    [InlineData(1, 9, null)]
    [InlineData(21, 30, null)]
    [InlineData(21, 21, null)]
    [InlineData(1, 10, Overlap)]
    [InlineData(20, 30, Overlap)]
    [InlineData(10, 20, Overlap)]
    [InlineData(15, 15, Overlap)]
    [InlineData(1, 30, Overlap)]
    [InlineData(9, 8, "A leave ends on or after the day on which it begins.")]
    [InlineData(16, 15, "A leave ends on or after the day on which it begins.")]
    public void Leaves_run_forwards_and_do_not_overlap(int first, int last, string? why)
    {
        Away(10, 20);
        if (why is not null) Refused.With(why, cast.Trainee.WhyNotBeAway(cast.Programme, March(first), March(last)), () => Away(first, last));
        else Away(first, last);
        Assert.Equal(why is null ? 2 : 1, cast.Trainee.Memberships[0].Leaves.Count);
    }

    [Fact]
    public void A_leave_belongs_to_the_membership_and_is_told()
    {
        Away(10, 20);
        var membership = cast.Trainee.Memberships[0];
        Assert.Equal([(membership.Id, March(10), March(20))], membership.Leaves.Select(l => (l.MembershipId, l.FirstDay, l.LastDay)));
        Assert.Equal("Dana noted that Tariq is away from Harbour from 2026-03-10 to 2026-03-20.", cast.Trainee.NewFacts[^1].Sentence);
    }

    [Fact]
    public void Each_programme_has_its_own_leaves()
    {
        Away(10, 20);
        cast.Trainee.Join(cast.Director, cast.Elsewhere, MembershipKind.Trainee, Cast.Noon);
        Assert.Null(cast.Trainee.WhyNotBeAway(cast.Elsewhere, March(10), March(20)));
    }

    [Fact]
    public void Only_trainees_are_away()
    {
        Assert.Equal("Ruth is no Trainee of Harbour.", cast.Reader.WhyNotBeAway(cast.Programme, March(1), March(2)));
        Assert.Equal("Tariq is no Trainee of Hillside.", cast.Trainee.WhyNotBeAway(cast.Elsewhere, March(1), March(2)));
    }

    private void Away(int first, int last) => cast.Trainee.BeAway(cast.Director, cast.Programme, March(first), March(last), Cast.Noon);

    private static DateOnly March(int day) => new(2026, 3, day);
}
