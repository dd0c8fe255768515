using Credtrack.Core.Catalogue;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Scans;

public sealed class EditTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Keep = "Keep the changes";

    [Theory]
    [InlineData(ScanState.Draft, Logging.KeepDraft)]
    [InlineData(ScanState.Waiting, Keep)]
    [InlineData(ScanState.Returned, Logging.KeepDraft)]
    public async Task An_unread_scan_is_changed_and_stays_where_it_is(ScanState state, string button)
    {
        var world = await site.NewWorld();
        var scan = await In(world, state);
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        await trainee.Fills("Frequency MHz", "3,125").Answers("Yes", "Signs of tamponade?").Ticks("Apical four-chamber", on: false).Presses(button);
        Assert.Equal($"/scans/{scan.Id}", trainee.Url);
        Assert.Contains("changed the scan: frequency in kHz from none to 3125; view Apical four-chamber from shown to not shown; Signs of tamponade from No to Yes.", trainee.Text, StringComparison.Ordinal);
        var changed = (await site.Kept(scan.Id))!;
        Assert.Equal((state, 3125, Answer.Yes, scan.PerformedAt), (changed.State, changed.Settings.FrequencyKhz!.Value, changed.Answers[1].Given!.Value, changed.PerformedAt));
    }

    [Theory]
    [InlineData(ScanState.Draft)]
    [InlineData(ScanState.Returned)]
    public async Task A_change_may_submit_at_once(ScanState state)
    {
        var world = await site.NewWorld();
        var scan = await In(world, state);
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        if (state == ScanState.Returned) Assert.Contains("The apical view.", trainee.Text, StringComparison.Ordinal);
        await trainee.Fills("Depth cm", "16").Presses(Logging.Submit);
        Assert.Equal((ScanState.Waiting, 160), ((await site.Kept(scan.Id))!.State, (await site.Kept(scan.Id))!.Settings.DepthMm!.Value));
    }

    [Fact]
    public async Task A_form_sent_back_untouched_changes_nothing()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting(world.Entry() with { Settings = new MachineSettings(Transducer.Phased, 155, 3125, 95, 40), Supervision = Supervision.Direct, Supervisor = world.Reader });
        var before = await site.Ask(db => db.LedgerEntries.CountAsync(e => e.SubjectId == scan.Id));
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        await trainee.Presses(Keep);
        Assert.Equal((HttpStatusCode.OK, $"/scans/{scan.Id}"), (trainee.Status, trainee.Url));
        Assert.Equal(before, await site.Ask(db => db.LedgerEntries.CountAsync(e => e.SubjectId == scan.Id)));
        Assert.Equal(scan.PerformedAt, (await site.Kept(scan.Id))!.PerformedAt);
    }

    [Fact]
    public async Task A_time_in_the_hour_that_comes_twice_stays_when_it_is_left_alone()
    {
        var world = await site.NewWorld();
        // In Dublin 01:30 came twice that night, at 00:30 and 01:30 UTC (IANA tz database).
        var second = new DateTime(2025, 10, 26, 1, 30, 0, DateTimeKind.Utc);
        var scan = await world.Waiting(world.Entry(at: second));
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        await trainee.Fills("Depth cm", "16").Presses(Keep);
        Assert.Equal((second, 160), ((await site.Kept(scan.Id))!.PerformedAt, (await site.Kept(scan.Id))!.Settings.DepthMm!.Value));
    }

    [Fact]
    public async Task A_read_scan_is_not_changed_and_the_page_says_so()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}");
        Assert.DoesNotContain(trainee.Page.QuerySelectorAll("a"), a => a.TextContent == "Change it");
        await trainee.Opens($"/scans/{scan.Id}/edit");
        Assert.Equal("This scan has been read; what was read stays as it is.", trainee.Page.QuerySelector(".why-not")!.TextContent);
        Assert.Empty(trainee.Page.QuerySelectorAll("button[form=log]"));
    }

    [Fact]
    public async Task A_change_that_comes_after_the_reading_is_refused_and_stays_typed()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        await site.Ask(async db =>
        {
            (await db.Scans.SingleAsync(s => s.Id == scan.Id)).Read(world.Reader, world.Judgement(), world.Now);
            return await db.SaveChangesAsync();
        });
        await trainee.Fills("Note", "Too late.").Answers("Yes", "Pericardial effusion?").Presses(Keep);
        Assert.Equal(HttpStatusCode.Conflict, trainee.Status);
        Assert.Equal("This scan has been read; what was read stays as it is.", trainee.Page.QuerySelector("[role=alert]")!.TextContent.Trim());
        Assert.Equal("Too late.", trainee.Typed("Note"));
        Assert.Contains("Form.Answers[effusion]=Yes", trainee.Chosen());
        Assert.Equal(World.Secret, (await site.Kept(scan.Id))!.Note);
    }

    [Fact]
    public async Task Of_two_changes_the_later_sees_how_it_is_now_and_keeps_what_was_typed()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var slow = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        using var fast = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        await fast.Fills("Depth cm", "12").Presses(Keep);

        slow.Scanned("Cardiac arrest echo").Attaches(Logging.Attach, Stills.Png(shade: 140)).Ticks(Logging.Confirm).Fills("Depth cm", "16,5");
        await slow.Presses(Keep);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, slow.Status);
        await slow.Answers("No", "Cardiac standstill?").Answers("Unclear", "Pericardial effusion?").Ticks("Subcostal").Presses(Keep);
        Assert.Equal(HttpStatusCode.Conflict, slow.Status);
        Assert.Contains("Someone else changed this while you had it open.", slow.Text, StringComparison.Ordinal);
        Assert.Contains("depth 12 cm", slow.Page.QuerySelector("[aria-labelledby=now]")!.TextContent, StringComparison.Ordinal);
        Assert.Equal("16,5", slow.Typed("Depth cm"));
        Assert.Subset(slow.Chosen().ToHashSet(), new HashSet<string>(["Form.Application=arrest-echo", "Form.Answers[standstill]=No", "Form.Answers[effusion]=Unclear", "Form.Views=subcostal", "Form.NobodyNamed=true"]));

        await slow.Presses(Keep);
        Assert.Equal($"/scans/{scan.Id}", slow.Url);
        var changed = (await site.Kept(scan.Id))!;
        Assert.Equal((site.Applications["arrest-echo"].Id, 165, 2, Answer.Unclear), (changed.ApplicationId, changed.Settings.DepthMm!.Value, changed.Pictures.Count, changed.Answers[1].Given!.Value));
    }

    [Fact]
    public async Task A_scan_that_waits_cannot_be_made_incomplete()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        await trainee.Scanned("Lung").Ticks("Remove picture 1").Presses(Keep);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, trainee.Status);
        Assert.Equal(4, trainee.Faults().Count);
        Assert.Contains("Attach a picture, or name who supervised at the bedside: without pictures only that person can read the scan.", trainee.Faults());
        Assert.True(trainee.IsTicked("Remove picture 1"));
        Assert.Equal(scan.Version, (await site.Kept(scan.Id))!.Version);
    }

    [Fact]
    public async Task A_time_that_was_emptied_is_asked_for()
    {
        var world = await site.NewWorld();
        var scan = await world.Draft();
        using var trainee = await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/edit");
        await trainee.Fills("When was it performed?", "").Presses(Logging.KeepDraft);
        Assert.Equal(["Enter when the scan was performed."], trainee.Faults());
    }

    [Fact]
    public async Task Nobody_else_opens_or_sends_the_form()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        foreach (var other in new[] { world.Reader, await world.Another("Rita", MembershipKind.Trainee, MembershipKind.Reader), await world.Another("Tess", MembershipKind.Trainee) })
        {
            using var visitor = await world.As(other);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/scans/{scan.Id}/edit")).Status);
            if (other == world.Reader) continue;
            await visitor.Opens("/scans/new?application=cardiac");
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Sends($"/scans/{scan.Id}")).Status);
        }
        Assert.Equal(scan.Version, (await site.Kept(scan.Id))!.Version);
    }

    private static Task<Scan> In(World world, ScanState state) => state switch
    {
        ScanState.Draft => world.Draft(),
        ScanState.Waiting => world.Waiting(),
        _ => world.Returned(),
    };
}
