using Credtrack.Core.Imports;

namespace Credtrack.Web.Tests.Features.Imports.Confirmations;

public sealed class ConfirmationsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task Defaults_are_ticked_for_and_stand_in_the_trace()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Maps(Importing.Table(world.Row("1", world.Trainee.Name, rest: "performed,,,direct,no")));
        await cora.Presses("Import 1 scan now");
        Assert.Equal((HttpStatusCode.UnprocessableEntity, 0), (cora.Status, await world.Evidence()));
        Assert.Equal(["Tick that the missing cells take these values, or complete the file and upload it again."], cora.Told());
        await cora.Ticks("2 missing cells may take the usual values").Presses("Import 1 scan now");
        using var trainee = await (await world.As(world.Trainee)).Opens($"/standings/{world.Trainee.Id}");
        Assert.Contains("assumed: indicated, clinical", trainee.Text, StringComparison.Ordinal);
        Assert.Contains("cells that took a default 2", string.Join(' ', await world.Facts(cora.Id())), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Cut_off_half_way_nothing_is_seen_and_it_is_taken_up_again()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        var url = await CutOff(world, cora, "g");
        Assert.Equal((0, 500), (await world.Evidence(), await site.Ask(db => db.ImportedRows.CountAsync(r => r.ProgrammeId == world.Programme.Id))));
        foreach (var person in new[] { world.Trainee, world.Reader, world.Director })
        {
            using var visitor = await (await world.As(person)).Opens("/scans");
            Assert.Empty(visitor.Page.QuerySelectorAll("ol.scans a"));
            await visitor.Opens("/standings");
            Assert.DoesNotContain("Newcomer", visitor.Text, StringComparison.Ordinal);
        }
        Assert.Contains("not finished: take it up again or throw it away", (await cora.Opens("/imports")).Text, StringComparison.Ordinal);
        await cora.Opens(url);
        Assert.Contains("500 of them are staged already", cora.Text, StringComparison.Ordinal);
        await cora.Presses("Take it up again");
        Assert.Contains("1200 scans became evidence", cora.Text, StringComparison.Ordinal);
        Assert.Equal((1200, 1), (await world.Evidence(), await site.Ask(db => db.People.CountAsync(p => p.Name == $"Newcomer g{world.Programme.Name}"))));
    }

    [Fact]
    public async Task Cut_off_half_way_it_is_thrown_away_and_the_file_comes_in_as_another_import()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        var url = await CutOff(world, cora, "h");
        await cora.Maps(File(world, "h"));
        Assert.Equal(500, cora.Told().Count(t => t.EndsWith("this row is staged by another import of this programme; take that up again or throw it away first.", StringComparison.Ordinal)) + cora.Page.QuerySelectorAll("a").Count(a => a.TextContent == "More faults") * 400);
        await cora.Opens(url);
        await cora.Presses("Throw this import away");
        Assert.Contains("thrown away", cora.Text, StringComparison.Ordinal);
        await cora.Imports(File(world, "h"));
        Assert.Equal(1200, await world.Evidence());
        Assert.True(await site.Ask(db => db.Set<ImportFile>().AllAsync(f => f.Content == null || !db.Imports.Any(i => i.Id == f.ImportId && i.Steps.Any()))));
    }

    [Fact]
    public async Task A_row_that_came_in_meanwhile_by_another_import_is_not_there_twice()
    {
        var world = await site.NewWorld();
        var csv = Importing.Table(world.Row("1", world.Trainee.Name));
        using var cora = await world.As(await world.Coordinator());
        using var cole = await world.As(await world.Another("Cole", MembershipKind.Coordinator));
        await cora.Maps(csv);
        await cole.Maps(csv);
        await cole.Presses("Import 1 scan now");
        await cora.Presses("Import 1 scan now");
        Assert.Equal((HttpStatusCode.Conflict, 1), (cora.Status, await world.Evidence()));
    }

    [Fact]
    public async Task A_long_one_shows_how_far_it_is_and_ends_by_itself()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Imports(Importing.Table(Enumerable.Range(1, 5001).Select(n => world.Row($"{n}", world.Trainee.Name))));
        var url = cora.Url;
        Assert.Equal("2", cora.Response.Headers.GetValues("Refresh").Single());
        Assert.NotNull(cora.Page.QuerySelector("progress"));
        while (cora.Page.QuerySelector("progress") is not null) await cora.Opens(url);
        Assert.Contains("5001 scans became evidence", cora.Text, StringComparison.Ordinal);
        Assert.Equal(5001, await world.Evidence(world.Trainee));
    }

    private static string File(World world, string mark) => Importing.Table(Enumerable.Range(1, 1200).Select(n => world.Row($"{mark}{n}", n % 2 == 0 ? world.Trainee.Name : $"Newcomer {mark}{world.Programme.Name}")));

    /// <summary>The program dies before its third save: people are enrolled, one batch is staged.</summary>
    private async Task<string> CutOff(World world, Visitor cora, string mark)
    {
        await cora.Maps(File(world, mark));
        var url = cora.Url;
        site.Rival.ActsBeforeNextSave(Live);
        await cora.Presses("Import 1200 scans now");
        Assert.Equal(HttpStatusCode.InternalServerError, cora.Status);
        return url;

        Task Live()
        {
            site.Rival.ActsBeforeNextSave(() =>
            {
                site.Rival.ActsBeforeNextSave(() => throw new InvalidOperationException("killed"));
                return Task.CompletedTask;
            });
            return Task.CompletedTask;
        }
    }
}
