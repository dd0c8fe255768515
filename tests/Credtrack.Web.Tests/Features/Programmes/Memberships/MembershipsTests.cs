namespace Credtrack.Web.Tests.Features.Programmes.Memberships;

public sealed class MembershipsTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string HandOver = "Shown to me once, to hand over", Way = "How the link to choose a password gets there";

    [Fact]
    public async Task A_coordinator_invites_a_person_who_is_then_at_work()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        var address = $"tess.{world.Programme.Id}@tests.example";
        await cora.Opens($"{world.People()}/new");
        await cora.Fills("Name", "Tess").Fills("E-mail address", address).Fills("Membership", "Trainee").Fills("Year group", "year 1").Chooses(Way, HandOver).Presses("Save and invite");
        using var tess = site.Visitor();
        await tess.Opens(new Uri(cora.Page.QuerySelector("code.key")!.TextContent).PathAndQuery);
        await tess.Chooses(Staffing.NewPassword);
        await tess.SignsInWith(address, Staffing.NewPassword);
        Assert.Equal(HttpStatusCode.OK, (await tess.Opens("/scans/new")).Status);
        await cora.Opens(world.People());
        Assert.Contains("Tess", cora.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Somebody_with_an_account_gets_the_membership_and_no_link()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        using var cora = await world.As(await world.Coordinator());
        await Invites("Reader");
        Assert.Equal(world.People(), cora.Url);
        using var guest = await other.As(other.Reader);
        Assert.Contains(world.Programme.Name, await site.Ask(db => db.People.Where(p => p.Id == other.Reader.Id).SelectMany(p => p.Memberships).Select(m => m.Programme.Name).ToListAsync()), StringComparer.Ordinal);
        await Invites("Reader");
        Assert.Equal([$"{other.Reader.Name} is already a Reader of {world.Programme.Name}."], cora.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));

        async Task Invites(string kind)
        {
            await cora.Opens($"{world.People()}/new");
            await cora.Fills("Name", "Somebody").Fills("E-mail address", World.AddressOf(other.Reader)).Fills("Membership", kind).Presses("Save and invite");
        }
    }

    [Fact]
    public async Task Somebody_who_does_not_sign_in_needs_no_address_and_gets_one_later()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"{world.People()}/new");
        await cora.Fills("Name", "Otto Offline").Fills("Membership", "Trainee").Presses("Save and invite");
        await cora.Opens(cora.Page.QuerySelectorAll("th a").Single(a => a.TextContent == "Otto Offline").GetAttribute("href")!);
        Assert.Contains("Does not sign in: no address is known.", cora.Text, StringComparison.Ordinal);
        await cora.Opens($"{cora.Url}/invitations/new");
        await cora.Fills("E-mail address", World.AddressOf(world.Reader)).Presses("Make the link");
        Assert.Equal(["This address belongs to another person. Check it."], cora.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));
        await cora.Fills("E-mail address", $"otto.{world.Programme.Id}@tests.example").Presses("Make the link");
        Assert.Contains("has not chosen a password yet", cora.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_stand_in_has_a_last_day_and_the_page_says_for_whom()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"{world.People()}/new");
        await cora.Fills("Name", "Stan").Fills("Membership", "Reader").Fills("Stands in for", $"{world.Reader.Id}").Presses("Save and invite");
        Assert.Equal(["Standing in for somebody has a last day."], cora.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));
        await cora.Fills("Last day", "2026-03-20").Presses("Save and invite");
        await cora.Opens(cora.Page.QuerySelectorAll("th a").Single(a => a.TextContent == "Stan").GetAttribute("href")!);
        Assert.Contains($"from Sun 1 Mar 2026 to Fri 20 Mar 2026, standing in for {world.Reader.Name}.", cora.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Name_year_and_days_are_corrected_in_the_open()
    {
        var world = await site.NewWorld();
        var person = await world.Coordinator();
        using var cora = await world.As(person);
        await cora.Opens($"{await world.MembershipOf(world.Trainee)}/edit");
        await cora.Fills("Name", "Tariq Two").Fills("Year group", "year 3").Presses("Save");
        Assert.Contains($"{person.Name} corrected the name {world.Trainee.Name} to Tariq Two.", cora.Text, StringComparison.Ordinal);
        Assert.Contains("year group from year 2 to year 3.", cora.Text, StringComparison.Ordinal);
        await cora.Opens($"{cora.Url}/edit");
        await cora.Fills("Last day", "2026-02-01").Presses("Save");
        Assert.Equal(["A membership ends on or after the day on which it begins."], cora.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));
    }

    [Fact]
    public async Task From_an_old_page_it_is_refused_and_what_was_typed_stays()
    {
        var world = await site.NewWorld();
        var person = await world.Coordinator();
        using var one = await world.As(person);
        using var other = await world.As(person);
        foreach (var cora in new[] { one, other }) await cora.Opens($"{await world.MembershipOf(world.Trainee)}/edit");
        await one.Fills("Year group", "year 3").Presses("Save");
        await other.Fills("Year group", "year 4").Presses("Save");
        Assert.Equal(HttpStatusCode.Conflict, other.Status);
        Assert.Equal("year 4", other.Typed("Year group"));
    }

    [Fact]
    public async Task The_last_coordinator_stays_and_of_two_who_let_each_other_go_at_one_moment_one_stays()
    {
        var world = await site.NewWorld();
        var (cora, cyril) = (await world.Coordinator(), await world.Another("Cyril", MembershipKind.Coordinator));
        using var visitor = await world.As(cora);
        await visitor.Opens($"{await world.MembershipOf(cyril)}/edit");
        var theirs = await world.MembershipOf(cora);
        using var rival = await world.As(cyril);
        await rival.Opens($"{theirs}/edit");
        rival.Fills("Last day", "2026-03-31");
        site.Rival.ActsBeforeNextSave(() => rival.Presses("Save"));
        await visitor.Fills("Last day", "2026-03-31").Presses("Save");
        Assert.Equal(HttpStatusCode.Conflict, visitor.Status);
        Assert.Equal([cyril.Id], await site.Ask(db => db.People.Where(p => p.Memberships.Any(m => m.ProgrammeId == world.Programme.Id && m.Kind == MembershipKind.Coordinator && m.LastDay == null)).Select(p => p.Id).ToListAsync()));
        await rival.Opens($"{await world.MembershipOf(cyril)}/edit");
        Assert.Equal("Nobody changes their own memberships.", rival.Page.QuerySelector(".why-not")!.TextContent);
        using var ada = await world.As(await world.Administrator());
        await ada.Opens($"{await world.MembershipOf(cyril)}/edit");
        await ada.Fills("Last day", "2026-03-31").Presses("Save");
        Assert.Equal(HttpStatusCode.Conflict, ada.Status);
        Assert.Contains("The last coordinator stays: make somebody else one first, who has chosen a password.", ada.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Who_must_not_edit_sees_why_or_nothing()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        var page = await world.MembershipOf(world.Trainee);
        using var director = await world.As(world.Director);
        Assert.Equal("Only this programme's coordinator edits its people.", (await director.Opens($"{page}/edit")).Page.QuerySelector(".why-not")!.TextContent);
        director.Page.QuerySelector("form.stack")!.InnerHtml += "<button>Save</button>";
        Assert.Equal(HttpStatusCode.Conflict, (await director.Fills("Year group", "year 9").Presses("Save")).Status);
        foreach (var person in new[] { world.Trainee, world.Reader, await other.Coordinator() })
        {
            using var visitor = await world.As(person);
            foreach (var url in new[] { world.People(), page, $"{page}/edit", $"{world.People()}/new", $"{page}/invitations/new", $"{page}/leaves/new" }) Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens(url)).Status);
        }
        Assert.Equal("year 2", await site.Ask(db => db.People.Where(p => p.Id == world.Trainee.Id).SelectMany(p => p.Memberships).Select(m => m.YearGroup).SingleAsync()));
    }

    [Theory]
    [InlineData("", 5)]
    [InlineData("/new", 4)]
    public async Task The_pages_ask_few_questions_however_many_people(string path, int budget)
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        Assert.Equal(budget, (await site.Queries.During(() => cora.Opens(world.People() + path))).Count);
        for (var more = 0; more < 3; more++) await world.Another($"Reader {more}", MembershipKind.Reader, MembershipKind.Chair);
        Assert.Equal(budget, (await site.Queries.During(() => cora.Opens(world.People() + path))).Count);
    }

    [Fact]
    public async Task The_list_shows_a_kind_or_those_whose_time_is_over()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"{world.People()}?kind=Reader");
        Assert.Equal([world.Reader.Name], cora.Page.QuerySelectorAll("th a").Select(a => a.TextContent));
        await cora.Opens($"{await world.MembershipOf(world.Reader)}/edit");
        await cora.Fills("First day", "2026-01-01").Fills("Last day", "2026-02-01").Presses("Save");
        Assert.Contains("It is over.", cora.Text, StringComparison.Ordinal);
        await cora.Opens($"{world.People()}?over=true");
        Assert.Equal([world.Reader.Name], cora.Page.QuerySelectorAll("th a").Select(a => a.TextContent));
    }
}
