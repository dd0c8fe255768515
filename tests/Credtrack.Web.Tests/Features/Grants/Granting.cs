using Credtrack.Core.Grants;
using Credtrack.Web.Features.Documents;
using Credtrack.Web.Features.Grants;
using Microsoft.Extensions.DependencyInjection;

namespace Credtrack.Web.Tests.Features.Grants;

/// <summary>Grants in a world, made by the verbs that the pages use.</summary>
internal static class Granting
{
    public const string Privilege = "Focused cardiac without supervision";

    public static Task<Guid> Proposed(this World world, Person? holder = null) => world.Site.Ask(async db =>
    {
        var grant = Grant.Propose(world.Director, holder ?? world.Trainee, world.Programme, world.Cardiac, Privilege, [], world.Now);
        db.Add(grant);
        await db.SaveChangesAsync();
        return grant.Id;
    });

    /// <summary>Signed over the evidence there is, with its sealed paper.</summary>
    public static async Task<(Guid Grant, Document Document)> Signed(this World world, Person? holder = null)
    {
        var id = await world.Proposed(holder);
        return (id, await world.Sign(id, world.Director));
    }

    public static async Task<Document> Sign(this World world, Guid id, Person by)
    {
        await using var scope = world.Site.Services.CreateAsyncScope();
        var (db, issuing) = (scope.ServiceProvider.GetRequiredService<CredtrackDb>(), scope.ServiceProvider.GetRequiredService<Issuing>());
        var (grant, site) = (await db.Grants.SingleAsync(g => g.Id == id), await db.Sites.SingleAsync());
        var statement = (await GrantEvidence.Load(db, site, grant, DateOnly.FromDateTime(world.Now))).Statement;
        grant.Sign(by, statement, Meaning.Granted, "Trained elsewhere before.", world.Now);
        issuing.Issue(grant, statement, by, site);
        await db.SaveChangesAsync();
        return grant.Documents[0];
    }

    public static async Task<Guid> Declined(this World world, Person? holder = null)
    {
        var id = await world.Proposed(holder);
        await world.Site.Ask(async db =>
        {
            (await db.Grants.SingleAsync(g => g.Id == id)).TurnDown(world.Director, "Too early.", world.Now);
            return await db.SaveChangesAsync();
        });
        return id;
    }

    public static Task<int> End(this World world, Guid id) => world.Site.Ask(async db =>
    {
        (await db.Grants.SingleAsync(g => g.Id == id)).End(world.Director, "Left the hospital.", world.Now);
        return await db.SaveChangesAsync();
    });

    public static async Task<Visitor> AtTheDesk(this World world, Person director, Guid grant) => await (await world.As(director)).Opens($"/grants/{grant}/signatures/new");

    public static Visitor Means(this Visitor director) => director.Chooses("Your signature means", "I grant this privilege under the local rules, as programme director");
}
