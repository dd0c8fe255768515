namespace Credtrack.Web.Tests.Features.Programmes.Invitations;

public sealed class InvitationsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_list_is_shown_first_and_then_admitted_with_a_letter_for_each()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        var mark = world.Programme.Name[^6..];
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"/programmes/{world.Programme.Id}/invitations/new");
        var list = $"Tom One, tom.{mark}@tests.example, trainee, year 1\n\n\"Rita Two\";rita.{mark}@tests.example;READER\nSomebody\t{World.AddressOf(other.Reader)}\tReader\nTom One, tom.{mark}@tests.example, reader";
        await cora.Fills("The list", list).Presses("Show what it will do");
        Assert.Equal(["1 Tom One is enrolled and gets a link", "3 Rita Two is enrolled and gets a link", $"4 Somebody is {other.Reader.Name} here already, and needs no link", "5 Tom One is enrolled and gets a link"],
            cora.Page.QuerySelectorAll("tbody tr").Select(r => $"{r.Children[0].TextContent} {r.Children[1].TextContent} {r.Children[5].TextContent}"));
        Assert.Equal(0, await site.Ask(db => db.Users.CountAsync(a => a.Email == $"tom.{mark}@tests.example")));

        await cora.Presses("Admit 4 lines now");
        Assert.Equal(world.People(), cora.Url);
        await cora.Opens(world.People());
        Assert.Equal(2, cora.Page.QuerySelectorAll("th a").Count(a => a.TextContent == "Tom One"));
        Assert.Single(await site.Ask(db => db.Users.Where(a => a.Email == $"tom.{mark}@tests.example").ToListAsync()));
        Letters.To(site, $"tom.{mark}@tests.example");
        Letters.To(site, $"rita.{mark}@tests.example");
        Assert.Empty(Letters.AllTo(site, World.AddressOf(other.Reader)));
    }

    [Fact]
    public async Task Every_fault_is_named_by_its_line_and_nothing_of_the_list_is_saved()
    {
        var world = await site.NewWorld();
        var mark = world.Programme.Name[^6..];
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"/programmes/{world.Programme.Id}/invitations/new");
        var list = $"Tom, tom.{mark}@tests.example, trainee, year 1\nX,y\n, a@tests.example, reader\nRita, rita, reader\nRob, rob.{mark}@tests.example, king\nRia, ria.{mark}@tests.example, 1\nDora, dora.{mark}@tests.example, director, year 2\nTom, TOM.{mark}@tests.example, trainee\nRuth, {World.AddressOf(world.Reader)}, reader";
        await cora.Fills("The list", list).Presses("Show what it will do");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, cora.Status);
        const string kinds = "write trainee, reader, director, coordinator, chair.";
        Assert.Equal(
        [
            "Line 2: Expected three or four cells (name, address, membership, year group), found 2.", "Line 3: The name is missing or longer than 120 characters.", "Line 4: “rita” is no e-mail address.",
            $"Line 5: “king” is no membership; {kinds}", $"Line 6: “1” is no membership; {kinds}", "Line 7: Only trainees have a year group.",
            $"Line 8: TOM.{mark}@tests.example stands in line 1 already, as a Trainee.", $"Line 9: {world.Reader.Name} is already a Reader of {world.Programme.Name}.",
        ], cora.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));
        Assert.Equal(list, cora.Typed("The list").ReplaceLineEndings("\n"));
        Assert.Equal(0, await site.Ask(db => db.Users.CountAsync(a => a.Email!.EndsWith(mark + "@tests.example") && a.Email!.StartsWith("tom"))));
    }

    [Fact]
    public async Task A_list_changed_after_it_was_shown_is_shown_again_and_a_long_one_is_refused()
    {
        var world = await site.NewWorld();
        var mark = world.Programme.Name[^6..];
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"/programmes/{world.Programme.Id}/invitations/new");
        await cora.Fills("The list", $"Tom, tom.{mark}@tests.example, trainee").Presses("Show what it will do");
        await cora.Fills("The list", $"Tom, tom.{mark}@tests.example, director").Presses("Admit 1 line now");
        Assert.Contains("Director", cora.Page.QuerySelector("tbody")!.TextContent, StringComparison.Ordinal);
        Assert.Equal(0, await site.Ask(db => db.Users.CountAsync(a => a.Email == $"tom.{mark}@tests.example")));
        await cora.Fills("The list", string.Join('\n', Enumerable.Range(0, 201).Select(n => $"Tom {n}, tom.{n}.{mark}@tests.example, trainee"))).Presses("Admit 1 line now");
        Assert.Equal(["Line 201: A list has 200 lines at most. Paste the rest as another list."], cora.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));
    }

    [Fact]
    public async Task Only_the_programmes_coordinator_finds_the_form()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        foreach (var person in new[] { world.Director, world.Reader, world.Trainee, await other.Coordinator() })
        {
            using var visitor = await world.As(person);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/programmes/{world.Programme.Id}/invitations/new")).Status);
        }
    }
}
