namespace Credtrack.Web.Tests.Features.Administrators;

public sealed class AdministratorsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task One_appoints_another_who_chooses_a_password_and_is_one()
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        await ada.Opens("/administrators/new");
        await ada.Fills("Name", "Bea Second").Fills("E-mail address", $"bea.{world.Reader.Id}@tests.example").Chooses("How the link to choose a password gets there", "Shown to me once, to hand over").Presses("Appoint");
        var link = ada.Page.QuerySelector("code.key")!.TextContent;
        using var bea = site.Visitor();
        await bea.Opens(new Uri(link).PathAndQuery);
        await bea.Chooses(Staffing.NewPassword);
        await bea.SignsInWith($"bea.{world.Reader.Id}@tests.example", Staffing.NewPassword);
        await bea.Opens("/administrators");
        Assert.Contains("Bea Second", bea.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Somebody_who_is_here_already_is_appointed_by_the_address_and_keeps_name_and_password()
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        await Appoints();
        Assert.Equal("/administrators", ada.Url);
        Assert.Contains(world.Reader.Name, ada.Text, StringComparison.Ordinal);
        await Appoints();
        Assert.Equal([$"{world.Reader.Name} is an administrator already."], ada.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));

        async Task Appoints()
        {
            await ada.Opens("/administrators/new");
            await ada.Fills("Name", "Another name").Fills("E-mail address", World.AddressOf(world.Reader)).Presses("Appoint");
        }
    }

    [Fact]
    public async Task An_administrator_sees_no_scans_and_nobody_else_sees_administrators()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        using var ada = await world.As(await world.Administrator());
        foreach (var url in new[] { "/scans", $"/scans/{scan.Id}", $"/scans/{scan.Id}/pictures/{scan.Pictures[0].Id}", "/standings", $"/standings/{world.Trainee.Id}", "/readings", "/grants" })
            Assert.Equal(HttpStatusCode.NotFound, (await ada.Opens(url)).Status);
        foreach (var person in new[] { world.Trainee, world.Reader, world.Director, await world.Coordinator() })
        {
            using var visitor = await world.As(person);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens("/administrators")).Status);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens("/administrators/new")).Status);
        }
    }

    [Fact]
    public async Task The_list_is_asked_for_in_four_questions()
    {
        var world = await site.NewWorld();
        using var ada = await world.As(await world.Administrator());
        Assert.Equal(4, (await site.Queries.During(() => ada.Opens("/administrators"))).Count);
    }
}
