namespace Credtrack.Web.Tests.Features.Reminders;

public sealed class RemindersTests : IClassFixture<RunningSite>
{
    private readonly RunningSite site;

    public RemindersTests(RunningSite site)
    {
        this.site = site;
        site.At("2026-03-01 12:00");
    }

    [Fact]
    public async Task A_reminder_is_open_until_its_matter_is_settled_and_stays_so_when_new_scans_wait()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        site.At("2026-03-03 12:00");
        await world.Waiting();
        await site.RunsAt("2026-03-08 09:00");
        using var reader = await (await world.As(world.Reader)).Opens("/reminders");
        Assert.Equal(["Open"], reader.Page.QuerySelectorAll("section h2").Select(h => h.TextContent));
        foreach (var words in new[] { "1 reminder is open.", "Scans that wait for your reading", world.Programme.Name, "Since Sun 8 Mar 2026", "no letter sent" }) Assert.Contains(words, reader.Text, StringComparison.Ordinal);
        Assert.NotNull(reader.Page.QuerySelector(".rows a[href='/readings']"));
        await world.With(scan, s => s.Read(world.Reader, world.Judgement(), world.Now));
        site.At("2026-03-09 08:30");
        using var later = await (await world.As(world.Reader)).Opens("/reminders");
        Assert.Equal(["Done"], later.Page.QuerySelectorAll("section h2").Select(h => h.TextContent));
        Assert.Contains("Nothing of which you were reminded waits any more.", later.Text, StringComparison.Ordinal);
        await site.RunsAt("2026-03-10 09:00");
        using var again = await (await world.As(world.Reader)).Opens("/reminders");
        Assert.Equal(["Open", "Done"], again.Page.QuerySelectorAll("section h2").Select(h => h.TextContent));
        Assert.Equal(["/readings"], again.Page.QuerySelectorAll(".rows a").Select(a => a.GetAttribute("href")));
    }

    [Fact]
    public async Task A_coordinator_is_led_to_the_scans_that_wait_and_sees_when_the_letter_went()
    {
        var world = await site.NewWorld();
        var cora = await world.Coordinator();
        await world.Waiting();
        await site.RunsAt("2026-03-15 07:00");
        await site.RunsAt("2026-03-15 08:00");
        using var visitor = await (await world.As(cora)).Opens("/reminders");
        foreach (var words in new[] { "Scans that wait for a reading", "letter sent Sun 15 Mar 2026" }) Assert.Contains(words, visitor.Text, StringComparison.Ordinal);
        Assert.Equal(HttpStatusCode.OK, (await visitor.Opens(visitor.Page.QuerySelector(".rows a")!.GetAttribute("href")!)).Status);
    }

    [Fact]
    public async Task Nobody_sees_those_of_others()
    {
        var world = await site.NewWorld();
        await world.Waiting();
        await site.RunsAt("2026-03-08 09:00");
        foreach (var person in new[] { world.Trainee, world.Director, await world.Administrator(), (await site.NewWorld()).Reader })
        {
            using var visitor = await (await world.As(person)).Opens("/reminders");
            Assert.Contains("Reminders will stand here", visitor.Text, StringComparison.Ordinal);
            Assert.DoesNotContain(world.Programme.Name, visitor.Text, StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task Fifty_stand_on_a_page_and_the_questions_are_as_few_as_for_one()
    {
        var world = await site.NewWorld();
        await world.Waiting();
        await site.RunsAt("2026-03-08 09:00");
        using var reader = await world.As(world.Reader);
        var few = await site.Queries.During(() => reader.Opens("/reminders"));
        await site.Ask(db =>
        {
            for (var n = 0; n < 54; n++)
                db.Add(Credtrack.Core.Reminders.Reminder.Make(world.Reader, Credtrack.Core.Reminders.ReminderKind.ReadingsOverdue, world.Programme.Id, $"old {n}", world.Now.AddDays(-40), world.Now.AddDays(-30)));
            return db.SaveChangesAsync();
        });
        var many = await site.Queries.During(() => reader.Opens("/reminders"));
        Assert.Equal((HttpStatusCode.OK, few.Count, 50), (reader.Status, many.Count, reader.Page.QuerySelectorAll(".rows li").Length));
        Assert.True(many.Count <= 5, $"{many.Count} queries:\n{string.Join("\n\n", many)}");
        Assert.Equal(["Open", "Done"], reader.Page.QuerySelectorAll("section h2").Select(h => h.TextContent));
        await reader.Opens(reader.Page.QuerySelector("a[href='/reminders?page=2']")!.GetAttribute("href")!);
        Assert.Equal(5, reader.Page.QuerySelectorAll(".rows li").Length);
    }
}
