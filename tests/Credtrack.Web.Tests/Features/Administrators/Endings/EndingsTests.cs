namespace Credtrack.Web.Tests.Features.Administrators.Endings;

public sealed class EndingsTests : IClassFixture<EndingsTests.ItsOwnSite>
{
    private readonly ItsOwnSite site;

    public EndingsTests(ItsOwnSite site) => this.site = site;

    // Who is the last one of a site can only be told where nobody else appoints any.
    public sealed class ItsOwnSite : RunningSite;

    [Fact]
    public async Task The_last_one_stays_and_of_two_who_end_each_other_at_one_moment_one_stays()
    {
        var world = await site.NewWorld();
        var person = await world.Administrator();
        var founder = await site.Ask(db => db.People.SingleAsync(p => p.Name == "Founder"));
        using var ada = await world.As(person);
        await Ends(founder.Id);
        Assert.Equal("/administrators", ada.Url);
        Assert.Contains("The last administrator stays: appoint another one first, who has chosen a password.", ada.Text, StringComparison.Ordinal);

        var second = await world.Another("Bea");
        await Appoint(person.Id, second.Id);
        await ada.Opens("/administrators");
        site.Rival.ActsBeforeNextSave(() => site.Ask(async db =>
        {
            var here = await db.Sites.SingleAsync();
            here.Dismiss(await db.People.SingleAsync(p => p.Id == second.Id), await db.People.SingleAsync(p => p.Id == person.Id), [second.Id], world.Now);
            return await db.SaveChangesAsync();
        }));
        await Ends(second.Id);
        Assert.Equal(HttpStatusCode.Conflict, ada.Status);
        Assert.Equal([second.Id], await site.Ask(db => db.Sites.SelectMany(s => s.Administrators).Where(a => a.EndedAt == null).Select(a => a.PersonId).ToListAsync()));
        Assert.Equal(HttpStatusCode.NotFound, (await ada.Opens("/administrators")).Status);

        async Task Ends(Guid one)
        {
            await ada.Opens("/administrators");
            await ada.Presses((AngleSharp.Html.Dom.IHtmlButtonElement)ada.Page.QuerySelector($"form[action='/administrators/{one}/endings'] button")!);
        }
    }

    private Task<int> Appoint(Guid by, Guid person) => site.Ask(async db =>
    {
        var here = await db.Sites.SingleAsync();
        here.Appoint(await db.People.SingleAsync(p => p.Id == by), await db.People.SingleAsync(p => p.Id == person), site.Clock.Now.UtcDateTime.Date);
        return await db.SaveChangesAsync();
    });
}
