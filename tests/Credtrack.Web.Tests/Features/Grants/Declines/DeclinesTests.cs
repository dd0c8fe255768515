using Credtrack.Core.Grants;

namespace Credtrack.Web.Tests.Features.Grants.Declines;

public sealed class DeclinesTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task It_takes_a_reason_and_then_says_so_to_the_holder()
    {
        var world = await site.NewWorld();
        var id = await world.Proposed();
        using var director = await world.As(world.Director);
        await director.Opens($"/grants/{id}/declines/new");
        await director.Presses("Decline it");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, director.Status);
        Assert.Contains("Give the reason.", director.Text, StringComparison.Ordinal);
        await director.Fills("Reason", "As we <b>spoke</b> about.").Presses("Decline it");
        using var holder = await world.As(world.Trainee);
        await holder.Opens($"/grants/{id}");
        Assert.Contains("As we <b>spoke</b> about.", holder.Text, StringComparison.Ordinal);
        Assert.Equal(GrantState.Declined, await site.Ask(async db => (await db.Grants.SingleAsync(g => g.Id == id)).State));
        Assert.Equal("This proposal was declined.", (await director.Opens($"/grants/{id}/declines/new")).Page.QuerySelector(".why-not")!.TextContent);
    }

    [Fact]
    public async Task From_an_old_page_it_is_refused_with_the_reason_and_the_words_are_kept()
    {
        var world = await site.NewWorld();
        var id = await world.Proposed();
        using var first = await world.As(world.Director);
        using var second = await world.As(await world.Another("Dee", MembershipKind.Director));
        foreach (var director in new[] { first, second }) await director.Opens($"/grants/{id}/declines/new");
        await first.Fills("Reason", "First.").Presses("Decline it");
        await second.Fills("Reason", "Second.").Presses("Decline it");
        Assert.Equal(HttpStatusCode.Conflict, second.Status);
        Assert.Equal("Second.", second.Typed("Reason"));
        Assert.Equal("This proposal was declined.", second.Page.QuerySelector(".why-not")!.TextContent);
    }
}
