namespace Credtrack.Web.Tests.Features.Scans.Returns;

public sealed class ReturnsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_returned_scan_tells_its_trainee_what_is_missing_and_comes_back_to_the_bench()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var reader = await world.As(world.Reader);
        await reader.Opens($"/scans/{scan.Id}/readings/new");
        await reader.Opens(reader.Page.QuerySelector("a[href$='returns/new']")!.GetAttribute("href")!);
        await reader.Fills("What is missing?", "The apical view <b>please</b>.").Presses("Return it to the trainee");
        Assert.Contains("Nothing waits for you", reader.Text, StringComparison.Ordinal);

        using var trainee = await world.As(world.Trainee);
        Assert.Contains("1 scan was returned to you to mend", (await trainee.Opens("/")).Text, StringComparison.Ordinal);
        await trainee.Opens($"/scans/{scan.Id}/edit");
        Assert.Contains("The apical view <b>please</b>.", trainee.Text, StringComparison.Ordinal);
        await trainee.Presses("Submit for reading");
        Assert.Contains("Waits for a reading", trainee.Text, StringComparison.Ordinal);
        Assert.EndsWith($"/scans/{scan.Id}/readings/new", (await reader.Opens("/readings")).Url, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Words_are_asked_for_and_kept_within_bounds()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var reader = await world.As(world.Reader);
        await reader.Opens($"/scans/{scan.Id}/returns/new");
        await reader.Presses("Return it to the trainee");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, reader.Status);
        Assert.Contains("Say what is missing, so that the trainee can mend it.", reader.Text, StringComparison.Ordinal);
        var long1001 = new string('x', 1001);
        await reader.Fills("What is missing?", long1001).Presses("Return it to the trainee");
        Assert.Contains("Keep it within 1,000 characters.", reader.Text, StringComparison.Ordinal);
        Assert.Equal(long1001, reader.Typed("What is missing?"));
    }

    [Fact]
    public async Task What_was_read_meanwhile_is_not_returned_and_the_words_are_kept()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        var slower = await world.Another("Rhea", MembershipKind.Reader);
        using var second = await world.As(slower);
        await second.Opens($"/scans/{scan.Id}/returns/new");
        await site.Ask(async db =>
        {
            (await db.Scans.SingleAsync(s => s.Id == scan.Id)).Read(world.Reader, world.Judgement(), world.Now);
            return await db.SaveChangesAsync();
        });
        await second.Fills("What is missing?", "The apical view.").Presses("Return it to the trainee");
        Assert.Equal(HttpStatusCode.Conflict, second.Status);
        Assert.Equal("The apical view.", second.Typed("What is missing?"));
        Assert.Contains("has been read meanwhile", second.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Only_a_reader_returns()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        foreach (var person in new[] { world.Trainee, world.Director })
        {
            using var visitor = await world.As(person);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/scans/{scan.Id}/returns/new")).Status);
        }
    }
}
