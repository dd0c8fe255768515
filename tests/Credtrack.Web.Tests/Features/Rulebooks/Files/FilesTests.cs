namespace Credtrack.Web.Tests.Features.Rulebooks.Files;

public sealed class FilesTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_member_saves_an_edition_exactly_as_it_was_published()
    {
        var world = await site.NewWorld();
        using var trainee = await world.As(world.Trainee);
        await trainee.Opens(await Address(world));
        await trainee.Opens(trainee.Page.QuerySelectorAll("a").Single(a => a.TextContent == "Save it as JSON").GetAttribute("href")!);
        Assert.Equal("application/json", trainee.Response.Content.Headers.ContentType!.MediaType);
        Assert.Equal("rulebook-version-1.json", trainee.Response.Content.Headers.ContentDisposition!.FileName);
        Assert.Equal(World.TestRules, await trainee.Response.Content.ReadAsStringAsync());
    }

    [Fact]
    public async Task A_file_of_another_programme_is_not_there()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        using var director = await world.As(world.Director);
        Assert.Equal(HttpStatusCode.NotFound, (await director.Opens($"{await Address(other)}/files")).Status);
    }

    private Task<string> Address(World world) => site.Ask(async db => $"/rulebooks/{await db.Rulebooks.Where(r => r.ProgrammeId == world.Programme.Id).Select(r => r.Id).SingleAsync()}");
}
