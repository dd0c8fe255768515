using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Scans;

/// <summary>The page of a scan as its trainee sees it.</summary>
public sealed class ScanPageTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_trainee_sees_all_that_was_logged()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting(world.Entry(supervisor: world.Reader, at: new DateTime(2025, 7, 10, 13, 30, 0, DateTimeKind.Utc)) with
        {
            Setting = Setting.Simulation, Assisted = true, Indicated = false, Settings = new MachineSettings(Transducer.Phased, 155, 3125, 95, 40),
        });
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}");
        Assert.Equal("Focused cardiac, Thu 10 Jul 2025", trainee.Page.QuerySelector("h1")!.TextContent);
        var facts = trainee.Page.QuerySelectorAll("dl.facts dt").ToDictionary(t => t.TextContent, t => t.NextElementSibling!.TextContent);
        Assert.Equal(("Thu 10 Jul 2025, 14:30", "Performed, simulation", "No", "Yes"), (facts["Performed"], facts["Part and setting"], facts["Clinically indicated"], facts["Hands-on help"]));
        Assert.Equal($"supervised at the bedside by {world.Reader.Name}", facts["Supervision"]);
        foreach (var part in "3.125 MHz|depth 15.5 cm|0.95|0.4".Split('|')) Assert.Contains(part, facts["Machine"], StringComparison.Ordinal);
        Assert.Equal(World.Secret, facts["Note"]);
        Assert.Equal(string.Join(", ", world.Cardiac.Views.Select(v => v.Name)), facts["Views shown"]);
        Assert.Equal(Logging.OfCardiac, trainee.Page.QuerySelectorAll("tbody th").Select(t => t.TextContent));
        Assert.All(trainee.Page.QuerySelectorAll("tbody td"), t => Assert.Equal("No", t.TextContent));
        Assert.Contains($"{world.Trainee.Name} submitted the scan for reading.", trainee.Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(ScanState.Draft, "Submit for reading, Change it, Discard the draft", "A draft: nobody else sees it until you submit it.")]
    [InlineData(ScanState.Waiting, "Change it, Withdraw it", "Waits for a reading since Sun 1 Mar 2026.")]
    [InlineData(ScanState.Returned, "Submit for reading, Change it, Withdraw it", "Returned: something is missing. Add it and submit again.")]
    [InlineData(ScanState.Read, "Withdraw it", "image quality 4 of 5")]
    [InlineData(ScanState.Withdrawn, "", "Withdrawn Sun 1 Mar 2026 by you: it counts on no day.")]
    public async Task Each_state_says_what_it_means_and_offers_what_can_be_done(ScanState state, string offered, string words)
    {
        var world = await site.NewWorld();
        var scan = state switch
        {
            ScanState.Draft => await world.Draft(),
            ScanState.Waiting => await world.Waiting(),
            ScanState.Returned => await world.Returned(),
            ScanState.Withdrawn => await world.Withdrawn(await world.Waiting()),
            _ => await world.Read(),
        };
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}");
        Assert.Equal(offered, string.Join(", ", trainee.Page.QuerySelectorAll(".top .press").Select(b => b.TextContent)));
        Assert.Contains(words, trainee.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_a_trainee_writes_is_shown_as_text_and_never_as_markup()
    {
        var world = await site.NewWorld();
        using var trainee = await world.Completes();
        await trainee.Fills("Note", "<script>alert('x')</script> & <b>bold</b>").Presses(Logging.Submit);
        Assert.Equal("<script>alert('x')</script> & <b>bold</b>", trainee.Page.QuerySelectorAll("dd")[^1].TextContent);
        Assert.Empty(trainee.Page.QuerySelectorAll("dd script, dd b"));
    }

    [Fact]
    public async Task Another_trainee_finds_nothing()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        using var other = await world.As(await world.Another("Tess", MembershipKind.Trainee));
        Assert.Equal(HttpStatusCode.NotFound, (await other.Opens($"/scans/{scan.Id}")).Status);
        Assert.Empty((await other.Opens("/scans")).Page.QuerySelectorAll("ol.scans li"));
    }
}
