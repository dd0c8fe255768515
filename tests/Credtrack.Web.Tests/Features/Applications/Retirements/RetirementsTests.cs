using AngleSharp.Dom;
using AngleSharp.Html.Dom;
using Credtrack.Core.Catalogue;
using Credtrack.Web.Tests.Features.Grants;
using Credtrack.Web.Tests.Features.Scans;

namespace Credtrack.Web.Tests.Features.Applications.Retirements;

public sealed class RetirementsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_retired_application_is_not_offered_and_what_there_is_of_it_goes_on()
    {
        var world = await site.NewWorld();
        var (read, waiting, unrelated) = (await world.Read(), await world.Waiting(), await world.Waiting(world.Entry("lung")));
        using var coordinator = await (await world.AsCoordinator()).Opens($"/applications/{world.Cardiac.Id}");
        await coordinator.Presses("Retire it");
        Assert.Contains("retired Focused cardiac: it is no longer offered for new scans.", coordinator.Text, StringComparison.Ordinal);
        Assert.Contains("retired", (await coordinator.Opens("/applications")).Page.QuerySelector("tbody tr:last-child")!.TextContent, StringComparison.Ordinal);

        using var trainee = await (await world.As(world.Trainee)).Opens("/scans/new?application=cardiac");
        Assert.Empty(trainee.Page.QuerySelectorAll("[name='Form.Application'][value=cardiac], [data-application=cardiac]"));
        Assert.Contains("1 of 3", (await trainee.Opens($"/standings/{world.Trainee.Id}")).Text, StringComparison.Ordinal);
        Assert.Contains("Both sets of answers", (await trainee.Opens($"/scans/{read.Id}")).Text, StringComparison.Ordinal);
        await trainee.Opens($"/scans/{waiting.Id}/edit");
        await trainee.Fills("Depth cm", "16").Presses("Keep the changes");
        Assert.Equal(160, (await site.Kept(waiting.Id))!.Settings.DepthMm);

        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{unrelated.Id}/readings/new");
        Assert.Empty(reader.Page.QuerySelectorAll("option[value=cardiac]"));
        await reader.Opens($"/scans/{waiting.Id}/readings/new");
        await reader.Answers("No", Logging.OfCardiac).Chooses("Image quality 1 to 5", "4 All structures well seen").Presses("Give this reading Ctrl ↵");
        Assert.Equal(world.Cardiac.Id, (await site.Kept(waiting.Id))!.Readings[0].ApplicationId);

        await world.Signed();
        using var director = await (await world.As(world.Director)).Opens($"/standings/{world.Trainee.Id}");
        Assert.Contains(Granting.Privilege, director.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Whoever_had_the_form_open_is_told_and_nothing_is_saved()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting(world.Entry("renal"));
        using var trainee = await world.Starts("soft-tissue");
        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}/readings/new");
        await reader.Fills("Application", "soft-tissue").Presses("Show its questions");
        await world.Behind("soft-tissue", (application, by) => application.Retire(by, world.Now));

        await trainee.Fills("Depth cm", "4").Attaches(Logging.Attach, Stills.Png(shade: 63)).Ticks(Logging.Confirm).Presses(Logging.Submit);
        Assert.Equal((HttpStatusCode.UnprocessableEntity, "4"), (trainee.Status, trainee.Typed("Depth cm")));
        Assert.Contains("This application is not offered any more. Choose another one.", trainee.Faults());
        await reader.Answers("No", [.. site.Applications["soft-tissue"].Questions.Select(q => q.Text)]).Chooses("Image quality 1 to 5", "4 All structures well seen").Fills("Feedback for the trainee", "Well seen.").Presses("Give this reading Ctrl ↵");
        Assert.Equal((HttpStatusCode.UnprocessableEntity, "Well seen."), (reader.Status, reader.Typed("Feedback for the trainee")));
        Assert.Contains($"{site.Applications["soft-tissue"].Name} is retired; choose another application.", reader.Text, StringComparison.Ordinal);
        Assert.Empty((await site.Kept(scan.Id))!.Readings);
    }

    [Fact]
    public async Task What_is_retired_already_is_answered_with_the_reason()
    {
        var world = await site.NewWorld();
        using var coordinator = await (await world.AsCoordinator()).Opens($"/applications/{site.Applications["airway"].Id}");
        var button = coordinator.Page.QuerySelectorAll<IHtmlButtonElement>("main button").Single();
        await world.Behind("airway", (application, by) => application.Retire(by, world.Now));
        await coordinator.Presses(button);
        Assert.Equal(HttpStatusCode.Conflict, coordinator.Status);
        Assert.Contains($"{site.Applications["airway"].Name} is already retired.", coordinator.Text, StringComparison.Ordinal);
        Assert.Equal(HttpStatusCode.NotFound, (await coordinator.Posts($"/applications/{Guid.NewGuid()}/retirements")).Status);
    }
}
