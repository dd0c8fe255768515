using Credtrack.Core.Catalogue;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;
using Credtrack.Web.Tests.Features.Scans;

namespace Credtrack.Web.Tests.Features.Applications;

/// <summary>The catalogue is for scans to come; those there are keep what they were asked.</summary>
public sealed class AskedTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Was = "Lung sliding seen on both sides?", Now = "Sliding missing on a side?";

    [Fact]
    public async Task A_scan_is_shown_and_read_and_judged_by_what_it_was_asked_and_a_new_one_by_what_is_asked_now()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting(world.Entry("lung") with { Answers = site.Applications["lung"].Questions.ToDictionary(q => q.Code, q => q.Code == "sliding" ? Answer.Yes : Answer.No) });
        using var coordinator = await world.Edits("lung");
        await coordinator.Fills("Question 1", Now).Fills("Positive answer 1", "Yes").Fills("Question 4", "").Fills("View 1", "Right, front").Presses(Cataloguing.Keep);
        Assert.Equal(HttpStatusCode.OK, coordinator.Status);

        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}");
        Assert.Contains(Was, trainee.Text, StringComparison.Ordinal);
        Assert.DoesNotContain(Now, trainee.Text, StringComparison.Ordinal);
        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}/readings/new");
        Assert.Contains("Pleural effusion?", reader.Text, StringComparison.Ordinal);
        Assert.DoesNotContain(Now, reader.Text, StringComparison.Ordinal);
        await reader.Answers("Yes", Was).Answers("No", "Three or more B-lines in one space?", "Consolidation?", "Pleural effusion?").Chooses("Image quality 1 to 5", "3 Enough to answer, with technical flaws").Presses("Give this reading Ctrl ↵");
        // Sliding was seen, says either: negative, as it was asked. As it is asked now, it would be positive.
        Assert.Equal(Result.TN, (await site.Kept(scan.Id))!.Readings[0].Result);
        Assert.Equal(site.Applications["lung"].Questions, (await site.Kept(scan.Id))!.Readings[0].Answers.Select(a => new Question(a.Code, a.Text, a.Positive)));

        await trainee.Opens("/scans/new?application=lung");
        await trainee.Answers("Yes", Now).Answers("No", "Three or more B-lines in one space?", "Consolidation?").Ticks("Right, front").Attaches(Logging.Attach, Stills.Png(shade: 61)).Ticks(Logging.Confirm).Presses(Logging.Submit);
        Assert.Equal(HttpStatusCode.OK, trainee.Status);
        var newer = (await site.ScansOf(world.Trainee)).Single(s => s.Id != scan.Id);
        Assert.Equal([new("sliding", Now, Answer.Yes, Answer.Yes), new("b-lines", "Three or more B-lines in one space?", Answer.Yes, Answer.No), new("consolidation", "Consolidation?", Answer.Yes, Answer.No)], newer.Answers);
        Assert.Equal(("right-anterior", "Right, front"), (newer.Views[0].Code, newer.Views[0].Name));
    }

    [Fact]
    public async Task A_draft_keeps_what_it_was_asked_until_it_is_something_else()
    {
        var world = await site.NewWorld();
        var draft = await world.Draft();
        await world.Behind("cardiac", (cardiac, by) => cardiac.Change(by, Cataloguing.EntryOf(cardiac) with { Questions = [cardiac.Questions[0] with { Text = "Effusion around the heart?" }, .. cardiac.Questions.Skip(1)] }, [], world.Now));
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{draft.Id}/edit");
        await trainee.Answers("Yes", "Pericardial effusion?").Presses(Logging.KeepDraft);
        Assert.Equal("Pericardial effusion?", (await site.Kept(draft.Id))!.Answers[0].Text);
        await trainee.Opens($"/scans/{draft.Id}/edit");
        await trainee.Scanned("Inferior vena cava").Presses(Logging.KeepDraft);
        await trainee.Opens($"/scans/{draft.Id}/edit");
        await trainee.Scanned("Focused cardiac").Presses(Logging.Questions);
        Assert.Contains("Effusion around the heart?", trainee.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_form_that_was_open_while_the_catalogue_changed_shows_what_is_asked_now_before_anything_is_saved()
    {
        var world = await site.NewWorld();
        using var trainee = await world.Starts("dvt");
        var asked = site.Applications["dvt"].Questions;
        trainee.Answers("Yes", [.. asked.Select(q => q.Text)]).Attaches(Logging.Attach, Stills.Png(shade: 62)).Ticks(Logging.Confirm).Fills("Depth cm", "4");
        await world.Behind("dvt", (dvt, by) => dvt.Change(by, Cataloguing.EntryOf(dvt) with { Questions = [dvt.Questions[0] with { Text = "Everything compresses?", Positive = Answer.No }, .. dvt.Questions.Skip(1)] }, [], world.Now));
        await trainee.Presses(Logging.Submit);
        Assert.Equal(HttpStatusCode.Conflict, trainee.Status);
        Assert.Contains("has just been changed in the catalogue. Look at its views and questions again; what you typed is kept.", trainee.Text, StringComparison.Ordinal);
        Assert.Contains("Everything compresses?", trainee.Text, StringComparison.Ordinal);
        Assert.Equal("4", trainee.Typed("Depth cm"));
        Assert.Empty(await site.ScansOf(world.Trainee));
        await trainee.Answers("No", "Everything compresses?").Presses(Logging.Submit);
        Assert.Equal((ScanState.Waiting, Answer.No), ((await site.ScansOf(world.Trainee))[0].State, (await site.ScansOf(world.Trainee))[0].Answers[0].Given!.Value));
    }

    [Fact]
    public async Task A_part_that_is_gone_from_the_catalogue_stays_with_its_scan()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting(world.Entry("msk") with { Subtype = "hip" });
        using var coordinator = await world.Edits("msk");
        await coordinator.Fills("Part 5", "").Presses(Cataloguing.Keep);
        Assert.DoesNotContain("hip", (await site.Listed("msk")).Subtypes);
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        await trainee.Fills("Depth cm", "5").Presses("Keep the changes");
        Assert.Equal("hip", (await site.Kept(scan.Id))!.Subtype);
        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}/readings/new");
        Assert.Equal("hip", reader.Typed("Part"));
    }
}
