using Credtrack.Core.Scans;
using Credtrack.Web.Features.Scans.Pictures;

namespace Credtrack.Web.Tests.Features.Scans.Pictures;

public sealed class UploadsTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string NotConfirmed = "Look at each picture and confirm that no patient is named in it.";
    private const string Gone = "A picture from your last try cannot be found any more: attach it again.";
    private static readonly byte[] NoPicture = "%PDF-1.7 a report"u8.ToArray();

    [Fact]
    public async Task Twelve_pictures_are_kept_in_their_order()
    {
        var world = await site.NewWorld();
        using var trainee = await (await world.Starts()).Answers("No", Logging.OfCardiac).Attaches(Logging.Attach, Many(12)).Ticks(Logging.Confirm).Presses(Logging.Submit);
        var pictures = Assert.Single(await site.ScansOf(world.Trainee)).Pictures.OrderBy(p => p.Number).ToList();
        Assert.Equal(Enumerable.Range(1, 12), pictures.Select(p => p.Number));
        Assert.Equal(Enumerable.Range(1, 12).Select(n => 64 + n), pictures.Select(p => p.Width));
        Assert.Equal(12, trainee.Page.QuerySelectorAll(".stills img").Length);
    }

    [Fact]
    public async Task Of_thirteen_the_last_is_left_out_and_the_others_are_kept()
    {
        var world = await site.NewWorld();
        using var trainee = await (await world.Starts()).Answers("No", Logging.OfCardiac).Attaches(Logging.Attach, Many(13)).Ticks(Logging.Confirm).Presses(Logging.Submit);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, trainee.Status);
        Assert.Equal(["A scan holds 12 pictures at most; those from picture 13 on were left out."], trainee.Faults());
        await trainee.Presses(Logging.Submit);
        Assert.Equal(12, Assert.Single(await site.ScansOf(world.Trainee)).Pictures.Count);
    }

    [Fact]
    public async Task A_refused_picture_is_named_plainly_and_the_good_ones_need_not_be_attached_again()
    {
        var world = await site.NewWorld();
        byte[][] files = [Stills.Png(10), NoPicture, new byte[StillImage.MostBytes + 1], SentFiles.Jpeg()[..900], [], Stills.Png(20)];
        using var trainee = await (await world.Starts()).Answers("No", Logging.OfCardiac).Attaches(Logging.Attach, files).Ticks(Logging.Confirm).Fills("Note", "Kept.").Presses(Logging.Submit);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, trainee.Status);
        Assert.Equal([
            "Picture 2: This file is not a PNG or JPEG picture. Export it as one of these and attach it again.",
            "Picture 3: This file is larger than 15 MB. Export the picture smaller, or as JPEG, and attach it again.",
            "Picture 4: This picture is damaged or incomplete. Export it again and attach the new file.",
            "Picture 5: This file is empty. Export the picture again and attach the new file."], trainee.Faults());
        Assert.Equal(("Kept.", true), (trainee.Typed("Note"), trainee.IsTicked(Logging.Confirm)));
        Assert.Equal(["Picture 1, 320 by 240", "Picture 2, 320 by 240"], Kept(trainee));

        await trainee.Attaches(Logging.Attach, Stills.Png(30)).Presses(Logging.Submit);
        Assert.Equal(3, Assert.Single(await site.ScansOf(world.Trainee)).Pictures.Count);
    }

    [Fact]
    public async Task A_kept_picture_may_be_left_out_again()
    {
        var world = await site.NewWorld();
        using var trainee = await (await world.Starts()).Attaches(Logging.Attach, Stills.Png(10), Stills.Png(20, width: 400)).Ticks(Logging.Confirm).Presses(Logging.Submit);
        Assert.Equal(["Picture 1, 320 by 240", "Picture 2, 400 by 240"], Kept(trainee));
        await trainee.Ticks("Picture 1, 320 by 240", on: false).Answers("No", Logging.OfCardiac).Presses(Logging.Submit);
        Assert.Equal(400, Assert.Single(Assert.Single(await site.ScansOf(world.Trainee)).Pictures).Width);
    }

    [Fact]
    public async Task Looking_at_other_questions_keeps_good_pictures_and_still_names_the_refused()
    {
        var world = await site.NewWorld();
        using var trainee = await (await world.Starts()).Attaches(Logging.Attach, Stills.Png(10), NoPicture).Presses(Logging.Questions);
        Assert.Equal((HttpStatusCode.OK, 1), (trainee.Status, Kept(trainee).Count()));
        Assert.Equal(["Picture 2: This file is not a PNG or JPEG picture. Export it as one of these and attach it again."], trainee.Faults());
    }

    [Theory]
    [InlineData(Logging.Submit)]
    [InlineData(Logging.KeepDraft)]
    public async Task Nothing_is_stored_on_a_scan_before_somebody_confirms_that_nobody_is_named(string button)
    {
        var world = await site.NewWorld();
        using var trainee = await (await world.Completes()).Ticks(Logging.Confirm, on: false).Presses(button);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, trainee.Status);
        Assert.Equal([NotConfirmed], trainee.Faults());
        Assert.Empty(await site.ScansOf(world.Trainee));
        await trainee.Ticks(Logging.Confirm).Presses(button);
        Assert.Single(Assert.Single(await site.ScansOf(world.Trainee)).Pictures);
    }

    [Fact]
    public async Task A_note_of_another_person_is_refused_and_the_rest_is_kept()
    {
        var world = await site.NewWorld();
        using var trainee = await (await world.Starts()).Attaches(Logging.Attach, Stills.Png(10)).Presses(Logging.Submit);
        var note = trainee.Page.QuerySelector("[name='Form.Kept']")!.GetAttribute("value")!;
        var other = await world.Another("Tess", MembershipKind.Trainee);
        using var thief = await (await world.As(other)).Opens("/scans/new?application=cardiac");
        thief.Answers("No", Logging.OfCardiac).Attaches(Logging.Attach, Stills.Png(20)).Ticks(Logging.Confirm).Forges("Form.Kept", note);
        await thief.Presses(Logging.Submit);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, thief.Status);
        Assert.Equal([Gone], thief.Faults());
        await thief.Presses(Logging.Submit);
        Assert.Single(Assert.Single(await site.ScansOf(other)).Pictures);
    }

    [Theory]
    [InlineData("")]
    [InlineData("forged")]
    [InlineData("CfDJ8AAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAA")]
    [InlineData("{\"Sha256\":\"../../etc/passwd\",\"Width\":1,\"Height\":1}")]
    public async Task A_forged_note_is_refused_in_words(string note)
    {
        var world = await site.NewWorld();
        using var trainee = await (await world.Completes()).Forges("Form.Kept", note).Presses(Logging.Submit);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, trainee.Status);
        Assert.Equal([Gone], trainee.Faults());
        Assert.Single(Kept(trainee));
    }

    [Fact]
    public async Task A_full_scan_takes_another_picture_only_in_the_place_of_one()
    {
        var world = await site.NewWorld();
        using var trainee = await (await world.Starts()).Answers("No", Logging.OfCardiac).Attaches(Logging.Attach, Many(12)).Ticks(Logging.Confirm).Presses(Logging.Submit);
        var id = Assert.Single(await site.ScansOf(world.Trainee)).Id;
        await trainee.Opens($"/scans/{id}/edit");
        await trainee.Ticks("Remove picture 3").Attaches(Logging.Attach, Stills.Png(200)).Presses("Keep the changes");
        Assert.Equal([NotConfirmed], trainee.Faults());
        await trainee.Ticks("Remove picture 3", on: false).Ticks(Logging.Confirm).Presses("Keep the changes");
        Assert.Equal(["A scan holds 12 pictures at most; leave out 1 of them."], trainee.Faults());
        await trainee.Ticks("Remove picture 3").Presses("Keep the changes");
        Assert.Equal([1, 2, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13], (await site.Kept(id))!.ShownPictures.Select(p => p.Number));
    }

    private static byte[][] Many(int pictures) => [.. Enumerable.Range(1, pictures).Select(n => Stills.Png((byte)n, width: 64 + n, height: 64))];

    private static IEnumerable<string> Kept(Visitor visitor) => visitor.Page.QuerySelectorAll("[name='Form.Kept']").Select(k => k.ParentElement!.TextContent.Trim());
}
