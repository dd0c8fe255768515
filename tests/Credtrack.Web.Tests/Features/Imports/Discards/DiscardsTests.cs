using Credtrack.Core.Imports;

namespace Credtrack.Web.Tests.Features.Imports.Discards;

public sealed class DiscardsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task An_import_thrown_away_keeps_no_file_and_is_not_confirmed_any_more()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Uploads(Importing.Table(world.Row("1", world.Trainee.Name)));
        await cora.Presses("Throw this import away");
        var id = cora.Id();
        Assert.Null(await site.Ask(db => db.Set<ImportFile>().Where(f => f.ImportId == id).Select(f => f.Content).SingleAsync()));
        await cora.Posts($"/imports/{id}/confirmations");
        Assert.Equal((HttpStatusCode.Conflict, 0), (cora.Status, await world.Evidence()));
        Assert.Equal(HttpStatusCode.NotFound, (await cora.Opens($"/imports/{id}/mappings/new")).Status);
    }

    [Fact]
    public async Task One_that_is_confirmed_is_undone_not_thrown_away()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Imports(Importing.Table(world.Row("1", world.Trainee.Name)));
        Assert.DoesNotContain("Throw this import away", cora.Text, StringComparison.Ordinal);
        Assert.Null(await site.Ask(db => db.Set<ImportFile>().Where(f => db.Imports.Any(i => i.Id == f.ImportId && i.ProgrammeId == world.Programme.Id)).Select(f => f.Content).SingleAsync()));
    }
}
