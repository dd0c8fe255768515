using Credtrack.Core.Catalogue;

namespace Credtrack.Web.Tests.Features.Cohorts;

public sealed class CohortsTests(RunningSite site) : IClassFixture<RunningSite>
{
    private static readonly DateOnly NewYear = new(2026, 1, 1);

    [Fact]
    public async Task Each_trainee_stands_beside_each_application_with_what_is_missing()
    {
        var world = await site.NewWorld();
        var tess = await world.Trainee("Tess", "year 3");
        await world.Read();
        for (var n = 0; n < 4; n++) await world.For(tess).Read();
        await world.For(tess).Waiting(world.Entry("lung"));
        using var director = await world.As(world.Director);
        await director.Opens(world.Sheet());
        Assert.Contains("2 trainees, 2 applications, on Sun 1 Mar 2026. The number in a cell is what is still missing.", director.Text, StringComparison.Ordinal);
        Assert.Equal([tess.Name, world.Trainee.Name], director.Names());
        Assert.Equal(["year 3", "met +1", "2", "1 of 2"], director.Row(tess));
        Assert.Equal(["year 2", "2", "2", "0 of 2"], director.Row(world.Trainee));
        Assert.Contains("Lung: 0 of 2, 2 missing, 1 waits", director.Text, StringComparison.Ordinal);
        Assert.Equal(["Met, of 2", "1", "0", "1", "Missing in all", "2", "4", "6"], director.Page.QuerySelectorAll(".sheet tfoot :is(th, td)").Select(Cohorting.Words));
    }

    [Fact]
    public async Task The_numbers_are_those_of_the_standing_to_which_a_cell_leads()
    {
        var world = await site.NewWorld();
        var tess = await world.Trainee("Tess", "year 3");
        foreach (var quality in new[] { 4, 2, 5 }) await world.Read(quality, world.Entry(at: world.Now.AddDays(-3)));
        await world.Waiting(world.Entry("lung"));
        for (var n = 0; n < 3; n++) await world.For(tess).Read();
        await world.For(tess).Read(4, Answer.No, "lung");
        foreach (var day in new[] { "", "&asOf=2026-02-27", "&asOf=2026-05-01" })
        {
            using var reader = await world.As(world.Reader);
            await reader.Opens(world.Sheet(day));
            var cells = reader.Page.QuerySelectorAll(".sheet tbody td a").Select(a => (Said: Cohorting.Words(a.QuerySelector(".unseen")!), Url: a.GetAttribute("href")!)).ToList();
            Assert.Equal(day == "&asOf=2026-02-27" ? 0 : 4, cells.Count);
            foreach (var (said, url) in cells)
            {
                await reader.Opens(url);
                Assert.Equal(HttpStatusCode.OK, reader.Status);
                var row = Assert.Single(reader.Page.QuerySelectorAll("section[aria-labelledby=h-twin] tbody tr"), r => said.StartsWith($"{r.Children[0].TextContent}:", StringComparison.Ordinal));
                Assert.StartsWith($"{row.Children[0].TextContent}: {Cohorting.Words(row.Children[2])} of {row.Children[1].TextContent}, ", said, StringComparison.Ordinal);
                if (Cohorting.Words(row.Children[5]) is not "0" and var missing) Assert.Contains($", {missing} missing", said, StringComparison.Ordinal);
                else Assert.Contains(", met", said, StringComparison.Ordinal);
            }
        }
    }

    [Fact]
    public async Task Who_stalls_is_said_with_since_when()
    {
        var world = await site.NewWorld();
        var stella = await world.Trainee("Stella", "year 1", first: NewYear);
        await world.Read();
        using var director = await world.As(world.Director);
        await director.Opens(world.Sheet());
        Assert.Equal((stella.Name, "59 days, none since the first day, Thu 1 Jan 2026 5 scans missing"), Assert.Single(director.Stalled()));
        Assert.Equal("year 1 stalled for 59 days", director.Row(stella)[0]);
        await director.Fills("On", "2026-04-15").Presses("Show this");
        Assert.Contains("Wed 15 Apr 2026, as known today", director.Text, StringComparison.Ordinal);
        Assert.Equal([stella.Name, world.Trainee.Name], director.Stalled().Select(s => s.Who));
        Assert.Equal("45 days, last on Sun 1 Mar 2026 4 scans missing", director.Stalled()[1].Since);
        await director.Fills("Stalls after days", "46").Presses("Show this");
        Assert.Equal([stella.Name], director.Stalled().Select(s => s.Who));
    }

    [Theory]
    [InlineData(false, "24 days, last on Sun 1 Mar 2026 4 scans missing; 21 days of leave left out", "year 2 away until Mon 20 Apr")]
    [InlineData(true, "45 days, last on Sun 1 Mar 2026 4 scans missing", "year 2 stalled for 45 days")]
    public async Task Days_of_leave_do_not_count_against_anybody_unless_the_leave_was_taken_back(bool takenBack, string since, string note)
    {
        var world = await site.NewWorld();
        await world.Read();
        await world.Away(world.Trainee, new(2026, 3, 26), new(2026, 4, 20), takenBack);
        using var director = await world.As(world.Director);
        await director.Opens(world.Sheet("&asOf=2026-04-15&days=20"));
        Assert.Equal(since, Assert.Single(director.Stalled()).Since);
        Assert.Equal(note, director.Row(world.Trainee)[0]);
        Assert.Equal(takenBack ? 1 : 0, (await director.Opens(world.Sheet("&asOf=2026-04-15&days=30"))).Stalled().Count);
    }

    [Fact]
    public async Task Who_has_left_is_on_the_sheet_of_the_days_before_and_otherwise_only_when_asked_for()
    {
        var world = await site.NewWorld();
        var lena = await world.Trainee("Lena", "year 2", NewYear, new(2026, 2, 10));
        using var director = await world.As(world.Director);
        Assert.Equal([world.Trainee.Name], (await director.Opens(world.Sheet())).Names());
        Assert.Contains("1 trainee has left by then", director.Text, StringComparison.Ordinal);
        await director.Opens(world.Sheet("&former=true"));
        Assert.Equal("year 2 left after Tue 10 Feb", director.Row(lena)[0]);
        Assert.Empty(director.Stalled());
        Assert.Equal([lena.Name], (await director.Opens(world.Sheet("&asOf=2026-02-10"))).Names());
    }

    [Fact]
    public async Task A_year_can_be_looked_at_alone_and_ordered_by_what_is_missing()
    {
        var world = await site.NewWorld();
        var (abe, zoe, tess) = (await world.Trainee("Abe", "year 2"), await world.Trainee("Zoe", "year 2"), await world.Trainee("Tess", "year 3"));
        await world.For(abe).Read();
        await world.Read();
        await world.Read();
        using var director = await world.As(world.Director);
        await director.Opens(world.Sheet());
        Assert.Equal([tess.Name, abe.Name, world.Trainee.Name, zoe.Name], director.Names());
        await director.Fills("Year", "year 2").Fills("In a year, by", "Missing").Presses("Show this");
        Assert.Equal([zoe.Name, abe.Name, world.Trainee.Name], director.Names());
        Assert.Equal(["year 2", "Missing"], [director.Typed("Year"), director.Typed("In a year, by")]);
    }

    [Fact]
    public async Task A_sheet_is_there_only_for_those_who_may_see_the_scans_of_the_programme()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        foreach (var person in new[] { world.Trainee, other.Reader, other.Director, await world.Another("Cho", MembershipKind.Chair), await world.Another("Nobody") })
        {
            using var visitor = await world.As(person);
            foreach (var url in new[] { world.Sheet(), world.File() }) Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens(url)).Status);
        }
        foreach (var person in new[] { world.Reader, world.Director, await world.Coordinator() })
        {
            using var visitor = await world.As(person);
            foreach (var url in new[] { "/cohorts", world.Sheet(), world.File() }) Assert.Equal(HttpStatusCode.OK, (await visitor.Opens(url)).Status);
            Assert.NotNull((await visitor.Opens("/")).Page.QuerySelector("nav a[href='/cohorts']"));
        }
    }

    [Theory]
    [InlineData("&asOf=0001-01-01&days=-5&page=0")]
    [InlineData("&asOf=9999-12-31&days=99999&page=99999&year=none")]
    [InlineData("&asOf=nonsense&days=x&order=x&page=x&former=x")]
    public async Task Odd_addresses_are_answered(string odd)
    {
        var world = await site.NewWorld();
        using var director = await world.As(world.Director);
        foreach (var url in new[] { world.Sheet(odd), world.File(odd) }) Assert.Equal(HttpStatusCode.OK, (await director.Opens(url)).Status);
    }

    [Fact]
    public async Task Sixty_stand_on_a_page_and_it_asks_as_many_queries_as_for_one()
    {
        var world = await site.NewWorld();
        using var director = await world.As(world.Director);
        var few = await site.Queries.During(() => director.Opens(world.Sheet()));
        await world.Many(70);
        var many = await site.Queries.During(() => director.Opens(world.Sheet()));
        Assert.Equal(60, director.Names().Count);
        Assert.Contains("71 trainees", director.Text, StringComparison.Ordinal);
        Assert.Contains("The sums are those of the 60 trainees on this page.", director.Text, StringComparison.Ordinal);
        Assert.Equal(11, (await director.Opens(director.Page.QuerySelectorAll("main a").Single(a => a.TextContent == "More trainees").GetAttribute("href")!)).Names().Count);
        Assert.True(few.Count == many.Count && many.Count <= 12, $"{few.Count} and {many.Count} queries:\n{string.Join("\n\n", many)}");
    }
}
