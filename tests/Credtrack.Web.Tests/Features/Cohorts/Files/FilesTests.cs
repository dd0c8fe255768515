using System.Text;
using Credtrack.Web.Commands;

namespace Credtrack.Web.Tests.Features.Cohorts.Files;

public sealed class FilesTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task The_file_has_a_row_for_each_trainee_and_application_as_the_sheet_has_them()
    {
        var world = await site.NewWorld();
        var tess = await world.Trainee("=1+1|Tess", "year 3");
        for (var n = 0; n < 4; n++) await world.For(tess).Read();
        await world.Waiting(world.Entry("lung"));
        using var director = await world.As(world.Director);
        await director.Opens(world.Sheet());
        var link = director.Page.QuerySelectorAll("main a").Single(a => a.TextContent == "Take as CSV").GetAttribute("href")!;
        await director.Opens(link);
        Assert.Equal(("text/csv", "utf-8", "cohort-2026-03-01.csv"), (director.Response.Content.Headers.ContentType!.MediaType, director.Response.Content.Headers.ContentType.CharSet, director.Response.Content.Headers.ContentDisposition!.FileName));
        var bytes = await director.Response.Content.ReadAsByteArrayAsync();
        Assert.Equal([0xEF, 0xBB, 0xBF], bytes[..3]);
        Assert.Equal(
        [
            "\"trainee\",\"year\",\"application\",\"counted\",\"required\",\"missing\",\"pending\",\"met\",\"last_counting_day\"",
            $"\"'{tess.Name}\",\"year 3\",\"cardiac\",4,3,0,0,yes,2026-03-01",
            $"\"'{tess.Name}\",\"year 3\",\"lung\",0,2,2,0,no,",
            $"\"{world.Trainee.Name}\",\"year 2\",\"cardiac\",0,3,3,0,no,",
            $"\"{world.Trainee.Name}\",\"year 2\",\"lung\",0,2,2,1,no,", "",
        ], Encoding.UTF8.GetString(bytes[3..]).Split("\r\n"));
    }

    [Fact]
    public async Task It_keeps_to_the_trainees_of_the_sheet_and_to_its_budget_of_queries()
    {
        var world = await site.NewWorld();
        await world.Trainee("Tess", "year 3");
        await world.Trainee("Lena", "year 3", new(2026, 1, 1), new(2026, 2, 10));
        using var director = await world.As(world.Director);
        var few = await site.Queries.During(() => director.Opens(world.File("&year=year 3")));
        Assert.Equal(["year 3", "year 3"], (await Table(director)).Select(r => r["year"]));
        await world.Many(70, "year 3");
        var many = await site.Queries.During(() => director.Opens(world.File("&year=year 3&former=true")));
        Assert.Equal(2 * 72, (await Table(director)).Count);
        Assert.True(few.Count == many.Count && many.Count <= 7, $"{few.Count} and {many.Count} queries:\n{string.Join("\n\n", many)}");
    }

    private static async Task<List<CsvRow>> Table(Visitor visitor)
    {
        var table = CsvTable.Read(await visitor.Response.Content.ReadAsStringAsync(), ["trainee", "application"]);
        Assert.Empty(table.Faults);
        return table.Rows;
    }
}
