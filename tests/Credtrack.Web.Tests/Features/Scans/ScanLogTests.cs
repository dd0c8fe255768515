using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Scans;

public sealed class ScanLogTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_trainee_finds_every_scan_with_its_state_newest_first()
    {
        var world = await site.NewWorld();
        Scan[] scans = [await world.Waiting(world.Entry(at: world.Now.AddDays(-3))), await world.Draft(), await world.Read(entry: world.Entry(at: world.Now.AddDays(-1))), await world.Returned("The apical view.")];
        using var trainee = await (await world.As(world.Trainee)).Opens("/scans");
        Assert.Equal("4 scans: 1 draft, 1 waiting, 1 returned, 1 read.", string.Join(' ', trainee.Page.QuerySelector(".lead")!.TextContent.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries)));
        Assert.Equal([$"/scans/{scans[2].Id}", $"/scans/{scans[0].Id}"], Links(trainee)[2..]);
        Assert.Equal(scans.Select(s => $"/scans/{s.Id}").Order(), Links(trainee).Order());
        Assert.Contains("The apical view.", trainee.Text, StringComparison.Ordinal);
        Assert.Contains("waits since Sun 1 Mar 2026", trainee.Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("Draft")]
    [InlineData("Waiting")]
    [InlineData("Returned")]
    [InlineData("Read")]
    public async Task A_state_is_looked_at_alone(string state)
    {
        var world = await site.NewWorld();
        foreach (var make in new Func<Task<Scan>>[] { world.Draft, () => world.Waiting(), () => world.Returned(), () => world.Read() }) await make();
        using var trainee = await (await world.As(world.Trainee)).Opens("/scans");
        await trainee.Opens(trainee.Page.QuerySelectorAll(".ways a").Single(a => a.TextContent == $"{state} 1").GetAttribute("href")!);
        Assert.Equal(state, $"{(await site.Kept(Guid.Parse(Assert.Single(Links(trainee))[^36..])))!.State}");
        Assert.Equal($"{state} 1", trainee.Page.QuerySelector(".ways [aria-current]")!.TextContent);
    }

    [Fact]
    public async Task What_was_withdrawn_is_looked_at_alone_and_counted_nowhere_else()
    {
        var world = await site.NewWorld();
        await world.Waiting();
        var gone = await world.Withdrawn(await world.Read());
        foreach (var person in new[] { world.Trainee, world.Reader, world.Director })
        {
            using var visitor = await (await world.As(person)).Opens("/scans");
            Assert.StartsWith("1 scan: 0 draft, 1 waiting, 0 returned, 0 read.", Tidy(visitor.Page.QuerySelector(".lead")!.TextContent), StringComparison.Ordinal);
            Assert.DoesNotContain($"/scans/{gone.Id}", Links(visitor));
            await visitor.Opens(visitor.Page.QuerySelectorAll(".ways a").Single(a => a.TextContent == "Withdrawn 1").GetAttribute("href")!);
            Assert.Equal([$"/scans/{gone.Id}"], Links(visitor));
            Assert.Contains("withdrawn Sun 1 Mar 2026", visitor.Text, StringComparison.Ordinal);
        }
    }

    [Theory]
    [InlineData("state=99")]
    [InlineData("state=bogus&page=bogus")]
    [InlineData("page=-1")]
    [InlineData("page=99999999999999")]
    public async Task An_address_made_by_hand_shows_the_log_as_well(string query)
    {
        var world = await site.NewWorld();
        await world.Draft();
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans?{query}");
        Assert.Equal(HttpStatusCode.OK, trainee.Status);
        Assert.Single(Links(trainee));
    }

    [Fact]
    public async Task Fifty_are_shown_at_a_time_and_the_rest_is_one_page_on_in_the_same_filter()
    {
        var world = await site.NewWorld();
        await Fill(world, 53);
        await world.Draft();
        using var trainee = await (await world.As(world.Trainee)).Opens("/scans?state=Waiting");
        Assert.Contains("50 of 53 shown.", trainee.Text, StringComparison.Ordinal);
        var first = Links(trainee);
        Assert.Equal(50, first.Count);
        await trainee.Opens(trainee.Page.QuerySelectorAll("a").Single(a => a.TextContent == "Older ones").GetAttribute("href")!);
        Assert.Equal(3, Links(trainee).Count);
        Assert.Empty(Links(trainee).Intersect(first));
        Assert.DoesNotContain(trainee.Page.QuerySelectorAll("a"), a => a.TextContent == "Older ones");
        await trainee.Opens(trainee.Page.QuerySelectorAll("a").Single(a => a.TextContent == "Newer ones").GetAttribute("href")!);
        Assert.Equal(first, Links(trainee));
    }

    [Theory]
    [InlineData("/scans?page=3")]
    [InlineData("/scans?state=Read")]
    public async Task Where_nothing_is_shown_nobody_is_told_that_there_is_nothing_at_all(string url)
    {
        var world = await site.NewWorld();
        await world.Waiting();
        using var trainee = await (await world.As(world.Trainee)).Opens(url);
        Assert.DoesNotContain("Scans will hang here", trainee.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Before_the_first_scan_the_page_says_how_to_begin()
    {
        using var world = await Trainee(await site.NewWorld());
        await world.Opens("/scans");
        Assert.Contains("Scans will hang here", world.Text, StringComparison.Ordinal);
    }

    // What each page may ask of the database; two of it are for who is asking.
    [Theory]
    [InlineData("/scans", 9)]
    [InlineData("/scans/new?application=cardiac", 7)]
    [InlineData("/scans/{id}", 7)]
    [InlineData("/scans/{id}/edit", 9)]
    public async Task A_page_asks_the_database_the_same_few_questions_however_much_there_is(string url, int budget)
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var trainee = await Trainee(world);
        await trainee.Opens("/scans");
        var few = await site.Queries.During(() => trainee.Opens(url.Replace("{id}", $"{scan.Id}", StringComparison.Ordinal)));
        await Fill(world, 60);
        foreach (var name in new[] { "Rosa", "Rami", "Rhea" }) await world.Another(name, MembershipKind.Reader);
        var many = await site.Queries.During(() => trainee.Opens(url.Replace("{id}", $"{scan.Id}", StringComparison.Ordinal)));
        Assert.Equal(HttpStatusCode.OK, trainee.Status);
        Assert.Equal(few.Count, many.Count);
        Assert.True(many.Count <= budget, $"{many.Count} questions:\n{string.Join("\n\n", many)}");
    }

    private static string Tidy(string text) => string.Join(' ', text.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries));

    private static Task<Visitor> Trainee(World world) => world.As(world.Trainee);

    private static List<string> Links(Visitor visitor) => [.. visitor.Page.QuerySelectorAll("ol.scans a.what").Select(a => a.GetAttribute("href")!)];

    private static async Task Fill(World world, int scans)
    {
        for (var n = 0; n < scans; n++) await world.Waiting(world.Entry(at: world.Now.AddHours(-1 - n)));
    }
}
