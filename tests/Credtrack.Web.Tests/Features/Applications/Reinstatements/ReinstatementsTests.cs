using Credtrack.Core.Catalogue;

namespace Credtrack.Web.Tests.Features.Applications.Reinstatements;

public sealed class ReinstatementsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task What_was_brought_back_is_offered_again()
    {
        var world = await site.NewWorld();
        await world.Behind("tee", (application, by) => application.Retire(by, world.Now));
        using var coordinator = await (await world.AsCoordinator()).Opens($"/applications/{site.Applications["tee"].Id}");
        await coordinator.Presses("Bring it back");
        Assert.Contains("back into the catalogue.", coordinator.Text, StringComparison.Ordinal);
        using var trainee = await (await world.As(world.Trainee)).Opens("/scans/new");
        Assert.NotNull(trainee.Page.QuerySelector("[name='Form.Application'][value=tee]"));
    }

    [Fact]
    public async Task A_name_that_was_taken_meanwhile_keeps_it_away_and_the_page_says_why()
    {
        var world = await site.NewWorld();
        var name = site.Applications["transcranial"].Name;
        await world.Behind("transcranial", (application, by) => application.Retire(by, world.Now));
        using var coordinator = await (await world.AsCoordinator()).Opens($"/applications/{site.Applications["late-pregnancy"].Id}/edit");
        await coordinator.Fills("Name", name).Presses(Cataloguing.Keep);
        Assert.Equal(HttpStatusCode.OK, coordinator.Status);
        await coordinator.Opens($"/applications/{site.Applications["transcranial"].Id}");
        Assert.Equal($"Another application bears the name {name} now; give that one another name first.", coordinator.Page.QuerySelector(".why-not")!.TextContent);
        Assert.Equal(HttpStatusCode.Conflict, (await coordinator.Posts($"/applications/{site.Applications["transcranial"].Id}/reinstatements")).Status);
        Assert.True((await site.Listed("transcranial")).IsRetired);
    }

    [Fact]
    public async Task A_page_of_a_retired_application_keeps_to_its_budget_of_queries()
    {
        var world = await site.NewWorld();
        await world.Behind("piv", (application, by) => application.Retire(by, world.Now));
        using var coordinator = await world.AsCoordinator();
        var asked = await site.Queries.During(() => coordinator.Opens($"/applications/{site.Applications["piv"].Id}"));
        Assert.Equal(HttpStatusCode.OK, coordinator.Status);
        Assert.True(asked.Count <= 5, $"{asked.Count} queries:\n{string.Join("\n\n", asked)}");
    }
}
