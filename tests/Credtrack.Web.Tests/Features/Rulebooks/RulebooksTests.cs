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
}
