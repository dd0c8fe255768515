using Credtrack.Core.Readings;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Scans.Readings.Corrections;

public sealed class CorrectionsTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Button = "Correct this reading", Reason = "Why do you correct it?", Why = "I looked at the <b>wrong</b> clip.";
    private const string Poor = "2 Recognisable, not enough to answer";

    [Fact]
    public async Task What_is_corrected_governs_every_day_and_the_trainee_sees_what_changed_and_why()
    {
        var world = await site.NewWorld();
        var scan = await world.Read(4, world.Entry(at: world.Now.AddHours(-3)));
        site.Clock.Now = site.Clock.Now.AddDays(2);
        using var trainee = await world.As(world.Trainee);
        Assert.Contains("nearest gap is 2 scans in Focused cardiac", trainee.Text, StringComparison.Ordinal);
        foreach (var day in new[] { "2026-03-01", "2026-03-03" }) Assert.Contains("1 scan counts", await Standing(trainee, day), StringComparison.Ordinal);

        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}");
        await reader.Opens(reader.Page.QuerySelectorAll("a").Single(a => a.TextContent == "Correct your reading").GetAttribute("href")!);
        Assert.NotNull(reader.Page.QuerySelector("input[name='Form.Quality'][value='4'][checked]"));
        Assert.NotNull(reader.Page.QuerySelector("input[name='Form.Answers[effusion]'][value=No][checked]"));
        Assert.True(reader.IsTicked("Subcostal four-chamber"));
        await reader.Chooses("Image quality 1 to 5", Poor).Chooses("Pericardial effusion?", "Yes").Fills("Feedback for the trainee", "Look at the apex.").Fills(Reason, Why).Presses(Button);
        Assert.Equal($"/scans/{scan.Id}", reader.Url);

        await trainee.Opens($"/scans/{scan.Id}");
        Assert.Contains("false negative, image quality 2 of 5", trainee.Text, StringComparison.Ordinal);
        Assert.Contains("image quality from 4 of 5 to 2 of 5; result from TN to FN; another feedback; Pericardial effusion from No to Yes.", trainee.Text, StringComparison.Ordinal);
        Assert.Contains($"{world.Reader.Name} corrected reading 1 and said why: image quality from 4 of 5 to 2 of 5", trainee.Text, StringComparison.Ordinal);
        Assert.Contains($"Why: {Why}", trainee.Text, StringComparison.Ordinal);
        Assert.Contains($"Feedback before: Feedback {World.Secret}", trainee.Text, StringComparison.Ordinal);
        foreach (var day in new[] { "2026-03-01", "2026-03-03" }) Assert.Contains("0 scans count", await Standing(trainee, day), StringComparison.Ordinal);
        Assert.Contains("Withdrawn scans and corrected readings apply to every day.", trainee.Text, StringComparison.Ordinal);
        Assert.Contains("nearest gap is 2 scans in Lung", (await trainee.Opens("/")).Text, StringComparison.Ordinal);
        Assert.Contains("0 scans count, 0 wait", await Standing(trainee, "2026-02-28"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_days_of_the_original_decide_from_when_there_is_a_reading()
    {
        var world = await site.NewWorld();
        var scan = await world.Read(2, world.Entry(at: world.Now.AddHours(-3)));
        await world.With(scan, s => s.Correct(world.Reader, s.Readings[0], world.Judgement(4), "Seen again.", world.Now.AddDays(5)));
        var evidence = (await site.Ask(db => db.EvidenceOf([world.Trainee.Id])))[world.Trainee.Id].Single();
        Assert.Equal((scan.Readings[0].At, 4), (evidence.Reading!.At, evidence.Reading.Quality));
    }

    [Fact]
    public async Task Another_application_is_answered_by_its_own_questions()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        using var reader = await Form(world, world.Reader, scan);
        await reader.Fills("Application", "lung").Fills(Reason, Why).Presses("Show its questions");
        Assert.Equal((HttpStatusCode.OK, Why), (reader.Status, reader.Typed(Reason)));
        foreach (var question in new[] { "Lung sliding seen on both sides?", "Three or more B-lines in one space?", "Consolidation?", "Pleural effusion?" }) reader.Chooses(question, "No");
        await reader.Presses(Button);
        Assert.Equal(site.Applications["lung"].Id, (await site.Kept(scan.Id))!.Readings[0].ApplicationId);
        await reader.Opens($"/scans/{scan.Id}/readings/1/corrections/new");
        Assert.NotNull(reader.Page.QuerySelector("input[name='Form.Answers[sliding]'][checked], input[name='Form.Answers[lung-sliding]'][checked]"));
    }

    [Fact]
    public async Task What_is_missing_or_unchanged_is_said_at_its_field_and_nothing_is_lost()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        using var reader = await Form(world, world.Reader, scan);
        await reader.Presses(Button);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, reader.Status);
        Assert.Equal(["Give the reason.", "Nothing is changed: this is the reading as it stands."], reader.Faults());
        await reader.Chooses("Image quality 1 to 5", Poor).Fills(Reason, "DOB 5/6/71").Presses(Button);
        Assert.Equal(["This looks like a date of birth. Take it out: nothing here may identify a patient."], reader.Faults());
        Assert.Equal("DOB 5/6/71", reader.Typed(Reason));
        Assert.NotNull(reader.Page.QuerySelector("input[name='Form.Quality'][value='2'][checked]"));
        Assert.Empty((await site.Kept(scan.Id))!.Readings[0].Corrections);
    }

    [Fact]
    public async Task Who_was_slower_is_told_and_keeps_what_was_typed()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        using var reader = await Form(world, world.Reader, scan);
        await world.With(scan, s => s.Correct(world.Reader, s.Readings[0], world.Judgement(3), "Seen again.", world.Now));
        await reader.Chooses("Image quality 1 to 5", Poor).Fills(Reason, Why).Presses(Button);
        Assert.Equal((HttpStatusCode.Conflict, Why), (reader.Status, reader.Typed(Reason)));
        Assert.NotNull(reader.Page.QuerySelector("input[name='Form.Quality'][value='2'][checked]"));
        await reader.Presses(Button);
        var reading = (await site.Kept(scan.Id))!.Readings[0];
        Assert.Equal((2, 2), (reading.Quality!.Value, reading.Corrections.Count));
        Assert.Equal(Result.TN, reading.Result);
    }

    [Fact]
    public async Task A_withdrawn_scan_is_corrected_no_more()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        using var reader = await Form(world, world.Reader, scan);
        await world.Withdrawn(scan);
        await reader.Chooses("Image quality 1 to 5", Poor).Fills(Reason, Why).Presses(Button);
        Assert.Equal((HttpStatusCode.Conflict, "This scan is withdrawn."), (reader.Status, reader.Page.QuerySelector(".why-not")!.TextContent));
    }

    [Fact]
    public async Task Nobody_else_finds_the_form()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        foreach (var person in new[] { world.Trainee, world.Director, await world.Another("Rhea", MembershipKind.Reader), (await site.NewWorld()).Reader })
        {
            using var visitor = await Form(world, person, scan);
            Assert.Equal(HttpStatusCode.NotFound, visitor.Status);
        }
        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}/readings/2/corrections/new");
        Assert.Equal(HttpStatusCode.NotFound, reader.Status);
    }

    private static async Task<Visitor> Form(World world, Person person, Scan scan) => await (await world.As(person)).Opens($"/scans/{scan.Id}/readings/1/corrections/new");

    private static async Task<string> Standing(Visitor trainee, string day)
    {
        var url = (await trainee.Opens("/standings")).Url;
        return (await trainee.Opens($"{url}?asOf={day}")).Text;
    }
}
