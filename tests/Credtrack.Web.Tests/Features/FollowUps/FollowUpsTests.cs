using Credtrack.Core.FollowUps;

namespace Credtrack.Web.Tests.Features.FollowUps;

public sealed class FollowUpsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task Open_ones_stand_before_those_that_are_closed()
    {
        var world = await site.NewWorld();
        var closed = await Closed(world);
        var open = await world.Opened(await world.Read());
        using var director = await (await world.As(world.Director)).Opens("/follow-ups");
        Assert.Contains("1 is open, 1 closed.", director.Text, StringComparison.Ordinal);
        Assert.Equal([$"/follow-ups/{open.Id}", $"/follow-ups/{closed.Id}"], director.Page.QuerySelectorAll(".rows a").Select(a => a.GetAttribute("href")));
        Assert.Equal(["Open", "Closed"], director.Page.QuerySelectorAll("section h2").Select(h => h.TextContent));
        Assert.Contains("This page replaces no duty to tell the patient’s team.", director.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task One_says_what_it_is_about_and_who_was_told()
    {
        var world = await site.NewWorld();
        var closed = await Closed(world);
        using var director = await (await world.As(world.Director)).Opens($"/follow-ups/{closed.Id}");
        foreach (var words in new[] { world.Trainee.Name, world.Reader.Name, "true negative", "The consultant on call", "by telephone", $"Closed Sun 1 Mar 2026 by {world.Director.Name}." })
            Assert.Contains(words, director.Text, StringComparison.Ordinal);
        Assert.NotNull(director.Page.QuerySelector($"a[href='/scans/{closed.ScanId}']"));
        Assert.Contains($"{world.Director.Name} closed the follow-up: told at 2026-03-01 12:00 UTC (Telephone), and wrote who was told.", director.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task It_is_seen_by_the_reader_the_directors_and_the_coordinators_and_by_nobody_else()
    {
        var world = await site.NewWorld();
        var open = await world.Opened(await world.Read());
        foreach (var person in new[] { world.Reader, world.Director, await world.Another("Cora", MembershipKind.Coordinator) })
        {
            using var visitor = await world.As(person);
            Assert.Contains("1 follow-up is open", visitor.Text, StringComparison.Ordinal);
            Assert.Equal(HttpStatusCode.OK, (await visitor.Opens($"/follow-ups/{open.Id}")).Status);
        }
        var elsewhere = await site.NewWorld();
        foreach (var person in new[] { world.Trainee, await world.Another("Rhea", MembershipKind.Reader), await world.Another("Cho", MembershipKind.Chair), elsewhere.Director, elsewhere.Reader })
        {
            using var visitor = await world.As(person);
            Assert.DoesNotContain("follow-up is open", visitor.Text, StringComparison.Ordinal);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/follow-ups/{open.Id}")).Status);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/follow-ups/{open.Id}/closings/new")).Status);
            Assert.Contains("Follow-ups will stand here", (await visitor.Opens("/follow-ups")).Text, StringComparison.Ordinal);
        }
    }

    [Theory]
    [InlineData("/follow-ups", 5)]
    [InlineData("/follow-ups/{0}", 4)]
    [InlineData("/", 19)]
    public async Task A_page_asks_the_same_few_questions_however_many_there_are(string url, int budget)
    {
        var world = await site.NewWorld();
        var open = await world.Opened(await world.Read());
        using var director = await world.As(world.Director);
        var few = await site.Queries.During(() => director.Opens(string.Format(null, url, open.Id)));
        for (var n = 0; n < 23; n++) await world.Opened(await world.Read());
        var many = await site.Queries.During(() => director.Opens(string.Format(null, url, open.Id)));
        Assert.Equal((HttpStatusCode.OK, few.Count), (director.Status, many.Count));
        Assert.True(many.Count <= budget, $"{many.Count} queries:\n{string.Join("\n\n", many)}");
    }

    private async Task<FollowUp> Closed(World world)
    {
        var open = await world.Opened(await world.Read());
        return await site.Ask(async db =>
        {
            var found = await db.FollowUps.SingleAsync(f => f.Id == open.Id);
            found.Close(world.Director, new ClosingEntry("The consultant on call", world.Now, Way.Telephone, null), world.Now);
            await db.SaveChangesAsync();
            return found;
        });
    }
}
