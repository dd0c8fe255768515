using Credtrack.Core.Grants;
using Credtrack.Web.Features.Grants;

namespace Credtrack.Web.Tests.Features.Grants.Signatures;

public sealed class TwoSignersTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const int Rounds = 200;
    private const string Why = "Why you sign although not everything is met";

    [Fact]
    public async Task Of_two_directors_at_the_same_instant_exactly_one_signs_in_two_hundred_rounds()
    {
        var world = await site.NewWorld();
        await world.Read();
        var second = await world.Another("Dee", MembershipKind.Director);
        for (var round = 0; round < Rounds; round++)
        {
            var id = await world.Proposed();
            var (one, two) = (new TaskCompletionSource(), new TaskCompletionSource());
            var signed = await Task.WhenAll(Task.Run(() => Signs(world, id, world.Director, one, two)), Task.Run(() => Signs(world, id, second, two, one)));
            Assert.Single(signed, won => won);
            Assert.Equal(1, await site.Ask(db => db.Set<Signature>().CountAsync(s => s.GrantId == id)));
            await world.End(id); // makes room for the next proposal
        }
        Assert.Equal(Rounds, await site.Ask(db => db.LedgerEntries.CountAsync(e => e.Kind == "GrantSigned" && (e.ById == world.Director.Id || e.ById == second.Id))));
    }

    [Fact]
    public async Task Who_is_overtaken_while_signing_is_told_so_keeps_the_reason_typed_and_makes_no_second_paper()
    {
        var world = await site.NewWorld();
        var id = await world.Proposed();
        using var director = await world.AtTheDesk(await world.Another("Dee", MembershipKind.Director), id);
        director.Means().Fills(Why, "Trained elsewhere.").Fills("Your password, again", World.Password);
        site.Rival.ActsBeforeNextSave(() => world.Sign(id, world.Director));
        await director.Presses("Sign and seal");
        Assert.Equal(HttpStatusCode.Conflict, director.Status);
        Assert.Equal("This privilege is already signed.", director.Page.QuerySelector(".why-not")!.TextContent);
        Assert.Equal("Trained elsewhere.", director.Typed(Why));
        var grant = await site.Ask(db => db.Grants.AsNoTracking().Include(g => g.Documents).SingleAsync(g => g.Id == id));
        Assert.Equal(world.Director.Id, Assert.Single(grant.Signatures).SignerId);
        Assert.Single(grant.Documents);
    }

    // A context each; neither saves before both have loaded the grant and signed what there is.
    private Task<bool> Signs(World world, Guid id, Person by, TaskCompletionSource ready, TaskCompletionSource other) => site.Ask(async db =>
    {
        var (grant, place) = (await db.Grants.SingleAsync(g => g.Id == id), await db.Sites.SingleAsync());
        var statement = (await GrantEvidence.Load(db, place, grant, DateOnly.FromDateTime(world.Now))).Statement;
        grant.Sign(by, statement, Meaning.Granted, "Trained elsewhere.", world.Now);
        ready.SetResult();
        await other.Task.WaitAsync(TimeSpan.FromMinutes(1));
        return await IsSaved(db);
    });

    private static async Task<bool> IsSaved(CredtrackDb db)
    {
        try
        {
            await db.SaveChangesAsync();
            return true;
        }
        catch (DbUpdateException)
        {
            return false;
        }
    }
}
