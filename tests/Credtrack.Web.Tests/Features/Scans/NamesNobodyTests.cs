namespace Credtrack.Web.Tests.Features.Scans;

/// <summary>What is written beside a scan names no patient: what has the form of an identifier is refused beside its field, and stays typed.</summary>
public sealed class NamesNobodyTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Why = "This looks like a number of a person or a record. Take it out: nothing here may identify a patient.";
    private const string Text = "MRN 00482915, free fluid";

    [Fact]
    public async Task A_trainees_note()
    {
        var world = await site.NewWorld();
        using var trainee = await world.Completes();
        await trainee.Fills("Note", Text).Presses(Logging.Submit);
        Refused(trainee, "Note");
        Assert.Empty(await site.ScansOf(world.Trainee));
    }

    [Fact]
    public async Task A_readers_feedback()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}/readings/new");
        foreach (var question in world.Cardiac.Questions) reader.Chooses(question.Text, "No");
        await reader.Chooses("Image quality 1 to 5", "4 All structures well seen").Fills("Feedback for the trainee", Text).Presses("Give this reading Ctrl ↵");
        Refused(reader, "Feedback for the trainee");
        Assert.Empty((await site.Kept(scan.Id))!.Readings);
    }

    [Fact]
    public async Task What_is_missing_from_a_returned_scan()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var reader = await (await world.As(world.Reader)).Opens($"/scans/{scan.Id}/returns/new");
        await reader.Fills("What is missing?", Text).Presses("Return it to the trainee");
        Refused(reader, "What is missing?");
    }

    private static void Refused(Visitor visitor, string label)
    {
        Assert.Equal(HttpStatusCode.UnprocessableEntity, visitor.Status);
        Assert.Equal([Why], visitor.Faults());
        Assert.Equal(Text, visitor.Typed(label));
    }
}
