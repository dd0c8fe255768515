using System.Text;
using Credtrack.Core.Scans;
using SkiaSharp;

namespace Credtrack.Web.Tests.Features.Scans.Pictures;

public sealed class PicturesTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_picture_is_served_as_a_jpeg_that_nobody_keeps_and_that_runs_nothing()
    {
        var world = await site.NewWorld();
        using var trainee = await world.Completes();
        await trainee.Presses(Logging.Submit);
        await trainee.Opens(trainee.Page.QuerySelector(".stills img")!.GetAttribute("src")!);
        var (headers, content) = (trainee.Response.Headers, trainee.Response.Content);
        Assert.Equal((HttpStatusCode.OK, "image/jpeg"), (trainee.Status, content.Headers.ContentType!.MediaType));
        Assert.Equal("nosniff", Assert.Single(headers.GetValues("X-Content-Type-Options")));
        Assert.Equal("default-src 'none'; sandbox", Assert.Single(headers.GetValues("Content-Security-Policy")));
        Assert.Equal("same-origin", Assert.Single(headers.GetValues("Cross-Origin-Resource-Policy")));
        Assert.True(headers.CacheControl is { NoStore: true, Private: true });
        Assert.Null(content.Headers.ContentDisposition);
        using var pixels = SKBitmap.Decode(await content.ReadAsByteArrayAsync());
        Assert.Equal((320, 240, 60), (pixels.Width, pixels.Height, (int)pixels.GetPixel(160, 120).Red));
    }

    [Fact]
    public async Task A_picture_is_served_only_to_who_may_see_its_scan()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        var scan = await world.Waiting();
        var url = $"/scans/{scan.Id}/pictures/{scan.Pictures[0].Id}";
        foreach (var person in new[] { world.Trainee, world.Reader, world.Director }) Assert.Equal(HttpStatusCode.OK, await Status(person, url));
        foreach (var person in new[] { await world.Another("Tess", MembershipKind.Trainee), await world.Another("Olga", MembershipKind.Chair), other.Trainee, other.Reader, other.Director })
            Assert.Equal(HttpStatusCode.NotFound, await Status(person, url));
        using var stranger = site.Visitor();
        Assert.StartsWith("/sign-in", (await stranger.Opens(url)).Url, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_picture_is_found_only_through_its_own_scan()
    {
        var world = await site.NewWorld();
        var (scan, another) = (await world.Waiting(), await world.Waiting());
        Assert.Equal(HttpStatusCode.NotFound, await Status(world.Trainee, $"/scans/{another.Id}/pictures/{scan.Pictures[0].Id}"));
        Assert.Equal(HttpStatusCode.NotFound, await Status(world.Trainee, $"/scans/{scan.Id}/pictures/{scan.Id}"));
        Assert.Equal(HttpStatusCode.NotFound, await Status(world.Trainee, $"/scans/{scan.Id}/pictures/{scan.Pictures[0].Sha256}"));
    }

    [Fact]
    public async Task A_removed_picture_is_served_no_more_and_the_fact_stays()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        await trainee.Ticks("Remove picture 1").Attaches(Logging.Attach, Stills.Png(120)).Ticks(Logging.Confirm).Presses("Keep the changes");
        Assert.Contains("removed picture 1.", trainee.Text, StringComparison.Ordinal);
        Assert.Contains("attached picture 2 and confirmed that no patient is named in it.", trainee.Text, StringComparison.Ordinal);
        foreach (var person in new[] { world.Trainee, world.Reader }) Assert.Equal(HttpStatusCode.NotFound, await Status(person, $"/scans/{scan.Id}/pictures/{scan.Pictures[0].Id}"));
        Assert.Equal("Picture 2 of the scan", Assert.Single(trainee.Page.QuerySelectorAll(".stills img")).GetAttribute("alt"));
    }

    [Fact]
    public async Task The_name_of_a_file_is_kept_nowhere()
    {
        var world = await site.NewWorld();
        using var trainee = await (await world.Starts()).Attaches(Logging.Attach, Stills.Png(10), [1, 2, 3]).Presses(Logging.Submit);
        Assert.DoesNotContain("smith", trainee.Page.DocumentElement.OuterHtml, StringComparison.OrdinalIgnoreCase);
        await trainee.Ticks(Logging.Confirm).Answers("No", Logging.OfCardiac).Presses(Logging.Submit);
        var id = Assert.Single(await site.ScansOf(world.Trainee)).Id;
        foreach (var url in new[] { "", "/edit" }) Assert.DoesNotContain("smith", (await trainee.Opens($"/scans/{id}{url}")).Page.DocumentElement.OuterHtml, StringComparison.OrdinalIgnoreCase);

        var file = await site.Ask(db => Task.FromResult(db.Database.GetDbConnection().DataSource));
        foreach (var part in new[] { file, $"{file}-wal" }.Where(File.Exists)) Assert.False(Holds(part, "smith"), $"{part} holds the name of the file");
        Assert.True(Holds(file, world.Trainee.Name) || Holds($"{file}-wal", world.Trainee.Name)); // so that the search finds what is there
        Assert.DoesNotContain(Directory.EnumerateFiles(site.PictureFolder, "*", SearchOption.AllDirectories), f => f.Contains("smith", StringComparison.Ordinal));
    }

    [Fact]
    public async Task Without_pictures_only_the_supervisor_named_can_read_the_scan()
    {
        var world = await site.NewWorld();
        var other = await world.Another("Rhea", MembershipKind.Reader);
        using var trainee = await (await world.Starts()).Answers("No", Logging.OfCardiac).Fills("Who supervised?", $"{world.Reader.Id}").Presses(Logging.Submit);
        var scan = Assert.Single(await site.ScansOf(world.Trainee));
        Assert.Equal(ScanState.Waiting, scan.State);
        using var supervisor = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}");
        Assert.Contains(supervisor.Page.QuerySelectorAll("a"), a => a.TextContent == "Read this scan");
        using var reader = await (await world.As(other)).Opens($"/scans/{scan.Id}");
        Assert.Equal("This scan has no pictures; only the person who supervised it can read it.", reader.Page.QuerySelector(".why-not")!.TextContent);
    }

    private static bool Holds(string file, string words)
    {
        using var stream = new FileStream(file, FileMode.Open, FileAccess.Read, FileShare.ReadWrite | FileShare.Delete);
        using var bytes = new MemoryStream();
        stream.CopyTo(bytes);
        return bytes.ToArray().AsSpan().IndexOf(Encoding.UTF8.GetBytes(words)) >= 0;
    }

    private async Task<HttpStatusCode> Status(Person person, string url)
    {
        using var visitor = await site.Visitor().SignsIn(person.Id);
        return (await visitor.Opens(url)).Status;
    }
}
