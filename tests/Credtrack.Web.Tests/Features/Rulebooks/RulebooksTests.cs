using Credtrack.Core.Rulebooks;

namespace Credtrack.Web.Tests.Features.Rulebooks;

public sealed class RulebooksTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_member_reads_the_rulebook_in_words_from_the_standing()
    {
        var world = await site.NewWorld();
        using var trainee = await world.As(world.Trainee);
        await trainee.Opens($"/standings/{world.Trainee.Id}");
        await trainee.Opens(trainee.Page.QuerySelector("a[href^='/rulebooks/']")!.GetAttribute("href")!);
        Assert.Contains("Rulebook “Test rules”, version 1", trainee.Text, StringComparison.Ordinal);
        Assert.Equal(["Focused cardiac", "3 scans"], trainee.Page.QuerySelector("tbody tr")!.Children.Take(2).Select(c => c.TextContent.Trim()));
    }

    [Fact]
    public async Task A_rulebook_of_another_programme_is_not_there()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        var id = await site.Ask(db => db.Rulebooks.Where(r => r.ProgrammeId == other.Programme.Id).Select(r => r.Id).SingleAsync());
        using var director = await world.As(world.Director);
        Assert.Equal(HttpStatusCode.NotFound, (await director.Opens($"/rulebooks/{id}")).Status);
    }

    [Fact]
    public async Task The_latest_edition_is_in_force_and_no_edition_is_there_twice()
    {
        var world = await site.NewWorld();
        Task<int> Publish(int edition) => site.Ask(async db =>
        {
            db.Add(Rulebook.Publish(world.Director, world.Programme, "Test rules", edition, World.TestRules.Replace("\"min\": 3 }]", "\"min\": 5 }]", StringComparison.Ordinal), world.Now));
            return await db.SaveChangesAsync();
        });
        await Publish(2);
        using var trainee = await world.As(world.Trainee);
        Assert.Contains("0 of 5", (await trainee.Opens($"/standings/{world.Trainee.Id}")).Text, StringComparison.Ordinal);
        await Assert.ThrowsAsync<DbUpdateException>(() => Publish(2));
    }

    [Fact]
    public async Task The_list_says_which_edition_is_in_force_and_who_published_it()
    {
        var world = await site.NewWorld();
        await site.Ask(async db =>
        {
            db.Add(Rulebook.Publish(world.Director, world.Programme, "Newer rules", 2, World.TestRules, world.Now));
            return await db.SaveChangesAsync();
        });
        using var trainee = await (await world.As(world.Trainee)).Opens("/rulebooks");
        var lines = trainee.Page.QuerySelectorAll(".rows > li").Select(li => string.Join(' ', li.TextContent.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries))).ToList();
        Assert.StartsWith("“Newer rules”, version 2 Published", lines[0], StringComparison.Ordinal);
        Assert.EndsWith($"by {world.Director.Name} in force", lines[0], StringComparison.Ordinal);
        Assert.EndsWith("replaced", Assert.Single(lines.Skip(1)), StringComparison.Ordinal);
        Assert.Empty(trainee.Page.QuerySelectorAll("a[href^='/rulebooks/new']"));
    }

    [Fact]
    public async Task A_published_edition_is_never_changed_even_with_a_fact()
    {
        var world = await site.NewWorld();
        foreach (var (property, value) in new (string, object)[] { ("Text", "{}"), ("Name", "Other"), ("Edition", 7) })
        {
            var refused = await Assert.ThrowsAsync<InvalidOperationException>(() => site.Ask(async db =>
            {
                db.Entry(await db.Rulebooks.SingleAsync(r => r.ProgrammeId == world.Programme.Id)).Property(property).CurrentValue = value;
                return await db.SaveChangesAsync();
            }));
            Assert.Equal("A published rulebook stays as it is; a change is the next version.", refused.Message);
        }
        await Assert.ThrowsAsync<InvalidOperationException>(() => site.Ask(async db =>
        {
            db.Remove(await db.Rulebooks.SingleAsync(r => r.ProgrammeId == world.Programme.Id));
            return await db.SaveChangesAsync();
        }));
    }

    [Theory]
    [InlineData("/rulebooks", 4)]
    [InlineData("/rulebooks/{0}", 4)]
    [InlineData("/rulebooks/{0}/files", 3)]
    [InlineData("/rulebooks/new?programme={1}", 4)]
    public async Task A_page_keeps_to_its_budget_of_queries(string url, int budget)
    {
        var world = await site.NewWorld();
        var id = await site.Ask(db => db.Rulebooks.Where(r => r.ProgrammeId == world.Programme.Id).Select(r => r.Id).SingleAsync());
        using var director = await world.As(world.Director);
        var asked = await site.Queries.During(() => director.Opens(string.Format(null, url, id, world.Programme.Id)));
        Assert.Equal(HttpStatusCode.OK, director.Status);
        Assert.True(asked.Count <= budget, $"{asked.Count} queries:\n{string.Join("\n\n", asked)}");
    }
}
