using Credtrack.Core.Measures;
using Credtrack.Core.Reminders;
using Credtrack.Web.Features.Reminders;

namespace Credtrack.Web.Tests.Features.Reminders;

/// <summary>With a real mail server in this process.</summary>
public sealed class DigestsTests : IClassFixture<PostedSite>
{
    private readonly PostedSite site;

    public DigestsTests(PostedSite site)
    {
        this.site = site;
        site.At("2026-03-01 12:00");
    }

    [Fact]
    public async Task One_letter_a_day_gathers_what_a_person_is_reminded_of_in_numbers_and_links()
    {
        var world = await site.NewWorld();
        var both = await world.Another("Bo", MembershipKind.Reader, MembershipKind.Coordinator);
        var (address, scan) = (World.AddressOf(both), await world.Waiting());
        await world.Waiting();
        site.At("2026-03-03 12:00");
        await world.OnlyFor(both);
        await site.RunsAt("2026-03-15 07:59");
        Assert.Empty(site.Office.For(address));
        await site.RunsAt("2026-03-15 08:00");
        foreach (var later in new[] { "08:00", "09:00", "23:00" }) await site.RunsAt($"2026-03-15 {later}");
        var letter = Assert.Single(site.Office.For(address));
        Assert.Equal("""
            3 scans have waited for your reading for 7 days or longer:
            https://credtrack.example/readings

            2 scans have waited for 14 days or longer where you are coordinator:
            https://credtrack.example/scans?state=Waiting

            All your reminders:
            https://credtrack.example/reminders
            """, letter.TextBody!.ReplaceLineEndings("\n").TrimEnd());
        Assert.Equal($"{Digests.IdOf(both.Id, new DateOnly(2026, 3, 15))}@localhost", letter.MessageId);
        foreach (var word in new[] { World.Secret, world.Trainee.Name, world.Reader.Name, world.Cardiac.Name, world.Cardiac.Code, world.Programme.Name, scan.Encounter, $"{scan.Id}" })
            Assert.DoesNotContain(word, $"{letter.Subject} {letter.TextBody}", StringComparison.OrdinalIgnoreCase);
        Assert.All(await world.Reminders(both), r => Assert.Equal(new DateTime(2026, 3, 15, 8, 0, 0, DateTimeKind.Utc), r.SentAt));
        Assert.Contains($"{both.Name} was sent a letter with the reminder (ReadingsOverdue) of 2026-W11.", await world.Facts((await world.Reminders(both)).Single(r => r.Kind == ReminderKind.ReadingsOverdue).Id));
    }

    [Fact]
    public async Task Killed_after_the_letter_was_handed_over_it_goes_out_again_as_the_same_letter()
    {
        using var own = new PostedSite();
        own.At("2026-03-01 12:00");
        var world = await own.NewWorld();
        await world.Waiting();
        own.At("2026-03-08 00:00");
        await own.MakesReminders();
        own.At("2026-03-08 08:00");
        own.Rival.ActsBeforeNextSave(() => throw new OperationCanceledException("killed"));
        await Assert.ThrowsAsync<OperationCanceledException>(own.SendsDigests);
        Assert.Null(Assert.Single(await world.Reminders(world.Reader)).SentAt);
        for (var again = 0; again < 3; again++) await own.SendsDigests();
        Assert.Single(own.Office.For(World.AddressOf(world.Reader)).Select(m => m.MessageId).Distinct());
        Assert.Equal(2, own.Office.Arrived.Count); // whoever receives them sees one
        var sent = Assert.Single(await world.Reminders(world.Reader));
        Assert.Equal(new DateTime(2026, 3, 8, 8, 0, 0, DateTimeKind.Utc), sent.SentAt);
        Assert.Equal(2, (await world.Facts(sent.Id)).Count); // made, sent
    }

    [Fact]
    public async Task A_letter_that_is_refused_holds_nobody_up_and_is_tried_again_in_the_next_hour()
    {
        var world = await site.NewWorld();
        var rhea = await world.Another("Rhea", MembershipKind.Reader);
        await world.Waiting();
        var (ruth, user) = (World.AddressOf(world.Reader), World.AddressOf(world.Reader).Split('@')[0]);
        site.Office.Unknown.Add(user);
        await site.RunsAt("2026-03-08 07:00");
        await site.RunsAt("2026-03-08 08:00");
        Assert.Equal((0, 1), (site.Office.For(ruth).Count, site.Office.For(World.AddressOf(rhea)).Count));
        Assert.Null(Assert.Single(await world.Reminders(world.Reader)).SentAt);
        site.Office.Unknown.Remove(user);
        await site.RunsAt("2026-03-08 08:45");
        Assert.Empty(site.Office.For(ruth));
        await site.RunsAt("2026-03-08 09:00");
        Assert.Equal((1, 1), (site.Office.For(ruth).Count, site.Office.For(World.AddressOf(rhea)).Count));
        Assert.NotNull(Assert.Single(await world.Reminders(world.Reader)).SentAt);
    }

    [Fact]
    public async Task Who_is_no_member_any_more_is_sent_none_nor_is_anybody_once_all_is_read()
    {
        var (left, read) = (await site.NewWorld(), await site.NewWorld());
        await left.Waiting();
        var scan = await read.Waiting();
        await site.RunsAt("2026-03-08 07:00");
        await left.Changes(left.Reader, (reader, programme) => reader.Leave(left.Director, programme, MembershipKind.Reader, new DateOnly(2026, 3, 7), left.Now));
        await read.With(scan, s => s.Read(read.Reader, read.Judgement(), read.Now));
        await site.RunsAt("2026-03-08 08:00");
        foreach (var reader in new[] { left.Reader, read.Reader }) Assert.Empty(site.Office.For(World.AddressOf(reader)));
        foreach (var world in new[] { left, read }) Assert.Null(Assert.Single(await world.Reminders(world.Reader)).SentAt);
    }

    [Fact]
    public async Task Without_a_mail_server_the_letter_lies_in_the_folder_once()
    {
        using var plain = new RunningSite();
        plain.At("2026-03-01 12:00");
        var world = await plain.NewWorld();
        await world.Waiting();
        await plain.RunsAt("2026-03-08 07:00");
        foreach (var quarter in new[] { "08:00", "08:01", "09:00" }) await plain.RunsAt($"2026-03-08 {quarter}");
        Assert.Contains("1 scan has waited for your reading for 7 days or longer:", Letters.To(plain, World.AddressOf(world.Reader)).TextBody, StringComparison.Ordinal);
    }

    [Theory] // Dublin's clocks go forward on 29 March 2026 and back on 25 October (tz database); eight o'clock is named in UTC
    [InlineData("2026-03-28", 8, 7, 7)]
    [InlineData("2026-10-24", 7, 8, 8)]
    public async Task Over_a_clock_change_exactly_one_goes_out_each_day_at_eight(string first, params int[] hours)
    {
        var (day, zone) = (DateOnly.Parse(first, null), TimeZoneInfo.FindSystemTimeZoneById("Europe/Dublin"));
        var start = LocalTimes.StartOfDay(day, zone);
        site.Clock.Now = new DateTimeOffset(start).AddDays(-10);
        var world = await site.NewWorld();
        await world.Waiting();
        var (arrived, seen) = (new List<DateTime>(), 0);
        for (var now = start; now < LocalTimes.StartOfDay(day.AddDays(3), zone); now = now.AddMinutes(30))
        {
            site.Clock.Now = new DateTimeOffset(now);
            if (now == LocalTimes.StartOfDay(LocalTimes.DayOf(now, zone), zone)) await OneMore(world, $"{LocalTimes.DayOf(now, zone):O}");
            await site.SendsDigests();
            for (; seen < site.Office.For(World.AddressOf(world.Reader)).Count; seen++) arrived.Add(now);
        }
        Assert.Equal(hours.Select((hour, n) => day.AddDays(n).ToDateTime(new TimeOnly(hour, 0))), arrived);
    }

    private Task<int> OneMore(World world, string period) => site.Ask(db =>
    {
        db.Add(Reminder.Make(world.Reader, ReminderKind.ReadingsOverdue, world.Programme.Id, period, world.Now.AddDays(-7), world.Now));
        return db.SaveChangesAsync();
    });
}
