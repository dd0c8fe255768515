using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Scans;

public sealed class DraftTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_draft_may_be_as_incomplete_as_it_likes()
    {
        var world = await site.NewWorld();
        using var trainee = await world.Starts();
        await trainee.Answers("Unclear", "Signs of tamponade?").Presses(Logging.KeepDraft);
        Assert.Contains("Kept as a draft", trainee.Text, StringComparison.Ordinal);
        var draft = Assert.Single(await site.ScansOf(world.Trainee));
        Assert.Equal((ScanState.Draft, 3, 0), (draft.State, draft.Answers.Count(a => a.Given is null), draft.Pictures.Count));
        Assert.Contains("Answer “Pericardial effusion?”; Unclear is an answer too.", trainee.Page.QuerySelector(".why-not")!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_draft_is_seen_by_nobody_else()
    {
        var world = await site.NewWorld();
        var draft = await world.Draft();
        var picture = draft.Pictures[0].Id;
        foreach (var other in new[] { world.Director, world.Reader, await world.Another("Tess", MembershipKind.Trainee), await world.Another("Cora", MembershipKind.Coordinator) })
        {
            using var visitor = await world.As(other);
            foreach (var url in new[] { "", "/edit", "/readings/new", "/returns/new", $"/pictures/{picture}" })
                Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/scans/{draft.Id}{url}")).Status);
            foreach (var list in new[] { "/scans", "/scans?state=Draft", "/scans?state=Waiting" })
                Assert.Empty((await visitor.Opens(list)).Page.QuerySelectorAll("ol.scans li"));
        }
        using var trainee = await world.As(world.Trainee);
        Assert.Contains("nobody else sees it until you submit it", (await trainee.Opens($"/scans/{draft.Id}")).Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_form_sent_twice_is_one_scan()
    {
        var world = await site.NewWorld();
        using var trainee = await world.Completes();
        await trainee.Presses(Logging.KeepDraft);
        var scan = Assert.Single(await site.ScansOf(world.Trainee));
        await trainee.Opens("/scans/new?application=cardiac");
        trainee.Page.QuerySelector("[name='Form.Id']")!.SetAttribute("value", scan.Id.ToString());
        await trainee.Fills("Note", "The second time.").Presses(Logging.KeepDraft);
        Assert.Equal($"/scans/{scan.Id}", trainee.Url);
        Assert.Contains("This scan is already logged", trainee.Text, StringComparison.Ordinal);
        Assert.Null(Assert.Single(await site.ScansOf(world.Trainee)).Note);
    }

    [Fact]
    public async Task A_form_sent_twice_at_once_is_one_scan_and_the_slower_is_led_to_it()
    {
        var world = await site.NewWorld();
        using var faster = await world.Completes();
        using var slower = await world.Completes();
        slower.Page.QuerySelector("[name='Form.Id']")!.SetAttribute("value", faster.Id().ToString());
        site.Rival.ActsBeforeNextSave(() => faster.Presses(Logging.Submit));
        await slower.Fills("Note", "Slower.").Presses(Logging.Submit);

        Assert.Equal(HttpStatusCode.Conflict, slower.Status);
        Assert.Contains("This was just saved by another request.", slower.Text, StringComparison.Ordinal);
        Assert.Equal("Slower.", slower.Typed("Note"));
        Assert.Contains("Form.Answers[effusion]=No", slower.Chosen());
        await slower.Presses(Logging.Submit);
        Assert.Equal($"/scans/{Assert.Single(await site.ScansOf(world.Trainee)).Id}", slower.Url);
    }

    [Fact]
    public async Task The_form_of_another_person_cannot_be_taken_over()
    {
        var world = await site.NewWorld();
        var theirs = await world.Draft();
        var other = await world.Another("Tess", MembershipKind.Trainee);
        using var thief = await (await world.As(other)).Opens("/scans/new?application=cardiac");
        thief.Page.QuerySelector("[name='Form.Id']")!.SetAttribute("value", theirs.Id.ToString());
        await thief.Presses(Logging.KeepDraft);
        Assert.NotEqual(theirs.Id, Assert.Single(await site.ScansOf(other)).Id);
        Assert.Equal((world.Trainee.Id, theirs.Version), await site.Ask(db => db.Scans.Where(s => s.Id == theirs.Id).Select(s => new ValueTuple<Guid, int>(s.TraineeId, s.Version)).SingleAsync()));
    }

    [Fact]
    public async Task The_form_of_a_discarded_draft_is_a_new_scan()
    {
        var world = await site.NewWorld();
        using var trainee = await world.Completes();
        var id = trainee.Id();
        await trainee.Presses(Logging.KeepDraft);
        await trainee.Presses("Discard the draft");
        await trainee.Opens("/scans/new?application=cardiac");
        trainee.Page.QuerySelector("[name='Form.Id']")!.SetAttribute("value", id.ToString());
        await trainee.Presses(Logging.KeepDraft);
        Assert.Equal(HttpStatusCode.OK, trainee.Status);
        Assert.Equal([ScanState.Withdrawn, ScanState.Draft], (await site.ScansOf(world.Trainee)).OrderBy(s => s.State == ScanState.Draft).Select(s => s.State));
    }

    [Theory]
    [InlineData("TraineeId", "00000000-0000-0000-0000-000000000001")]
    [InlineData("ProgrammeId", "{other}")]
    [InlineData("ApplicationId", "00000000-0000-0000-0000-000000000001")]
    [InlineData("State", "Read")]
    [InlineData("Encounter", "chosen")]
    [InlineData("LoggedAt", "2020-01-01T00:00")]
    [InlineData("Supervision", "Direct")]
    [InlineData("Submissions[0].Number", "9")]
    [InlineData("Readings[0].Quality", "5")]
    [InlineData("Withdrawal.At", "2020-01-01T00:00")]
    [InlineData("Pictures[0].Sha256", "00")]
    public async Task What_the_form_does_not_ask_changes_nothing(string name, string value)
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        using var trainee = await world.Completes();
        trainee.Forges(name, value.Replace("{other}", $"{other.Programme.Id}", StringComparison.Ordinal)).Forges($"Form.{name}", value.Replace("{other}", $"{other.Programme.Id}", StringComparison.Ordinal));
        await trainee.Presses(Logging.Submit);
        var scan = Assert.Single(await site.ScansOf(world.Trainee));
        Assert.Equal((world.Programme.Id, world.Cardiac.Id, ScanState.Waiting), (scan.ProgrammeId, scan.ApplicationId, scan.State));
        Assert.Equal((world.Now, Supervision.Later, 1, 0, 1), (scan.LoggedAt, scan.Supervision, scan.Submissions[0].Number, scan.Readings.Count, scan.Pictures.Count));
        Assert.Equal((scan.Id.ToString("N")[^12..], 64), (scan.Encounter, scan.Pictures[0].Sha256.Length));
    }

    [Fact]
    public async Task The_same_patient_as_the_last_scan_shares_the_encounter()
    {
        var world = await site.NewWorld();
        var encounters = new List<string>();
        foreach (var same in new[] { true, true, false })
        {
            using var trainee = await world.Completes();
            await trainee.Ticks("Same patient as my last scan", same).Presses(Logging.Submit);
            encounters.Add((await site.Kept(Guid.Parse(trainee.Url[^36..])))!.Encounter);
            site.Clock.Now += TimeSpan.FromMinutes(1);
        }
        Assert.Equal(encounters[0], encounters[1]);
        Assert.NotEqual(encounters[1], encounters[2]);
    }
}
