using AngleSharp.Dom;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Readings;

/// <summary>Until a reader has read a scan, nothing open to that reader shows its trainee's answers or an earlier reading.</summary>
public sealed class BlindnessTests(RunningSite site) : IClassFixture<RunningSite>
{
    // A view that the trainee marked alone, and words that stand only in a trainee's note, answers or a reading.
    private static readonly string[] Telling = [World.Secret, "false negative", "true positive", "image quality 2", "quality 2 of 5", "result FN", "read the scan"];

    [Fact]
    public async Task A_reader_who_visits_every_page_learns_nothing_of_what_is_still_to_be_read()
    {
        var world = await site.NewWorld();
        var waiting = await world.Waiting();
        var other = await world.Another("Rhea", MembershipKind.Reader);
        var read = await ReadByAnother(world, other);
        await ReturnedByAnother(world, other);
        using var reader = await world.As(world.Reader);
        var pages = await Visit(reader);
        Assert.Contains($"/scans/{waiting.Id}", pages.Keys);
        Assert.Contains($"/scans/{read.Id}", pages.Keys);
        Assert.Contains($"/standings/{world.Trainee.Id}", pages.Keys.Select(k => k.Split('?')[0]));
        foreach (var (url, html) in pages)
            Assert.All(Telling, word => Assert.False(html.Contains(word, StringComparison.OrdinalIgnoreCase), $"{url} shows: {word}"));
        Assert.All([$"/scans/{waiting.Id}", $"/scans/{read.Id}", $"/scans/{waiting.Id}/readings/new"], url =>
        {
            Assert.DoesNotContain(world.Trainee.Name, pages[url], StringComparison.Ordinal);
            Assert.DoesNotMatch("<input[^>]*checked[^>]*Form.(Answers|Views)|<input[^>]*Form.(Answers|Views)[^>]*checked", pages[url]);
        });
    }

    [Fact]
    public async Task In_the_standing_a_read_scan_says_only_that_it_is_read()
    {
        var world = await site.NewWorld();
        await ReadByAnother(world, await world.Another("Rhea", MembershipKind.Reader));
        using var reader = await world.As(world.Reader);
        await reader.Opens($"/standings/{world.Trainee.Id}");
        var line = Assert.Single(reader.Page.QuerySelectorAll(".scans li"));
        Assert.Equal("read", line.QuerySelector(".state span")!.TextContent);
        Assert.Equal("open to you once you have read it", line.QuerySelector(".why")!.TextContent);
    }

    [Fact]
    public async Task A_director_who_also_reads_is_blind_while_the_scan_waits_and_sees_it_once_it_is_read()
    {
        var world = await site.NewWorld();
        var both = await world.Another("Dee", MembershipKind.Director, MembershipKind.Reader);
        var waiting = await world.Waiting();
        var read = await world.Read();
        using var director = await world.As(both);
        Assert.DoesNotContain(World.Secret, (await director.Opens($"/scans/{waiting.Id}")).Text, StringComparison.Ordinal);
        Assert.Contains(World.Secret, (await director.Opens($"/scans/{read.Id}")).Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Once_read_the_reader_sees_both_sets_of_answers()
    {
        var world = await site.NewWorld();
        var read = await world.Read();
        using var reader = await world.As(world.Reader);
        await reader.Opens($"/scans/{read.Id}");
        Assert.Contains("Both sets of answers", reader.Text, StringComparison.Ordinal);
        Assert.Contains(world.Trainee.Name, reader.Text, StringComparison.Ordinal);
    }

    private async Task<Scan> ReadByAnother(World world, Person other)
    {
        var scan = await world.Waiting();
        await site.Ask(async db =>
        {
            var answers = world.Cardiac.Questions.ToDictionary(q => q.Code, _ => Credtrack.Core.Catalogue.Answer.Yes);
            (await db.Scans.SingleAsync(s => s.Id == scan.Id)).Read(other, world.Judgement(2) with { Answers = answers }, world.Now);
            return await db.SaveChangesAsync();
        });
        return scan;
    }

    private async Task ReturnedByAnother(World world, Person other)
    {
        var scan = await world.Waiting();
        await site.Ask(async db =>
        {
            (await db.Scans.SingleAsync(s => s.Id == scan.Id)).SendBack(other, $"The apical view. {World.Secret}", world.Now);
            return await db.SaveChangesAsync();
        });
    }

    private static async Task<Dictionary<string, string>> Visit(Visitor reader)
    {
        var (pages, todo) = (new Dictionary<string, string>(), new Queue<string>(["/", "/scans", "/readings", "/standings"]));
        while (todo.TryDequeue(out var url))
        {
            if (pages.ContainsKey(url) || url.Contains("sign-", StringComparison.Ordinal)) continue;
            await reader.Opens(url);
            Assert.Equal(HttpStatusCode.OK, reader.Status);
            pages[url] = await reader.Response.Content.ReadAsStringAsync();
            foreach (var link in reader.Page.QuerySelectorAll("a[href^='/']").Select(a => a.GetAttribute("href")!.Split('#')[0])) todo.Enqueue(link);
        }
        return pages;
    }
}
