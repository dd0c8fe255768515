using System.Globalization;
using Credtrack.Core.Catalogue;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Scans;

public sealed class ScanFormTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_scan_is_kept_exactly_as_it_was_typed()
    {
        var world = await site.NewWorld();
        using var trainee = await world.Starts("msk");
        var id = trainee.Id();
        Fill(trainee, world);
        await trainee.Presses(Logging.Submit);
        Assert.Equal($"/scans/{id}", trainee.Url);

        var scan = (await site.Kept(id))!;
        Assert.Equal((world.Trainee.Id, world.Programme.Id, site.Applications["msk"].Id, "knee"), (scan.TraineeId, scan.ProgrammeId, scan.ApplicationId, scan.Subtype));
        Assert.Equal((new DateTime(2025, 7, 10, 13, 30, 0, DateTimeKind.Utc), world.Now), (scan.PerformedAt, scan.LoggedAt));
        Assert.Equal((Setting.Education, Role.Interpreted, false, true), (scan.Setting, scan.Role, scan.Indicated, scan.Assisted));
        Assert.Equal((Supervision.Direct, world.Reader.Id), (scan.Supervision, scan.SupervisorId!.Value));
        Assert.Equal(new MachineSettings(Transducer.Linear, 35, 12_250, 90, 45), scan.Settings);
        Assert.Equal("Knee, seen twice.", scan.Note);
        Assert.Equal(["Other side"], scan.Views.Where(v => v.Marked).Select(v => v.Name));
        Assert.Equal([Answer.Yes, Answer.Unclear, Answer.No], scan.Answers.Select(a => a.Given!.Value));
        Assert.Equal((ScanState.Waiting, world.Now), (scan.State, scan.WaitsSince!.Value));
    }

    // Ireland's clocks (IANA tz database, Europe/Dublin): UTC in winter, an hour ahead in summer; in 2025 they changed on 30 March and 26 October at 01:00 UTC.
    [Theory]
    [InlineData("2026-01-10T14:30", "2026-01-10 14:30")]
    [InlineData("2025-07-10T00:30", "2025-07-09 23:30")]
    [InlineData("2025-10-26T01:30", "2025-10-26 00:30")]
    [InlineData("2025-03-30T01:30", "2025-03-30 01:30")]
    public async Task The_time_is_that_of_the_clocks_at_the_site(string typed, string utc)
    {
        var world = await site.NewWorld();
        using var trainee = await world.Completes();
        await trainee.Fills("When was it performed?", typed).Presses(Logging.Submit);
        Assert.Equal(DateTime.Parse(utc, CultureInfo.InvariantCulture), Assert.Single(await site.ScansOf(world.Trainee)).PerformedAt);
    }

    [Fact]
    public async Task The_form_opens_at_the_time_it_is_at_the_site()
    {
        using var trainee = await (await site.NewWorld()).Starts();
        Assert.Equal("2026-03-01T12:00", trainee.Typed("When was it performed?"));
    }

    [Fact]
    public async Task An_empty_form_asks_for_the_application_first()
    {
        var world = await site.NewWorld();
        using var trainee = await world.As(world.Trainee);
        await (await trainee.Opens("/scans/new")).Presses(Logging.Submit);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, trainee.Status);
        Assert.Equal(["Choose the application you scanned."], trainee.Faults());
        Assert.Empty(await site.ScansOf(world.Trainee));
    }

    [Fact]
    public async Task What_is_wrong_is_listed_in_the_order_in_which_the_fields_stand_on_the_page()
    {
        using var trainee = await (await site.NewWorld()).Starts("msk");
        trainee.Fills("Thermal index (TI)", "hot").Fills("Note", new string('n', 5000)).Fills("Depth cm", "deep").Fills("When was it performed?", "");
        await trainee.Presses(Logging.Submit);
        var (all, links) = (trainee.Page.All.ToList(), trainee.Page.QuerySelectorAll(".notice.bad a").Select(a => a.GetAttribute("href")![1..]).ToList());
        // Questions are one field of the form: among themselves they keep the order in which they were looked at.
        var places = links.DistinctBy(id => string.Join('_', id.Split('_').Take(2))).Select(id => all.FindIndex(e => e.Id == id)).ToList();
        Assert.True(places.Count > 5, string.Join(' ', links));
        Assert.DoesNotContain(-1, places);
        Assert.Equal(places.Order(), places);
    }

    [Fact]
    public async Task Whatever_a_reader_would_miss_is_asked_for()
    {
        var world = await site.NewWorld();
        using var trainee = await world.Starts();
        await trainee.Presses(Logging.Submit);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, trainee.Status);
        Assert.Equivalent(Logging.OfCardiac.Select(q => $"Answer “{q}”; Unclear is an answer too.")
            .Append("Attach a picture, or name who supervised at the bedside: without pictures only that person can read the scan."), trainee.Faults(), strict: true);
        Assert.Empty(await site.ScansOf(world.Trainee));
    }

    [Theory]
    [InlineData("When was it performed?", "2026-03-01T12:01", "This time has not come yet. Enter when the scan was performed.")]
    [InlineData("When was it performed?", "0026-02-28T10:00", "This is too long ago. Check the year.")]
    [InlineData("When was it performed?", "0001-01-01T00:00", "This is too long ago. Check the year.")]
    [InlineData("When was it performed?", "9999-12-31T23:59", "This time has not come yet. Enter when the scan was performed.")]
    [InlineData("When was it performed?", "", "Enter when the scan was performed.")]
    [InlineData("Depth cm", "deep", "Enter a number such as 15 or 15.5, or leave this empty.")]
    [InlineData("Depth cm", "1,234.5", "Enter a number such as 15 or 15.5, or leave this empty.")]
    [InlineData("Depth cm", "-3", "Enter a number such as 15 or 15.5, or leave this empty.")]
    [InlineData("Depth cm", "0.4", "Give the depth in cm, from 0.5 to 40.")]
    [InlineData("Depth cm", "155", "Give the depth in cm, from 0.5 to 40.")]
    [InlineData("Frequency MHz", "1e3", "Enter a number such as 3.5, or leave this empty.")]
    [InlineData("Frequency MHz", "3500", "Give the frequency in MHz, from 0.5 to 60.")]
    [InlineData("Mechanical index (MI)", "3,01", "Give the mechanical index as the machine shows it, from 0 to 3.")]
    [InlineData("Thermal index (TI)", "99999999999999999999", "Enter a number such as 0.4, or leave this empty.")]
    [InlineData("Thermal index (TI)", "10.01", "Give the thermal index as the machine shows it, from 0 to 10.")]
    [InlineData("Depth cm", "123456789012345678901", "Enter a number such as 15 or 15.5, or leave this empty.")]
    public async Task A_value_that_cannot_be_is_named_at_its_field_and_all_that_was_typed_stays(string field, string value, string words)
    {
        var world = await site.NewWorld();
        using var trainee = await world.Starts("msk");
        Fill(trainee, world);
        trainee.Fills(field, value);
        var chosen = trainee.Chosen();
        await trainee.Presses(Logging.Submit);

        Assert.Equal(HttpStatusCode.UnprocessableEntity, trainee.Status);
        Assert.Contains(words, trainee.Faults());
        Assert.Equal(value, trainee.Typed(field));
        Assert.Equal(chosen, trainee.Chosen());
        Assert.Equal("Knee, seen twice.", trainee.Typed("Note"));
        Assert.Equal(world.Reader.Id.ToString(), trainee.Typed("Who supervised?"));
        Assert.Empty(await site.ScansOf(world.Trainee));
    }

    [Fact]
    public async Task A_note_that_is_too_long_comes_back_whole()
    {
        var (world, note) = (await site.NewWorld(), new string('n', ScanEntry.LongestNote + 1));
        using var trainee = await world.Completes();
        await trainee.Fills("Note", note).Presses(Logging.Submit);
        Assert.Equal(["Keep the note within 1000 characters."], trainee.Faults());
        Assert.Equal(note, trainee.Typed("Note"));
    }

    [Fact]
    public async Task Without_script_a_button_shows_the_views_and_questions_of_another_application_and_saves_nothing()
    {
        var world = await site.NewWorld();
        using var trainee = await world.Starts("msk");
        Fill(trainee, world);
        await trainee.Fills("Depth cm", "deep").Scanned("Focused cardiac").Presses(Logging.Questions);
        Assert.Equal((HttpStatusCode.OK, 0), (trainee.Status, trainee.Faults().Count));
        Assert.Equal(["Form.Application=cardiac", "Form.Setting=Education", "Form.Answers[effusion]=Yes", "Form.Role=Interpreted", "Form.Assisted=true", "Form.Transducer=Linear"], trainee.Chosen());
        Assert.Equal(("2025-07-10T14:30", "deep"), (trainee.Typed("When was it performed?"), trainee.Typed("Depth cm")));
        Assert.Empty(await site.ScansOf(world.Trainee));

        await trainee.Scanned("Musculoskeletal").Presses(Logging.Questions);
        await trainee.Fills("Depth cm", "4").Chooses("Which part?", "hip").Answers("No", "Step in the bone surface?", "Gap in the tendon?").Presses(Logging.Submit);
        var scan = Assert.Single(await site.ScansOf(world.Trainee));
        Assert.Equal((ScanState.Waiting, "hip", Answer.Yes), (scan.State, scan.Subtype, scan.Answers[0].Given!.Value));
    }

    [Fact]
    public async Task A_part_left_over_from_another_application_is_asked_for_again()
    {
        var world = await site.NewWorld();
        using var trainee = await world.Starts("msk");
        Fill(trainee, world);
        await trainee.Scanned("Joint aspiration").Chooses("Which part?", "rib").Presses(Logging.Submit);
        Assert.Contains("Choose a part that belongs to Joint aspiration, or none.", trainee.Faults());
        await trainee.Scanned("Testicular").Presses(Logging.Questions);
        await trainee.Answers("No", "Flow alike on both sides?").Presses(Logging.Submit);
        Assert.Null(Assert.Single(await site.ScansOf(world.Trainee)).Subtype);
    }

    private static void Fill(Visitor trainee, World world) => trainee
        .Fills("When was it performed?", "2025-07-10T14:30").Chooses("Setting", "Teaching").Chooses("Which part?", "knee").Ticks("Other side")
        .Answers("Yes", "Joint effusion?").Answers("Unclear", "Step in the bone surface?").Answers("No", "Gap in the tendon?")
        .Fills("Who supervised?", world.Reader.Id.ToString()).Chooses("Your part", "Interpreted only").Ticks("Clinically indicated", on: false).Ticks("Somebody helped hands-on")
        .Chooses("Transducer", "Linear").Fills("Depth cm", "3,5").Fills("Frequency MHz", "12.25").Fills("Mechanical index (MI)", "0,9").Fills("Thermal index (TI)", " .45 ")
        .Fills("Note", "  Knee, seen twice. ");
}
