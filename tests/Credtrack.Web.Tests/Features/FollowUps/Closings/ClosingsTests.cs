using Credtrack.Core.FollowUps;
using Credtrack.Web.Tests.Features.Scans;

namespace Credtrack.Web.Tests.Features.FollowUps.Closings;

public sealed class ClosingsTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Button = "Close this follow-up", Who = "Who was told?", When = "When?", Told = "The consultant <b>on call</b>";

    [Fact]
    public async Task The_director_writes_who_was_told_and_it_leaves_the_home_page()
    {
        var world = await site.NewWorld();
        var open = await world.Opened(await world.Read());
        using var director = await world.As(world.Director);
        await director.Opens(director.Page.QuerySelector("a[href^='/follow-ups/']")!.GetAttribute("href")!);
        await director.Opens(director.Page.QuerySelectorAll("a").Single(a => a.TextContent == "Write who was told").GetAttribute("href")!);
        Assert.Equal("2026-03-01T12:00", director.Typed(When));
        await director.Fills(Who, Told).Chooses("How?", "by telephone").Fills("Remark", "They come back to it tonight.").Presses(Button);
        Assert.Equal($"/follow-ups/{open.Id}", director.Url);
        foreach (var words in new[] { Told, "Sun 1 Mar 2026, 12:00", "by telephone", "They come back to it tonight." }) Assert.Contains(words, director.Text, StringComparison.Ordinal);
        Assert.DoesNotContain("follow-up is open", (await director.Opens("/")).Text, StringComparison.Ordinal);

        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{open.ScanId}");
        Assert.Contains("Closed Sun 1 Mar 2026: somebody was told.", trainee.Text, StringComparison.Ordinal);
        foreach (var words in new[] { "consultant", "tonight" }) Assert.DoesNotContain(words, trainee.Text, StringComparison.Ordinal);
        Assert.Equal("This follow-up is closed.", (await director.Opens($"/follow-ups/{open.Id}/closings/new")).Page.QuerySelector(".why-not")!.TextContent);
    }

    [Fact]
    public async Task The_reader_who_opened_it_closes_it_and_a_coordinator_is_told_who_does()
    {
        var world = await site.NewWorld();
        var open = await world.Opened(await world.Read());
        using var coordinator = await Form(world, await world.Another("Cora", MembershipKind.Coordinator), open);
        Assert.Equal("Only the programme's director or the reader who opened a follow-up closes it.", coordinator.Page.QuerySelector(".why-not")!.TextContent);
        using var reader = await Form(world, world.Reader, open);
        await reader.Fills(Who, Told).Chooses("How?", "in person").Presses(Button);
        Assert.Equal(world.Reader.Id, (await Now(open)).Closing!.ById);
    }

    [Fact]
    public async Task What_is_missing_impossible_or_telling_is_said_at_its_field_and_nothing_is_lost()
    {
        var world = await site.NewWorld();
        var open = await world.Opened(await world.Read());
        using var director = await Form(world, world.Director, open);
        await director.Fills(When, "").Presses(Button);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, director.Status);
        Assert.Equal(["Choose how they were told.", "Enter when they were told.", "Write who was told, by their part in the care."], director.Faults().Order(StringComparer.Ordinal));
        foreach (var (when, why) in new[] { ("2026-03-01T12:01", "This time has not come yet. Enter when they were told."), ("2026-03-01T11:59", "This is before the reading. Enter when they were told what it found."), ("soon", "Enter when they were told."), ("0001-01-01T00:00", "Enter when they were told.") })
        {
            await director.Fills(Who, Told).Chooses("How?", "by message").Fills(When, when).Fills("Remark", "x").Presses(Button);
            Assert.Equal((HttpStatusCode.UnprocessableEntity, Told), (director.Status, director.Typed(Who)));
            Assert.Equal([why], director.Faults());
        }
        await director.Fills(When, "2026-03-01T12:00").Fills(Who, "jane.doe@example.org").Fills("Remark", "Patient: Jane Doe").Presses(Button);
        Assert.Equal(["This looks like an e-mail address. Take it out: nothing here may identify a patient.", "This looks like a name. Take it out: nothing here may identify a patient."], director.Faults());
        Assert.Equal("Patient: Jane Doe", director.Typed("Remark"));
        Assert.True((await Now(open)).IsOpen);
    }

    [Fact]
    public async Task Who_was_slower_is_told_and_keeps_what_was_typed()
    {
        var world = await site.NewWorld();
        var open = await world.Opened(await world.Read());
        using var first = await Form(world, world.Reader, open);
        using var second = await Form(world, world.Director, open);
        await first.Fills(Who, "The ward").Chooses("How?", "in person").Presses(Button);
        await second.Fills(Who, Told).Chooses("How?", "in writing").Presses(Button);
        Assert.Equal((HttpStatusCode.Conflict, Told, "This follow-up is closed."), (second.Status, second.Typed(Who), second.Page.QuerySelector(".why-not")!.TextContent));
        Assert.Equal("The ward", (await Now(open)).Closing!.Told);
    }

    private Task<FollowUp> Now(FollowUp followUp) => site.Ask(db => db.FollowUps.AsNoTracking().SingleAsync(f => f.Id == followUp.Id));

    private static async Task<Visitor> Form(World world, Person person, FollowUp followUp) => await (await world.As(person)).Opens($"/follow-ups/{followUp.Id}/closings/new");
}
