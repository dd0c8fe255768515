using Credtrack.Web.Plumbing;

namespace Credtrack.Web.Tests.Plumbing;

public sealed class PasswordPaceTests
{
    private readonly SiteClock clock = new();
    private readonly PasswordPace pace;

    public PasswordPaceTests() => pace = new(clock);

    [Fact]
    public void Of_a_thousand_tries_in_a_row_ten_are_looked_at_and_of_those_of_a_day_fewer_than_a_hundred_and_twenty()
    {
        Assert.Equal(10, Enumerable.Range(0, 1000).Count(_ => pace.WaitBefore("a") == TimeSpan.Zero));
        var looked = 0;
        for (var second = 0; second < 24 * 3600; second++)
        {
            clock.Now += TimeSpan.FromSeconds(1);
            if (pace.WaitBefore("a") == TimeSpan.Zero) looked++;
        }
        Assert.InRange(looked, 90, 110);
    }

    [Fact]
    public void The_right_one_and_a_quiet_day_forget_the_wrong_ones_and_each_key_is_on_its_own()
    {
        for (var n = 0; n < 10; n++) pace.WaitBefore("a");
        Assert.True(pace.WaitBefore("a") > TimeSpan.Zero);
        Assert.Equal(TimeSpan.Zero, pace.WaitBefore("b"));
        pace.Right("a");
        Assert.Equal(TimeSpan.Zero, pace.WaitBefore("a"));
        for (var n = 0; n < 20; n++) pace.WaitBefore("b");
        clock.Now += TimeSpan.FromDays(1.01);
        for (var n = 0; n < 10; n++) Assert.Equal(TimeSpan.Zero, pace.WaitBefore("b"));
    }

    [Fact]
    public void Many_at_one_moment_do_not_slip_through_together() =>
        Assert.Equal(10, Enumerable.Range(0, 500).AsParallel().WithDegreeOfParallelism(8).Count(_ => pace.WaitBefore("a") == TimeSpan.Zero));

    [Fact]
    public void One_stranger_does_not_take_the_turns_of_who_comes_from_elsewhere_and_many_together_are_slowed_too()
    {
        for (var n = 0; n < 50; n++) pace.WaitBefore("a@b.example", IPAddress.Parse("192.0.2.1"));
        Assert.Equal(TimeSpan.Zero, pace.WaitBefore("A@B.example", IPAddress.Parse("192.0.2.2")));
        var looked = Enumerable.Range(0, 500).Count(n => pace.WaitBefore("a@b.example", IPAddress.Parse($"198.51.{n / 250}.{n % 250}")) == TimeSpan.Zero);
        Assert.InRange(looked, 85, 100);
    }
}
