using System.Text.Json;
using Credtrack.Core.FollowUps;
using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.FollowUps;

public sealed class FollowUpTests
{
    private static readonly ClosingEntry Told = new("The consultant on call", Cast.Noon.AddHours(1), Way.Telephone, "Seen again the same evening.");

    private readonly Cast cast = new();

    [Fact]
    public void A_reader_opens_one_for_a_scan_that_was_read()
    {
        var scan = cast.Read();
        var followUp = FollowUp.Open(cast.Reader, scan, [], Cast.Noon.AddHours(1));
        Assert.Equal((scan.Id, scan.ProgrammeId, cast.Trainee.Id, cast.Reader.Id, Cast.Noon, true), (followUp.ScanId, followUp.ProgrammeId, followUp.TraineeId, followUp.OpenedById, followUp.ReadAt, followUp.IsOpen));
        Assert.Equal("Ruth opened a follow-up: a discrepancy touches the patient's care.", followUp.NewFacts[^1].Sentence);
    }

    [Fact]
    public void Also_of_a_withdrawn_scan_and_again_once_the_first_is_closed()
    {
        var scan = cast.Read();
        scan.Withdraw(cast.Trainee, "Logged twice.", Cast.Noon);
        var first = FollowUp.Open(cast.Reader, scan, [], Cast.Noon);
        CannotOpen("A follow-up of this scan is open already.", scan, cast.Reader, first);
        first.Close(cast.Reader, Told, Cast.Noon.AddHours(2));
        Assert.Null(FollowUp.WhyNotOpen(cast.Reader, scan, [first]));
    }

    [Fact]
    public void Without_an_own_reading_nobody_opens_one()
    {
        CannotOpen("Only a reader who has read this scan opens a follow-up of it.", cast.Waiting(), cast.Reader);
        CannotOpen("Only a reader who has read this scan opens a follow-up of it.", cast.Read(), cast.Enrol("Rhea", MembershipKind.Reader));
        CannotOpen("Only this programme's readers open a follow-up.", cast.Read(), cast.Director);
        CannotOpen("Nobody opens a follow-up of their own scan; ask its reader.", cast.Read(), cast.Trainee);
    }

    [Fact]
    public void The_director_or_the_reader_who_opened_it_closes_it_and_it_keeps_who_was_told()
    {
        foreach (var person in new[] { cast.Director, cast.Reader })
        {
            var followUp = Opened();
            followUp.Close(person, Told, Cast.Noon.AddHours(2));
            Assert.Equal((false, Cast.Noon.AddHours(2), person.Id, "The consultant on call"), (followUp.IsOpen, followUp.ClosedAt, followUp.Closing!.ById, followUp.Closing.Told));
            Assert.Equal($"{person.Name} closed the follow-up: told at 2026-03-01 13:00 UTC (Telephone), and wrote who was told.", followUp.NewFacts[^1].Sentence);
            Assert.DoesNotContain("consultant", JsonSerializer.Serialize(followUp.NewFacts[^1], typeof(FollowUpClosed)), StringComparison.Ordinal);
            CannotClose("This follow-up is closed.", followUp, person);
        }
    }

    [Fact]
    public void Nobody_else_closes_it()
    {
        CannotClose("Nobody closes a follow-up of their own scan.", Opened(), cast.Trainee);
        foreach (var person in new[] { cast.Enrol("Cora", MembershipKind.Coordinator), cast.Enrol("Rhea", MembershipKind.Reader), cast.Enrol("Dee", cast.Elsewhere, MembershipKind.Director) })
            CannotClose("Only the programme's director or the reader who opened a follow-up closes it.", Opened(), person);
    }

    [Fact]
    public void What_is_written_is_whole_possible_and_names_nobody()
    {
        (ClosingEntry Entry, string About, string Why)[] cases =
        [
            (Told with { Told = " " }, "Told", "Write who was told, by their part in the care."),
            (Told with { Told = new string('x', 201) }, "Told", "Keep it within 200 characters."),
            (Told with { Told = "Mrs Quillfeather" }, "Told", "This looks like a name. Take it out: nothing here may identify a patient."),
            (Told with { ToldAt = Cast.Noon.AddHours(3) }, "ToldAt", "This time has not come yet. Enter when they were told."),
            (Told with { ToldAt = Cast.Noon.AddMinutes(-1) }, "ToldAt", "This is before the reading. Enter when they were told what it found."),
            (Told with { Remark = "DOB 5/6/71" }, "Remark", "This looks like a date of birth. Take it out: nothing here may identify a patient."),
        ];
        Assert.All(cases, c =>
        {
            Assert.Equal([(c.About, c.Why)], c.Entry.Faults(Cast.Noon, Cast.Noon.AddHours(2)));
            Refused.With(c.Why, () => Opened().Close(cast.Director, c.Entry, Cast.Noon.AddHours(2)));
        });
        Assert.Empty((Told with { ToldAt = Cast.Noon, Remark = null }).Faults(Cast.Noon.AddSeconds(40), Cast.Noon.AddHours(2)));
    }

    private FollowUp Opened() => FollowUp.Open(cast.Reader, cast.Read(), [], Cast.Noon);

    private static void CannotOpen(string why, Scan scan, Person by, params FollowUp[] earlier) => Refused.With(why, FollowUp.WhyNotOpen(by, scan, earlier), () => FollowUp.Open(by, scan, earlier, Cast.Noon));

    private static void CannotClose(string why, FollowUp followUp, Person by) => Refused.With(why, followUp.WhyNotClose(by), () => followUp.Close(by, Told, Cast.Noon.AddHours(2)));
}
