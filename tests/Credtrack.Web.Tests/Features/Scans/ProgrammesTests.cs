using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Scans;

/// <summary>The programme is what separates people's data; a membership is what opens it.</summary>
public sealed class ProgrammesTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_trainee_in_two_programmes_says_in_which_the_scan_counts()
    {
        var (one, two) = (await site.NewWorld(), await site.NewWorld());
        await Join(one.Trainee, two);
        using var trainee = await one.Completes();
        await trainee.Presses(Logging.Submit);
        Assert.Equal(["Choose the programme in which the scan is logged."], trainee.Faults());
        await trainee.Chooses("Programme", two.Programme.Name).Fills("Who supervised?", "").Presses(Logging.Submit);
        var scan = Assert.Single(await site.ScansOf(one.Trainee));
        Assert.Equal((two.Programme.Id, 1), (scan.ProgrammeId, scan.Pictures.Count));
        Assert.Equal(HttpStatusCode.NotFound, await Status(one, one.Reader, scan));
        Assert.Equal(HttpStatusCode.OK, await Status(two, two.Reader, scan));
    }

    [Fact]
    public async Task The_supervisors_are_those_of_the_programme_chosen()
    {
        var (one, two) = (await site.NewWorld(), await site.NewWorld());
        await Join(one.Trainee, two);
        using var trainee = await one.Completes();
        await trainee.Chooses("Programme", two.Programme.Name).Presses(Logging.Questions);
        Assert.Equal(["Nobody at the bedside", two.Reader.Name], trainee.Page.QuerySelectorAll("#form_supervisor option").Select(o => o.TextContent));
        trainee.Chooses("Programme", one.Programme.Name).Fills("Who supervised?", $"{two.Reader.Id}");
        await trainee.Presses(Logging.Submit);
        Assert.Equal(["Choose a reader of this programme."], trainee.Faults());
        Assert.Empty(await site.ScansOf(one.Trainee));
    }

    [Fact]
    public async Task A_programme_of_others_cannot_be_chosen()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        using var trainee = await world.Completes();
        await trainee.Forges("Form.ProgrammeId", $"{other.Programme.Id}").Presses(Logging.Submit);
        Assert.Equal(world.Programme.Id, Assert.Single(await site.ScansOf(world.Trainee)).ProgrammeId);
    }

    [Fact]
    public async Task Another_programme_sees_nothing()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        var scan = await world.Read();
        foreach (var stranger in new[] { other.Reader, other.Director, other.Trainee })
        {
            using var visitor = await other.As(stranger);
            Assert.Empty((await visitor.Opens("/scans")).Page.QuerySelectorAll("ol.scans li"));
            foreach (var url in new[] { "", "/edit", "/readings/new", "/returns/new", $"/pictures/{scan.Pictures[0].Id}" })
                Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/scans/{scan.Id}{url}")).Status);
        }
    }

    [Fact]
    public async Task A_membership_that_has_ended_opens_nothing_although_the_cookie_is_good()
    {
        var world = await site.NewWorld();
        var (scan, draft) = (await world.Waiting(), await world.Draft());
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{draft.Id}");
        using var form = await world.Completes();
        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}");
        Assert.Equal((HttpStatusCode.OK, HttpStatusCode.OK), (trainee.Status, reader.Status));
        await Leave(world, world.Trainee, MembershipKind.Trainee);
        await Leave(world, world.Reader, MembershipKind.Reader);

        foreach (var visitor in new[] { trainee, reader })
        {
            foreach (var url in new[] { "/scans", "/scans/new", $"/scans/{scan.Id}", $"/scans/{scan.Id}/pictures/{scan.Pictures[0].Id}", $"/scans/{scan.Id}/readings/new" })
                Assert.Equal((url, HttpStatusCode.NotFound), (url, (await visitor.Opens(url)).Status));
        }
        Assert.Equal(HttpStatusCode.NotFound, (await form.Presses(Logging.Submit)).Status);
        Assert.Equal(2, (await site.ScansOf(world.Trainee)).Length);
    }

    private static async Task<HttpStatusCode> Status(World world, Person person, Scan scan)
    {
        using var visitor = await world.As(person);
        return (await visitor.Opens($"/scans/{scan.Id}")).Status;
    }

    private Task<int> Join(Person trainee, World world) => site.Ask(async db =>
    {
        var person = await db.People.Include(p => p.Memberships).SingleAsync(p => p.Id == trainee.Id);
        person.Join(world.Director, await db.Programmes.SingleAsync(p => p.Id == world.Programme.Id), MembershipKind.Trainee, world.Now);
        return await db.SaveChangesAsync();
    });

    private Task<int> Leave(World world, Person who, MembershipKind kind) => site.Ask(async db =>
    {
        var person = await db.People.Include(p => p.Memberships).SingleAsync(p => p.Id == who.Id);
        person.Leave(world.Director, world.Programme, kind, DateOnly.FromDateTime(world.Now.AddDays(-1)), world.Now);
        return await db.SaveChangesAsync();
    });
}
