using Credtrack.Core.Scans;
using Credtrack.Web.Features.Scans.Pictures;
using Microsoft.Extensions.DependencyInjection;

namespace Credtrack.Web.Tests.Features.Scans.Pictures.Removals;

public sealed class RemovalsTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Button = "Remove this picture", Why = "A <b>name</b> can be read in the corner.";

    private PictureFiles Files => site.Services.GetRequiredService<PictureFiles>();

    [Theory]
    [InlineData(MembershipKind.Coordinator)]
    [InlineData(MembershipKind.Reader)]
    public async Task The_bytes_are_gone_and_the_page_says_who_removed_it_when_and_why(MembershipKind kind)
    {
        var world = await site.NewWorld();
        var (scan, person) = (await Sent(world, shade: kind == MembershipKind.Reader ? (byte)141 : (byte)142), await world.Another("Cora", kind));
        var picture = scan.Pictures[0];
        using var remover = await (await world.As(person)).Opens($"/scans/{scan.Id}");
        await remover.Opens(remover.Page.QuerySelectorAll("a").Single(a => a.TextContent == "Remove picture 1").GetAttribute("href")!);
        Assert.True(Files.Has(picture.Sha256));
        await remover.Fills("Reason", Why).Presses(Button);
        Assert.False(Files.Has(picture.Sha256));
        foreach (var one in new[] { person, world.Trainee, world.Reader, world.Director })
        {
            using var visitor = await (await world.As(one)).Opens($"/scans/{scan.Id}");
            Assert.Contains($"Picture 1 removed by {person.Name} on Sun 1 Mar 2026: {Why}", visitor.Text, StringComparison.Ordinal);
            Assert.Empty(visitor.Page.QuerySelectorAll("img[src*=pictures]"));
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/scans/{scan.Id}/pictures/{picture.Id}")).Status);
        }
        using var trainee = await world.As(world.Trainee);
        Assert.Contains("Attach a picture, or name who supervised at the bedside", trainee.Text, StringComparison.Ordinal);
        Assert.Contains($"{person.Name} took picture 1 out for good and said why.", (await trainee.Opens($"/scans/{scan.Id}")).Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_picture_that_another_scan_shows_too_stays_until_that_one_loses_it()
    {
        var world = await site.NewWorld();
        var (first, second) = (await Sent(world, 151), await Sent(world, 151));
        Assert.Equal(first.Pictures[0].Sha256, second.Pictures[0].Sha256);
        using var reader = await world.As(world.Reader);
        await Remove(reader, first);
        Assert.Equal(HttpStatusCode.OK, (await reader.Opens($"/scans/{second.Id}/pictures/{second.Pictures[0].Id}")).Status);
        await Remove(reader, second);
        Assert.False(Files.Has(first.Pictures[0].Sha256));
    }

    [Fact]
    public async Task What_a_trainee_takes_off_an_own_scan_is_erased_at_once_too()
    {
        var world = await site.NewWorld();
        var scan = await Sent(world, 161);
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        await trainee.Ticks("Remove picture 1").Attaches(Logging.Attach, Stills.Png(162)).Ticks(Logging.Confirm).Presses("Keep the changes");
        var now = (await site.Kept(scan.Id))!;
        Assert.False(Files.Has(scan.Pictures[0].Sha256));
        Assert.True(Files.Has(now.ShownPictures.Single().Sha256));
    }

    [Fact]
    public async Task A_read_scan_keeps_its_reading_and_its_count()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        using var reader = await world.As(world.Reader);
        await Remove(reader, scan);
        Assert.Contains("image quality 4 of 5", reader.Text, StringComparison.Ordinal);
        using var trainee = await world.As(world.Trainee);
        Assert.Contains("1 scan counts", (await trainee.Opens("/standings")).Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task It_takes_a_reason_that_names_nobody()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var reader = await Form(world, world.Reader, scan);
        await reader.Presses(Button);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, reader.Status);
        Assert.Equal(["Give the reason."], reader.Faults());
        await reader.Fills("Reason", "It shows Mrs Quillfeather").Presses(Button);
        Assert.Equal(["This looks like a name. Take it out: nothing here may identify a patient."], reader.Faults());
        Assert.Equal("It shows Mrs Quillfeather", reader.Typed("Reason"));
        Assert.Single((await site.Kept(scan.Id))!.ShownPictures);
    }

    [Fact]
    public async Task From_an_old_page_it_is_refused_and_the_words_are_kept()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var slower = await Form(world, world.Reader, scan);
        await world.With(scan, s => s.TakeOut(world.Reader, s.Pictures[0], "A name can be read.", world.Now));
        await slower.Fills("Reason", Why).Presses(Button);
        Assert.Equal((HttpStatusCode.Conflict, Why, "This picture is removed already."), (slower.Status, slower.Typed("Reason"), slower.Page.QuerySelector(".why-not")!.TextContent));
    }

    [Fact]
    public async Task Nobody_else_finds_the_form_and_no_picture_is_none()
    {
        var world = await site.NewWorld();
        var (scan, draft) = (await world.Waiting(), await world.Draft());
        foreach (var person in new[] { world.Trainee, world.Director, (await site.NewWorld()).Reader })
        {
            using var visitor = await Form(world, person, scan);
            Assert.Equal(HttpStatusCode.NotFound, visitor.Status);
        }
        using var reader = await Form(world, world.Reader, draft);
        Assert.Equal(HttpStatusCode.NotFound, reader.Status);
        Assert.Equal(HttpStatusCode.NotFound, (await reader.Opens($"/scans/{scan.Id}/pictures/2/removals/new")).Status);
    }

    private async Task<Scan> Sent(World world, byte shade)
    {
        using var trainee = await (await world.Starts()).Answers("No", Logging.OfCardiac).Attaches(Logging.Attach, Stills.Png(shade)).Ticks(Logging.Confirm).Presses(Logging.Submit);
        return (await site.Kept(Guid.Parse(trainee.Url.Split('/')[^1])))!;
    }

    private static async Task<Visitor> Form(World world, Person person, Scan scan) => await (await world.As(person)).Opens($"/scans/{scan.Id}/pictures/1/removals/new");

    private static async Task Remove(Visitor reader, Scan scan) => await (await reader.Opens($"/scans/{scan.Id}/pictures/1/removals/new")).Fills("Reason", Why).Presses(Button);
}
