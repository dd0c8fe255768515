using AngleSharp.Dom;
namespace Credtrack.Web.Tests.Features.Imports.Mappings;

public sealed class MappingsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_file_of_another_kind_is_explained_once_and_remembered()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Uploads($"No;Resident;Exam;Date performed;Teaching?\n1;{world.Trainee.Name.ToUpperInvariant()};FAST;03/02/2026;x\n2;Newcomer One;Cardiac;04/01/2026 14:05;-\n");
        Assert.Equal(("No", "Resident", "Exam", "Date performed"), (cora.Typed("Id of the scan (needed)"), cora.Typed("Trainee (needed)"), cora.Typed("Application (needed)"), cora.Typed("Performed at (needed)")));
        await cora.Fills("Setting", "Teaching?").Presses("Look again with these columns");
        await cora.Presses(Importing.GoOn);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, cora.Status);
        Assert.Equal(["Choose how dates run: “03/02/2026” can be read in two ways.", "Say what “FAST” means under “Application”.", "Say what “x” means under “Setting”.", "Say what “-” means under “Setting”."], cora.Told());
        await cora.Fills("How dates run", "DayFirst").Fills("“FAST” under Application", "efast").Fills("“x” under Setting", "education").Fills("“-” under Setting", "(nothing)").Presses(Importing.GoOn);
        Assert.Equal(["2 1 efast Tue 3 Feb 2026", "3 2 cardiac Sun 4 Jan 2026"], cora.Page.QuerySelectorAll("tbody tr").Select(r => $"{r.Children[0].TextContent} {r.Children[1].TextContent} {r.Children[3].TextContent} {r.Children[4].TextContent}"));
        Assert.Contains("1 person enrolled as a trainee without sign-in: Newcomer One.", cora.Text, StringComparison.Ordinal);
        await cora.Ticks("9 missing cells may take the usual values").Presses("Import 2 scans now");
        Assert.Equal((1, 2), (await world.Evidence(world.Trainee), await world.Evidence()));

        // The next file needs no words: neither the date, nor the word, nor the person is asked again.
        await cora.Uploads("No;Resident;Exam;Date performed;Teaching?\n3;Newcomer One;FAST;05/02/2026;x\n");
        await cora.Presses(Importing.GoOn);
        Assert.Equal("3 efast Thu 5 Feb 2026", string.Join(' ', cora.Page.QuerySelectorAll("tbody tr").Single().Children.Skip(1).Take(4).Where((_, n) => n != 1).Select(c => c.TextContent)));
        Assert.DoesNotContain("enrolled", cora.Page.QuerySelector("#plan")!.Closest("section")!.TextContent, StringComparison.Ordinal);
        Assert.Equal(1, await site.Ask(db => db.People.CountAsync(p => p.Name == "Newcomer One")));
    }

    [Fact]
    public async Task Two_of_one_name_are_asked_for_and_rows_can_be_left_out()
    {
        var world = await site.NewWorld();
        var (one, two) = (await world.Another("Sam", MembershipKind.Trainee), await world.Another("Sammy", MembershipKind.Trainee));
        await site.Ask(async db =>
        {
            (await db.People.SingleAsync(p => p.Id == two.Id)).Rename(world.Director, one.Name, world.Now);
            return await db.SaveChangesAsync();
        });
        using var cora = await world.As(await world.Coordinator());
        await cora.Uploads(Importing.Table(world.Row("1", one.Name), world.Row("2", "Visitor Zed")));
        await cora.Presses(Importing.GoOn);
        Assert.Equal([$"Say who “{one.Name}” is: 2 trainees are called so."], cora.Told());
        await cora.Fills($"{one.Name} is", $"{two.Id}").Fills("Visitor Zed is", "out").Presses(Importing.GoOn);
        Assert.Contains("1 row left out, as chosen.", cora.Text, StringComparison.Ordinal);
        await cora.Presses("Import 1 scan now");
        Assert.Equal((0, 1), (await world.Evidence(one), await world.Evidence(two)));
        Assert.False(await site.Ask(db => db.People.AnyAsync(p => p.Name == "Visitor Zed")));
    }

    [Fact]
    public async Task A_needed_column_without_a_choice_and_one_chosen_twice_are_said()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Uploads($"Key,Resident,Exam,Date\n1,{world.Trainee.Name},cardiac,2026-01-01\n");
        await cora.Fills("Part", "Exam").Presses(Importing.GoOn);
        Assert.Equal(["Say which column holds “Id of the scan”.", "The column “Exam” is chosen for 2 fields; choose it once."], cora.Told().Take(2));
        Assert.Equal("Resident", cora.Typed("Trainee (needed)"));
    }
}
