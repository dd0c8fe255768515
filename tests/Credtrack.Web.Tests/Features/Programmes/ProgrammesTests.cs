namespace Credtrack.Web.Tests.Features.Programmes;

public sealed class ProgrammesTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task An_administrator_founds_one_with_its_coordinator_who_is_handed_a_link()
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        var (name, address) = ($"Obstetrics {world.Programme.Name}", $"cora.{world.Programme.Id}@tests.example");
        await ada.Opens("/programmes/new");
        await ada.Fills("Name of the programme", name).Fills("Name of its coordinator", "Cora New").Fills("E-mail address of the coordinator", address)
            .Chooses("How the link to choose a password gets there", "Shown to me once, to hand over").Presses("Found it");
        using var cora = site.Visitor();
        await cora.Opens(new Uri(ada.Page.QuerySelector("code.key")!.TextContent).PathAndQuery);
        await cora.Chooses(Staffing.NewPassword);
        await cora.SignsInWith(address, Staffing.NewPassword);
        await cora.Opens("/programmes");
        Assert.Equal([name], cora.Page.QuerySelectorAll("a.who").Select(a => a.TextContent));
        Assert.Equal(HttpStatusCode.OK, (await cora.Opens(cora.Page.QuerySelector("a.who")!.GetAttribute("href")!)).Status);
    }

    [Fact]
    public async Task Without_a_mail_server_the_letter_lies_in_the_folder_and_its_link_works()
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        var address = $"cora.mail.{world.Programme.Id}@tests.example";
        await ada.Opens("/programmes/new");
        await ada.Fills("Name of the programme", $"Surgery {world.Programme.Name}").Fills("Name of its coordinator", "Cora Post").Fills("E-mail address of the coordinator", address).Presses("Found it");
        Assert.EndsWith("/memberships", ada.Url, StringComparison.Ordinal);
        var letter = Letters.To(site, address);
        Assert.Equal($"Credtrack at Test site: choose your password", letter.Subject);
        using var cora = site.Visitor();
        await cora.Opens(Letters.LinkIn(letter));
        Assert.Contains("For Cora Post", cora.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_is_missing_or_taken_is_said_and_nothing_is_saved()
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        await ada.Opens("/programmes/new");
        await ada.Fills("Name of the programme", world.Programme.Name).Fills("Name of its coordinator", "").Fills("E-mail address of the coordinator", "cora at home").Presses("Found it");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, ada.Status);
        Assert.Equal(["Another programme has this name already.", "Name the coordinator; it may be yourself.", "Write the address like name@hospital.example."],
            ada.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent).Order());
        Assert.Equal("cora at home", ada.Typed("E-mail address of the coordinator"));
    }

    [Fact]
    public async Task A_programme_is_renamed_by_an_administrator_and_the_old_name_is_told()
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        await ada.Opens($"/programmes/{world.Programme.Id}/edit");
        await ada.Fills("Name of the programme", $"New {world.Programme.Name}").Presses("Rename it");
        Assert.Equal("/programmes", ada.Url);
        Assert.EndsWith($"renamed the programme {world.Programme.Name} to New {world.Programme.Name}.", (await world.Facts(world.Programme.Id))[^1], StringComparison.Ordinal);
    }

    [Fact]
    public async Task Others_see_their_own_programmes_only_and_found_or_rename_none()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        foreach (var (person, seen) in new[] { (world.Trainee, 0), (world.Reader, 0), (world.Director, 1), (await world.Coordinator(), 1) })
        {
            using var visitor = await world.As(person);
            await visitor.Opens("/programmes");
            Assert.Equal(seen, visitor.Page.QuerySelectorAll("a.who").Length);
            Assert.DoesNotContain(other.Programme.Name, visitor.Text, StringComparison.Ordinal);
            foreach (var url in new[] { "/programmes/new", $"/programmes/{world.Programme.Id}/edit" }) Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens(url)).Status);
        }
    }

    [Fact]
    public async Task However_many_there_are_six_questions_suffice()
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        Assert.Equal(6, (await site.Queries.During(() => ada.Opens("/programmes"))).Count);
        await site.NewWorld();
        Assert.Equal(6, (await site.Queries.During(() => ada.Opens("/programmes"))).Count);
    }
}
