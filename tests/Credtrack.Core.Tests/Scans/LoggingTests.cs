using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class LoggingTests
{
    private readonly Cast cast = new();

    [Fact]
    public void A_scan_is_what_its_trainee_said()
    {
        var settings = new MachineSettings(Transducer.Linear, 60, 9500, 110, 40);
        var entry = cast.Entry("msk") with
        {
            Subtype = "knee", Role = Role.Interpreted, Setting = Setting.Education, Indicated = false, Assisted = true,
            Supervision = Supervision.Direct, Supervisor = cast.Reader, Settings = settings, Note = "Left side.", ViewsShown = ["plane-2"],
        };
        var scan = cast.Draft(entry);
        Assert.Equal((cast.Trainee.Id, cast.Programme.Id, cast["msk"].Id), (scan.TraineeId, scan.ProgrammeId, scan.ApplicationId));
        Assert.Equal(("knee", Cast.Noon.AddHours(-1), Cast.Noon), (scan.Subtype, scan.PerformedAt, scan.LoggedAt));
        Assert.Equal((Role.Interpreted, Setting.Education, false, true), (scan.Role, scan.Setting, scan.Indicated, scan.Assisted));
        Assert.Equal((Supervision.Direct, cast.Reader.Id), (scan.Supervision, scan.SupervisorId));
        Assert.Equal((settings, "Left side."), (scan.Settings, scan.Note));
        Assert.Equal([("plane-1", false), ("plane-2", true), ("other-side", false)], scan.Views.Select(v => (v.Code, v.Marked)));
        Assert.Equal(cast["msk"].Questions.Select(q => q.With(entry.Answers[q.Code])), scan.Answers);
    }

    [Fact]
    public void A_scan_keeps_the_id_it_was_asked_for_with()
    {
        var id = Guid.CreateVersion7(Cast.Noon);
        Assert.Equal(id, Scan.Log(cast.Trainee, cast.Programme, id, cast.Entry(), null, Cast.Noon).Id);
    }

    [Theory]
    [InlineData(MembershipKind.Reader)]
    [InlineData(MembershipKind.Director)]
    [InlineData(MembershipKind.Coordinator)]
    [InlineData(MembershipKind.Chair)]
    public void Only_trainees_log_scans(MembershipKind kind) => IsRefused(cast.Enrol("Olu", kind));

    [Fact]
    public void A_trainee_of_another_programme_logs_no_scan_in_this_one() => IsRefused(cast.Enrol("Olu", cast.Elsewhere, MembershipKind.Trainee));

    [Theory]
    [InlineData(-1, null)]
    [InlineData(0, null)]
    [InlineData(1, "This time has not come yet. Enter when the scan was performed.")]
    public void A_scan_is_logged_after_it_was_performed(int milliseconds, string? why) =>
        Assert.Equal(why, WhyNot(cast.Entry() with { PerformedAt = Cast.Noon.AddMilliseconds(milliseconds) }));

    [Theory]
    [InlineData("msk", null, null)]
    [InlineData("msk", "knee", null)]
    [InlineData("msk", "Knee", "Choose a part that belongs to Musculoskeletal, or none.")]
    [InlineData("msk", "radial", "Choose a part that belongs to Musculoskeletal, or none.")]
    [InlineData("cardiac", "knee", "Choose a part that belongs to Focused cardiac, or none.")]
    public void A_part_is_chosen_from_the_list(string code, string? part, string? why) => Assert.Equal(why, WhyNot(cast.Entry(code) with { Subtype = part }));

    [Theory]
    [InlineData(null, null)]
    [InlineData(ScanEntry.LongestNote, null)]
    [InlineData(ScanEntry.LongestNote + 1, "Keep the note within 1000 characters.")]
    public void A_note_has_its_length(int? length, string? why) => Assert.Equal(why, WhyNot(cast.Entry() with { Note = length is { } n ? new string('n', n) : null }));

    [Fact]
    public void Every_fault_is_told_with_the_value_it_is_about()
    {
        var entry = cast.Entry() with
        {
            PerformedAt = Cast.Noon.AddDays(1), Subtype = "knee", Supervision = Supervision.Direct, Note = new string('n', 1001), Settings = new(null, 0, null, null, null),
        };
        Assert.Equal(["PerformedAt", "Subtype", "Supervisor", "Note", "DepthMm"], entry.Faults(cast.Trainee.Id, cast.Programme.Id, Cast.Noon).Select(f => f.About));
        Refused.With("This time has not come yet. Enter when the scan was performed.", () => cast.Draft(entry));
    }

    private string? WhyNot(ScanEntry entry) => Scan.WhyNotLog(cast.Trainee, cast.Programme, entry, Cast.Noon);

    private void IsRefused(Person person) => Refused.With("Only this programme's trainees log scans in it.",
        Scan.WhyNotLog(person, cast.Programme, cast.Entry(), Cast.Noon),
        () => Scan.Log(person, cast.Programme, Guid.CreateVersion7(Cast.Noon), cast.Entry(), null, Cast.Noon));
}
