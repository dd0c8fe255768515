using Credtrack.Core.Reminders;

namespace Credtrack.Web.Tests.Features.Reminders;

public sealed class OverdueReadingsTests : IClassFixture<RunningSite>
{
    private readonly RunningSite site;

    public OverdueReadingsTests(RunningSite site)
    {
        this.site = site;
        site.At("2026-03-01 12:00");
    }

    [Fact]
    public async Task Readers_are_reminded_from_the_seventh_day_coordinators_from_the_fourteenth_each_once_a_week()
    {
        var world = await site.NewWorld();
        var cora = await world.Coordinator();
        await world.Waiting();
        await Told("2026-03-07 23:59", [], []);
        await Told("2026-03-08 00:00", ["2026-W10"], []);
        await Told("2026-03-08 23:00", ["2026-W10"], []);
        await Told("2026-03-09 00:00", ["2026-W10", "2026-W11"], []);
        await Told("2026-03-14 23:59", ["2026-W10", "2026-W11"], []);
        await Told("2026-03-15 00:00", ["2026-W10", "2026-W11"], ["2026-W11"]);
        var made = Assert.Single(await world.Reminders(cora));
        Assert.Equal((ReminderKind.ReadingsLongOverdue, world.Programme.Id, new DateTime(2026, 3, 2, 0, 0, 0, DateTimeKind.Utc), null), (made.Kind, made.SubjectId, made.Before, made.SentAt));
        Assert.Equal($"{cora.Name} is to be reminded (ReadingsLongOverdue) in 2026-W11.", Assert.Single(await world.Facts(made.Id)));
        foreach (var person in new[] { world.Trainee, world.Director }) Assert.Empty(await world.Reminders(person));

        async Task Told(string time, string[] reader, string[] coordinator)
        {
            site.At(time);
            await site.MakesReminders();
            Assert.Equal(reader, (await world.Reminders(world.Reader)).Select(r => r.Period));
            Assert.Equal(coordinator, (await world.Reminders(cora)).Select(r => r.Period));
        }
    }

    [Fact]
    public async Task Only_who_may_read_what_waits_is_reminded()
    {
        var world = await site.NewWorld();
        var rhea = await world.Another("Rhea", MembershipKind.Reader);
        var elsewhere = await site.NewWorld();
        await world.OnlyFor(rhea);
        site.At("2026-03-08 00:00");
        await site.MakesReminders();
        Assert.Single(await world.Reminders(rhea));
        foreach (var person in new[] { world.Reader, elsewhere.Reader }) Assert.Empty(await world.Reminders(person));
    }

    [Fact]
    public async Task Of_what_waits_for_its_trainee_or_has_been_read_nobody_is_reminded()
    {
        var world = await site.NewWorld();
        await world.Draft();
        await world.Returned();
        await world.Read();
        await world.Withdrawn(await world.Waiting());
        var bare = await world.Waiting();
        await world.With(bare, s => s.TakeOut(world.Reader, s.Pictures[0], "A name can be read.", world.Now));
        var cora = await world.Coordinator();
        site.At("2026-03-15 00:00");
        await site.MakesReminders();
        foreach (var person in new[] { world.Reader, cora }) Assert.Empty(await world.Reminders(person));
    }

    [Fact]
    public async Task Whose_place_somebody_else_takes_is_left_in_peace_and_the_other_is_reminded()
    {
        var world = await site.NewWorld();
        await world.Waiting();
        var locum = await world.Another("Lou");
        await world.Changes(locum, (lou, programme) => lou.Join(world.Director, programme, new MembershipTerms(MembershipKind.Reader, new DateOnly(2026, 3, 1), new DateOnly(2026, 3, 8), null, world.Reader), world.Now));
        site.At("2026-03-08 00:00");
        await site.MakesReminders();
        Assert.Equal((0, 1), ((await world.Reminders(world.Reader)).Count, (await world.Reminders(locum)).Count));
        site.At("2026-03-09 00:00");
        await site.MakesReminders();
        Assert.Equal((1, 1), ((await world.Reminders(world.Reader)).Count, (await world.Reminders(locum)).Count));
    }

    [Fact]
    public async Task Killed_in_the_middle_and_run_again_nothing_is_lost_or_made_twice()
    {
        using var own = new RunningSite();
        own.At("2026-03-01 12:00");
        var world = await own.NewWorld();
        Person[] readers = [world.Reader, await world.Another("Rhea", MembershipKind.Reader), await world.Another("Rob", MembershipKind.Reader)];
        await world.Waiting();
        own.At("2026-03-08 00:00");
        own.Rival.ActsBeforeNextSave(() =>
        {
            own.Rival.ActsBeforeNextSave(() => throw new OperationCanceledException("killed"));
            return Task.CompletedTask;
        });
        await Assert.ThrowsAsync<OperationCanceledException>(own.MakesReminders);
        Assert.Equal(1, await own.Ask(db => db.Reminders.CountAsync()));
        for (var again = 0; again < 2; again++) await own.MakesReminders();
        foreach (var reader in readers) Assert.Single(await world.Reminders(reader));
    }

    [Fact]
    public async Task Two_runs_at_one_moment_make_one()
    {
        using var own = new RunningSite();
        own.At("2026-03-01 12:00");
        var world = await own.NewWorld();
        await world.Waiting();
        own.At("2026-03-08 00:00");
        own.Rival.ActsBeforeNextSave(own.MakesReminders);
        await Assert.ThrowsAsync<DbUpdateException>(own.MakesReminders); // Hangfire runs it again
        await own.MakesReminders();
        Assert.Single(await world.Reminders(world.Reader));
    }
}
