using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Scans.Discards;

public sealed class DiscardsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_discarded_draft_is_gone_for_everybody_and_its_row_stays()
    {
        var world = await site.NewWorld();
        var draft = await world.Draft();
        using var trainee = await world.As(world.Trainee);
        await (await trainee.Opens($"/scans/{draft.Id}")).Presses("Discard the draft");
        Assert.Equal("/scans", trainee.Url);
        Assert.Contains("Draft discarded", trainee.Text, StringComparison.Ordinal);
        Assert.Empty(trainee.Page.QuerySelectorAll("ol.scans li"));
        foreach (var url in new[] { "", "/edit", $"/pictures/{draft.Pictures[0].Id}" })
            Assert.Equal(HttpStatusCode.NotFound, (await trainee.Opens($"/scans/{draft.Id}{url}")).Status);
        Assert.Equal(ScanState.Withdrawn, (await site.Kept(draft.Id))!.State);
        Assert.Equal("DraftDiscarded", await site.Ask(db => db.LedgerEntries.Where(e => e.SubjectId == draft.Id).OrderByDescending(e => e.Number).Select(e => e.Kind).FirstAsync()));
    }

    [Fact]
    public async Task What_was_submitted_meanwhile_is_not_discarded()
    {
        var world = await site.NewWorld();
        var draft = await world.Draft();
        using var trainee = await world.As(world.Trainee);
        using var beside = await world.As(world.Trainee);
        await beside.Opens($"/scans/{draft.Id}");
        await (await trainee.Opens($"/scans/{draft.Id}")).Presses("Submit for reading");
        Assert.DoesNotContain(trainee.Page.QuerySelectorAll("button"), b => b.TextContent == "Discard the draft");
        await beside.Presses("Discard the draft");
        Assert.Equal(HttpStatusCode.Conflict, beside.Status);
        Assert.Contains("Only a draft that was never submitted is discarded.", beside.Text, StringComparison.Ordinal);
        Assert.Equal(ScanState.Waiting, (await site.Kept(draft.Id))!.State);
    }

    [Fact]
    public async Task Discarding_twice_finds_nothing_the_second_time()
    {
        var world = await site.NewWorld();
        var draft = await world.Draft();
        using var trainee = await world.As(world.Trainee);
        using var beside = await world.As(world.Trainee);
        await beside.Opens($"/scans/{draft.Id}");
        await (await trainee.Opens($"/scans/{draft.Id}")).Presses("Discard the draft");
        Assert.Equal(HttpStatusCode.NotFound, (await beside.Presses("Discard the draft")).Status);
    }
}
