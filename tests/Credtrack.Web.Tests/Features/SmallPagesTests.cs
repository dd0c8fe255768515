using Credtrack.Web.Tests.Features.Grants;

namespace Credtrack.Web.Tests.Features;

/// <summary>The budgets of the pages that hold little: fixed numbers, however much there is. The one of the sign-in page lists the people of the demonstration.</summary>
public sealed class SmallPagesTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Theory] // {0} a proposed grant, {1} one that stands, {2} a trainee, {3} the programme, {4} a waiting scan, {5} the rulebook, {6} the code of a paper
    [InlineData("/sign-in", 2)]
    [InlineData("/documents/checks", 1)]
    [InlineData("/documents/checks?code={6}", 2)]
    [InlineData("/rulebooks/{5}", 4)]
    [InlineData("/grants/{0}/declines/new", 3)]
    [InlineData("/grants/{1}/endings/new", 3)]
    [InlineData("/grants/new?holder={2}&programme={3}&application=lung", 5)]
    [InlineData("/scans/{4}/returns/new", 3)]
    public async Task A_small_page_keeps_to_its_budget_of_queries(string url, int budget)
    {
        var world = await site.NewWorld();
        for (var more = 0; more < 5; more++) await world.Read();
        var (other, scan) = (await world.Another("Tess", MembershipKind.Trainee), await world.Waiting());
        var (proposed, (active, paper)) = (await world.Proposed(), await world.Signed(other));
        var rulebook = await site.Ask(db => db.Rulebooks.Where(r => r.ProgrammeId == world.Programme.Id).Select(r => r.Id).SingleAsync());
        using var both = await world.As(await world.Another("Dee", MembershipKind.Director, MembershipKind.Reader));
        using var stranger = site.Visitor();
        var visitor = url.StartsWith("/sign-in", StringComparison.Ordinal) || url.StartsWith("/documents/checks", StringComparison.Ordinal) ? stranger : both;
        var asked = await site.Queries.During(() => visitor.Opens(string.Format(null, url, proposed, active, world.Trainee.Id, world.Programme.Id, scan.Id, rulebook, paper.Code)));
        Assert.Equal(HttpStatusCode.OK, visitor.Status);
        Assert.True(asked.Count <= budget, $"{asked.Count} queries:\n{string.Join("\n\n", asked)}");
    }
}
