using AngleSharp.Dom;
using Credtrack.Web.Tests.Features.Grants;

namespace Credtrack.Web.Tests.Features.Imports.Undos;

public sealed class UndosTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Undo = "Undo the whole import";

    [Fact]
    public async Task An_import_is_undone_as_a_whole_and_may_come_in_again()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        var csv = Importing.Table(world.Row("1", world.Trainee.Name), world.Row("2", world.Trainee.Name, "lung"));
        await cora.Imports(csv);
        await cora.Presses(Undo);
        Assert.Equal(0, await world.Evidence());
        var id = await site.Ask(db => db.ImportedRows.Where(r => r.ProgrammeId == world.Programme.Id).Select(r => r.ScanId).FirstAsync());
        Assert.EndsWith("took the scan back with its import.", (await world.Facts(id))[^1], StringComparison.Ordinal);
        Assert.Contains("Withdrawn", (await cora.Opens($"/scans/{id}")).Text, StringComparison.Ordinal);
        await cora.Imports(csv);
        Assert.Equal(2, await world.Evidence(world.Trainee));
    }

    [Fact]
    public async Task It_stays_where_a_scan_was_changed_or_signed_over_since_and_says_which()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Imports(Importing.Table(world.Row("1", world.Trainee.Name), world.Row("2", world.Trainee.Name, "lung", reading: ",,,")));
        var url = cora.Url;
        var unread = await site.Ask(db => db.Scans.SingleAsync(s => s.ProgrammeId == world.Programme.Id && !s.Readings.Any()));
        await world.With(unread, s => s.Attach(world.Trainee, site.Still, world.Now));
        await world.Signed();
        await cora.Opens(url);
        Assert.Equal([$"Focused cardiac of {world.Trainee.Name}, Sat 28 Feb 2026: among the evidence of a signature", $"Lung of {world.Trainee.Name}, Sat 28 Feb 2026: changed since by its trainee"], Named(cora));
        Assert.Contains("Scans of this import are in use since", cora.Text, StringComparison.Ordinal);
        await cora.Posts($"/imports/{cora.Id()}/undos");
        Assert.Equal((HttpStatusCode.Conflict, 2), (cora.Status, await world.Evidence()));
    }

    [Fact]
    public async Task A_scan_that_its_trainee_withdrew_may_come_in_again()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        var csv = Importing.Table(world.Row("1", world.Trainee.Name));
        await cora.Imports(csv);
        await world.Withdrawn(await site.Ask(db => db.Scans.SingleAsync(s => s.ProgrammeId == world.Programme.Id)));
        Assert.Equal(0, await world.Evidence());
        await cora.Imports(csv);
        Assert.Equal(1, await world.Evidence(world.Trainee));
    }

    private static IEnumerable<string> Named(Visitor visitor) => visitor.Page.QuerySelector("#done")!.Closest("section")!.QuerySelectorAll("li").Select(l => l.TextContent).Order(StringComparer.Ordinal);
}
