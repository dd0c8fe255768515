using Credtrack.Core.Catalogue;
using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class ChangeTests
{
    private readonly Cast cast = new();

    [Fact]
    public void Only_the_person_who_logged_a_scan_changes_it()
    {
        foreach (var person in new[] { cast.Reader, cast.Director, cast.Enrol("Tess", MembershipKind.Trainee) })
            IsRefused("Only the person who logged a scan changes it.", cast.Draft(), person);
    }

    [Fact]
    public void A_scan_changes_until_it_is_read()
    {
        foreach (var scan in new[] { cast.Draft(), cast.Waiting(), cast.Returned() })
        {
            scan.Change(cast.Trainee, cast.Entry() with { Assisted = true }, [], [], Cast.Noon);
            Assert.True(scan.Assisted);
        }
        IsRefused("This scan has been read; what was read stays as it is.", cast.Read(), cast.Trainee);
        IsRefused("This scan is withdrawn.", cast.Discarded(), cast.Trainee);
    }

    [Fact]
    public void What_may_not_be_logged_may_not_be_changed_to() => Refused.With("This time has not come yet. Enter when the scan was performed.",
        () => cast.Draft().Change(cast.Trainee, cast.Entry() with { PerformedAt = Cast.Noon.AddDays(1) }, [], [], Cast.Noon));

    [Fact]
    public void The_ledger_names_each_value_that_changed()
    {
        var entry = cast.Entry("msk");
        (ScanEntry To, string Said)[] changes =
        [
            (entry with { Subtype = "knee" }, "part from none to knee"),
            (entry with { PerformedAt = Cast.Noon.AddHours(-2) }, "time performed from 2026-03-01 11:00:00 UTC to 2026-03-01 10:00:00 UTC"),
            (entry with { PerformedAt = Cast.Noon.AddHours(-1).AddMilliseconds(40) }, "time performed from 2026-03-01 11:00:00 UTC to 2026-03-01 11:00:00.04 UTC"),
            (entry with { Role = Role.Interpreted }, "role from Performed to Interpreted"),
            (entry with { Setting = Setting.Simulation }, "setting from Clinical to Simulation"),
            (entry with { Indicated = false }, "clinically indicated from yes to no"),
            (entry with { Supervision = Supervision.None }, "supervision from Later to None"),
            (entry with { Supervision = Supervision.Direct, Supervisor = cast.Reader }, "supervision from Later to Direct; another supervisor"),
            (entry with { Assisted = true }, "hands-on help from no to yes"),
            (entry with { Settings = new(Transducer.Linear, null, null, null, null) }, "transducer from none to Linear"),
            (entry with { Settings = new(null, 55, 9500, 110, 40) },
                "depth in mm from none to 55; frequency in kHz from none to 9500; mechanical index in hundredths from none to 110; thermal index in hundredths from none to 40"),
            (entry with { Note = "Fell from a ladder." }, "another note"),
            (entry with { ViewsShown = ["plane-1", "plane-2"] }, "view Other side from shown to not shown"),
            (entry with { Answers = new Dictionary<string, Answer> { ["effusion"] = Answer.Unclear, ["step"] = Answer.No } },
                "Joint effusion from No to Unclear; Gap in the tendon from No to open"),
        ];
        Assert.All(changes, change => Assert.Equal([$"Tariq changed the scan: {change.Said}."], SaidOf(entry, change.To)));
    }

    [Fact]
    public void Another_application_is_told_with_its_views_and_answers() => Assert.Equal(
        ["Tariq changed the scan: another application; view Long axis with liver, near the atrium: shown; Small and collapsing with breathing: No; Wide and hardly moving: No."],
        SaidOf(cast.Entry("msk"), cast.Entry("ivc")));

    [Fact]
    public void A_change_of_nothing_leaves_no_fact() => Assert.Empty(SaidOf(cast.Entry(), cast.Entry()));

    private IEnumerable<string> SaidOf(ScanEntry from, ScanEntry to)
    {
        var scan = cast.Draft(from);
        scan.TakeFacts();
        scan.Change(cast.Trainee, to, [], [], Cast.Noon);
        return scan.NewFacts.Select(f => f.Sentence);
    }

    private void IsRefused(string why, Scan scan, Person by) => Refused.With(why, scan.WhyNotChange(by), () => scan.Change(by, cast.Entry(), [], [], Cast.Noon));
}
