namespace Credtrack.Web.Tests.Features.Grants;

public sealed class GrantsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_director_proposes_from_a_standing_and_finds_it_on_the_desk()
    {
        var world = await site.NewWorld();
        using var director = await world.As(world.Director);
        await director.Opens($"/standings/{world.Trainee.Id}");
        await director.Opens(director.Page.QuerySelector("a[href*='/grants/new'][href*='cardiac']")!.GetAttribute("href")!);
        await director.Fills("What is allowed", Granting.Privilege).Presses("Propose it");
        Assert.Contains("Proposed", director.Text, StringComparison.Ordinal);
        await director.Opens("/grants");
        Assert.Contains("1 proposal waits for your signature.", director.Text, StringComparison.Ordinal);
        Assert.Contains(Granting.Privilege, director.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_empty_privilege_is_asked_for_and_a_second_proposal_is_answered_with_the_reason()
    {
        var world = await site.NewWorld();
        using var director = await world.As(world.Director);
        var url = $"/grants/new?holder={world.Trainee.Id}&programme={world.Programme.Id}&application=cardiac";
        await director.Opens(url);
        await director.Fills("What is allowed", " ").Presses("Propose it");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, director.Status);
        Assert.Contains("Say what is allowed.", director.Text, StringComparison.Ordinal);
        await world.Proposed();
        Assert.Equal("A grant of this application is already proposed.", (await director.Opens(url)).Page.QuerySelector(".why-not")!.TextContent);
    }

    [Fact]
    public async Task Of_two_who_propose_at_once_the_slower_one_is_told_and_there_is_one_proposal()
    {
        var world = await site.NewWorld();
        using var director = await world.As(await world.Another("Dee", MembershipKind.Director));
        await director.Opens($"/grants/new?holder={world.Trainee.Id}&programme={world.Programme.Id}&application=cardiac");
        site.Rival.ActsBeforeNextSave(() => world.Proposed());
        await director.Fills("What is allowed", "My own words").Presses("Propose it");
        Assert.Equal(HttpStatusCode.Conflict, director.Status);
        Assert.Equal("A grant of this application is already proposed.", director.Page.QuerySelector(".why-not")!.TextContent);
        Assert.Equal("My own words", director.Typed("What is allowed"));
        Assert.Equal(world.Director.Id, (await site.Ask(db => db.Grants.AsNoTracking().SingleAsync(g => g.HolderId == world.Trainee.Id))).ProposedById);
    }

    [Fact]
    public async Task The_database_itself_lets_one_open_grant_in_and_any_number_that_are_over()
    {
        var world = await site.NewWorld();
        for (var n = 0; n < 2; n++) await world.End((await world.Signed()).Grant);
        await world.Proposed();
        var lost = await Assert.ThrowsAnyAsync<DbUpdateException>(() => world.Proposed());
        Assert.Contains("UNIQUE", lost.InnerException!.Message, StringComparison.Ordinal);
        Assert.Equal(3, await site.Ask(db => db.Grants.CountAsync(g => g.HolderId == world.Trainee.Id)));
    }

    [Fact]
    public async Task Only_a_director_of_the_programme_comes_to_the_desk()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        var id = await world.Proposed();
        foreach (var person in new[] { world.Reader, other.Director, other.Trainee })
        {
            using var visitor = await world.As(person);
            foreach (var url in new[] { $"/grants/{id}", $"/grants/{id}/signatures/new", $"/grants/{id}/endings/new", $"/grants/new?holder={world.Trainee.Id}&programme={world.Programme.Id}&application=cardiac" })
                Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens(url)).Status);
            Assert.DoesNotContain(Granting.Privilege, (await visitor.Opens("/grants")).Text, StringComparison.Ordinal);
        }
        using var holder = await world.As(world.Trainee);
        Assert.Equal(HttpStatusCode.OK, (await holder.Opens($"/grants/{id}")).Status);
        Assert.Equal(HttpStatusCode.NotFound, (await holder.Opens($"/grants/{id}/signatures/new")).Status);
    }

    [Fact]
    public async Task A_grant_reads_its_ledger_aloud_and_the_holder_finds_the_paper()
    {
        var world = await site.NewWorld();
        var (id, document) = await world.Signed();
        using var holder = await world.As(world.Trainee);
        await holder.Opens($"/grants/{id}");
        Assert.Equal(3, holder.Page.QuerySelectorAll(".history li").Length);
        Assert.Contains($"{world.Director.Name} signed (Granted) the grant of {Granting.Privilege}", holder.Text, StringComparison.Ordinal);
        Assert.Contains("Trained elsewhere before.", holder.Text, StringComparison.Ordinal);
        await holder.Opens($"/standings/{world.Trainee.Id}");
        Assert.NotNull(holder.Page.QuerySelector($"a[href='/documents/{document.Id}']"));
    }

    [Fact]
    public async Task What_is_to_be_done_comes_first_however_old_it_is_and_the_words_count_all_pages()
    {
        var world = await site.NewWorld();
        var id = await world.Proposed();
        var active = (await world.Signed(await world.Another("Tess", MembershipKind.Trainee))).Grant;
        for (var n = 0; n < 51; n++) await world.Declined(await world.Another($"T{n}", MembershipKind.Trainee));
        using var director = await world.As(world.Director);
        var asked = await site.Queries.During(() => director.Opens("/grants"));
        Assert.True(asked.Count <= 6, string.Join("\n\n", asked));
        Assert.Contains("1 proposal waits for your signature. 1 grant stands.", director.Text, StringComparison.Ordinal);
        Assert.Equal([$"/grants/{id}", $"/grants/{active}"], Holders(director).Take(2));
        Assert.Equal(50, Holders(director).Count);
        await director.Opens(director.Page.QuerySelectorAll("a").Single(a => a.TextContent == "More of them").GetAttribute("href")!);
        Assert.Contains("1 proposal waits for your signature. 1 grant stands.", director.Text, StringComparison.Ordinal);
        Assert.Equal(3, Holders(director).Count);
        using var holder = await world.As(world.Trainee);
        Assert.StartsWith("Sign-off desk 0 grants stand. Proposed", (await holder.Opens("/grants")).Text, StringComparison.Ordinal);

        static List<string?> Holders(Visitor visitor) => [.. visitor.Page.QuerySelectorAll("a.who").Select(a => a.GetAttribute("href"))];
    }

    [Theory]
    [InlineData("/grants", 6)]
    [InlineData("/grants/{0}", 4)]
    [InlineData("/grants/{0}/signatures/new", 9)]
    public async Task A_page_keeps_to_its_budget_of_queries(string url, int budget)
    {
        var world = await site.NewWorld();
        for (var more = 0; more < 5; more++) await world.Read();
        var id = await world.Proposed();
        using var director = await world.As(world.Director);
        var asked = await site.Queries.During(() => director.Opens(string.Format(null, url, id)));
        Assert.Equal(HttpStatusCode.OK, director.Status);
        Assert.True(asked.Count <= budget, $"{asked.Count} queries:\n{string.Join("\n\n", asked)}");
    }
}
