using System.Globalization;
using Credtrack.Core.Measures;

namespace Credtrack.Core.Tests.Measures;

// The clock changes are those of the IANA time zone database; the rule for each is the rulebook format's.
public sealed class LocalTimesTests
{
    [Theory]
    [InlineData("2025-07-01T12:00", "Europe/Lisbon", "2025-07-01T11:00:00Z")]
    [InlineData("2025-10-26T01:30", "Europe/Lisbon", "2025-10-26T00:30:00Z")] // twice: the first, in summer time
    [InlineData("2025-03-30T01:30", "Europe/Lisbon", "2025-03-30T01:30:00Z")] // skipped: read with the offset before
    [InlineData("2025-11-02T01:30", "America/Chicago", "2025-11-02T06:30:00Z")] // twice
    [InlineData("2025-03-09T02:30", "America/Chicago", "2025-03-09T08:30:00Z")] // skipped
    [InlineData("2025-04-06T02:30", "Australia/Sydney", "2025-04-05T15:30:00Z")] // twice, south
    [InlineData("2025-10-05T02:30", "Australia/Sydney", "2025-10-04T16:30:00Z")] // skipped, south
    [InlineData("2025-04-06T01:45", "Australia/Lord_Howe", "2025-04-05T14:45:00Z")] // twice, by half an hour
    [InlineData("2025-07-01T05:45", "Asia/Kathmandu", "2025-07-01T00:00:00Z")]
    [InlineData("2025-01-01T00:00:00.1234567", "UTC", "2025-01-01T00:00:00.1234567Z")]
    public void A_local_time_becomes_one_instant(string text, string zone, string utc) => Assert.Equal(Utc(utc), TimeText.ReadUtc(text, Zone(zone)));

    [Theory]
    [InlineData("2025-01-01", "America/Chicago", "2025-01-01T06:00:00Z")]
    [InlineData("2025-09-07", "America/Santiago", "2025-09-07T04:00:00Z")] // the day begins at 01:00
    [InlineData("2025-03-30", "Asia/Beirut", "2025-03-29T22:00:00Z")] // the day begins at 01:00
    [InlineData("2025-04-06", "America/Santiago", "2025-04-06T04:00:00Z")] // 23:00 to 24:00 of the day before occurs twice
    [InlineData("2025-11-02", "America/Havana", "2025-11-02T04:00:00Z")] // the hour from midnight occurs twice: the first
    [InlineData("1919-03-31", "America/Toronto", "1919-03-31T04:30:00Z")] // from 23:30 to 00:30: the day begins at 00:30
    [InlineData("2011-12-31", "Pacific/Apia", "2011-12-30T10:00:00Z")] // the 30th did not take place
    public void A_date_alone_is_the_first_instant_of_the_day(string day, string zone, string utc)
    {
        var start = TimeText.ReadUtc(day, Zone(zone))!.Value;
        Assert.Equal(Utc(utc), start);
        Assert.Equal(TimeText.ReadDay(day), LocalTimes.DayOf(start, Zone(zone)));
        Assert.True(LocalTimes.DayOf(start.AddTicks(-1), Zone(zone)) < TimeText.ReadDay(day));
    }

    [Fact]
    public void Every_instant_is_found_again_from_its_local_time_unless_that_occurred_before()
    {
        var chance = new Random(20260302);
        foreach (var name in new[] { "Europe/Lisbon", "America/Santiago", "Australia/Lord_Howe", "Asia/Kathmandu", "America/St_Johns" })
        {
            for (var i = 0; i < 2000; i++)
            {
                var utc = new DateTime(2020, 1, 1, 0, 0, 0, DateTimeKind.Utc).AddMinutes(chance.Next(6 * 365 * 24 * 60));
                var local = LocalTimes.FromUtc(utc, Zone(name));
                var back = LocalTimes.ToUtc(local, Zone(name));
                Assert.True(back == utc || (back < utc && LocalTimes.FromUtc(back, Zone(name)) == local), $"{name} {utc:O}");
            }
        }
    }

    [Theory]
    [InlineData("2025-01-01T10:00Z", "2025-01-01T10:00:00Z")]
    [InlineData("2025-01-01T10:00+05:45", "2025-01-01T04:15:00Z")]
    [InlineData("2025-01-01T10:00:59-06:00", "2025-01-01T16:00:59Z")]
    [InlineData("2025-01-01T10:00:00.123456789Z", "2025-01-01T10:00:00.1234567Z")]
    public void An_offset_says_it_all(string text, string utc) => Assert.Equal(Utc(utc), TimeText.ReadUtc(text, Zone("Asia/Kathmandu")));

    [Theory]
    [InlineData("")]
    [InlineData("2025-1-1")]
    [InlineData("2025-02-29")]
    [InlineData("2025-13-01T10:00")]
    [InlineData("2025-01-01 10:00")]
    [InlineData("2025-01-01T24:00")]
    [InlineData("2025-01-01T10:60")]
    [InlineData("2025-01-01T10:00:60")]
    [InlineData("2025-01-01T10")]
    [InlineData("2025-01-01T10:00.5")]
    [InlineData("2025-01-01T10:00z")]
    [InlineData("2025-01-01T10:00+0545")]
    [InlineData("2025-01-01T10:00+24:00")]
    [InlineData(" 2025-01-01")]
    [InlineData("2025-01-01\n")]
    [InlineData("0001-01-01")]
    [InlineData("9999-12-31T23:00-05:00")]
    [InlineData("２０２５-01-01")]
    public void Anything_else_is_no_time(string text) => Assert.Null(TimeText.ReadUtc(text, TimeZoneInfo.Utc));

    [Fact]
    public void A_year_at_the_edge_of_the_calendar_is_refused() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => LocalTimes.ToUtc(DateTime.MaxValue, TimeZoneInfo.Utc));

    private static TimeZoneInfo Zone(string name) => TimeZoneInfo.FindSystemTimeZoneById(name);

    private static DateTime Utc(string text) => DateTime.Parse(text, CultureInfo.InvariantCulture, DateTimeStyles.RoundtripKind);
}
