using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Scans.FollowUps;

public sealed class FollowUpsTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Touches = "This discrepancy touches the patient’s care";

    [Fact]
    public async Task A_tick_with_the_reading_puts_it_on_top_of_the_directors_home()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var director = await world.As(world.Director);
        Assert.DoesNotContain("follow-up is open", director.Text, StringComparison.Ordinal);
        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}/readings/new");
        await reader.Answers("Yes", Logging.OfCardiac).Ticks(Touches).Chooses("Image quality 1 to 5", "4 All structures well seen").Presses("Give this reading Ctrl ↵");
        await director.Opens("/");
        Assert.StartsWith("1 follow-up is open: a discrepancy that touches a patient’s care.", director.Page.QuerySelector("main .lead")!.TextContent, StringComparison.Ordinal);
        Assert.Equal("Touches care", director.Page.QuerySelector("main section h2")!.TextContent);
    }

    [Fact]
    public async Task Without_the_tick_there_is_none()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}/readings/new");
        await reader.Answers("Yes", Logging.OfCardiac).Chooses("Image quality 1 to 5", "4 All structures well seen").Presses("Give this reading Ctrl ↵");
        Assert.False(await site.Ask(db => db.FollowUps.AnyAsync(f => f.ScanId == scan.Id)));
    }

    [Fact]
    public async Task The_reader_opens_it_later_and_the_trainee_sees_that_it_was_raised_and_no_more()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}");
        await reader.Presses(Touches);
        Assert.Contains("Follow-up opened", reader.Text, StringComparison.Ordinal);
        Assert.Contains($"{world.Reader.Name} opened a follow-up: a discrepancy touches the patient's care.", reader.Text, StringComparison.Ordinal);
        Assert.DoesNotContain((await reader.Opens($"/scans/{scan.Id}")).Page.QuerySelectorAll("button"), b => b.TextContent == Touches);

        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}");
        Assert.Contains($"{world.Reader.Name} marked Sun 1 Mar 2026 that the discrepancy touches the patient’s care. The follow-up is open.", trainee.Text, StringComparison.Ordinal);
        Assert.Empty(trainee.Page.QuerySelectorAll("[href^='/follow-ups']"));
        Assert.DoesNotContain(trainee.Page.QuerySelectorAll("button"), b => b.TextContent == Touches);
    }

    [Fact]
    public async Task Of_two_at_once_there_is_one()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        using var first = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}");
        using var second = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}");
        using var third = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}");
        site.Rival.ActsBeforeNextSave(() => first.Presses(Touches));
        await second.Presses(Touches);
        Assert.Equal(HttpStatusCode.Conflict, second.Status);
        await third.Presses(Touches);
        Assert.Equal(HttpStatusCode.Conflict, third.Status);
        Assert.Contains("A follow-up of this scan is open already.", third.Text, StringComparison.Ordinal);
        Assert.Equal(1, await site.Ask(db => db.FollowUps.CountAsync(f => f.ScanId == scan.Id)));
    }

    [Fact]
    public async Task Who_has_not_read_the_scan_opens_none()
    {
        var world = await site.NewWorld();
        var (mine, theirs) = (await world.Read(), await ReadByAnother(world));
        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{mine.Id}");
        reader.Page.QuerySelector("form[action$=follow-ups]")!.SetAttribute("action", $"/scans/{theirs.Id}/follow-ups");
        await reader.Presses(Touches);
        Assert.Equal(HttpStatusCode.Conflict, reader.Status);
        Assert.Contains("Only a reader who has read this scan opens a follow-up of it.", reader.Text, StringComparison.Ordinal);
        foreach (var person in new[] { world.Trainee, world.Director })
        {
            using var visitor = await world.As(person);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Sends($"/scans/{mine.Id}/follow-ups", new FormUrlEncodedContent([]))).Status);
        }
    }

    private static async Task<Scan> ReadByAnother(World world)
    {
        var (scan, other) = (await world.Waiting(), await world.Another("Rhea", MembershipKind.Reader));
        return await world.With(scan, s => s.Read(other, world.Judgement(), world.Now));
    }
}
