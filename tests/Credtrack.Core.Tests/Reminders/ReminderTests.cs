using Credtrack.Core.People;
using Credtrack.Core.Reminders;

namespace Credtrack.Core.Tests.Reminders;

public sealed class ReminderTests
{
    private static readonly DateTime Before = Cast.Noon.AddDays(-7);

    private readonly Cast cast = new();

    [Fact]
    public void It_is_made_for_a_person_and_sent_once()
    {
        var reminder = Made(cast.Reader, ReminderKind.ReadingsOverdue);
        Assert.Equal((cast.Reader.Id, cast.Programme.Id, "2026-W09", Before, null), (reminder.PersonId, reminder.SubjectId, reminder.Period, reminder.Before, reminder.SentAt));
        Assert.Equal("Ruth is to be reminded (ReadingsOverdue) in 2026-W09.", reminder.NewFacts[^1].Sentence);
        reminder.Send(cast.Reader, Cast.Noon.AddHours(1));
        Assert.Equal(Cast.Noon.AddHours(1), reminder.SentAt);
        Assert.Equal("Ruth was sent a letter with the reminder (ReadingsOverdue) of 2026-W09.", reminder.NewFacts[^1].Sentence);
        CannotSend("This reminder has been sent.", reminder, cast.Reader);
    }

    [Fact]
    public void Readers_are_reminded_of_their_readings_and_coordinators_of_what_nobody_has_read()
    {
        var (cora, elsewhere) = (cast.Enrol("Cora", MembershipKind.Coordinator), cast.Enrol("Rex", cast.Elsewhere, MembershipKind.Reader, MembershipKind.Coordinator));
        foreach (var person in new[] { cast.Trainee, cast.Director, cora, elsewhere })
            CannotMake("Only this programme's readers are reminded of what they should read.", person, ReminderKind.ReadingsOverdue);
        foreach (var person in new[] { cast.Trainee, cast.Director, cast.Reader, elsewhere })
            CannotMake("Only this programme's coordinators are reminded of what nobody has read.", person, ReminderKind.ReadingsLongOverdue);
        Assert.Equal(cora.Id, Made(cora, ReminderKind.ReadingsLongOverdue).PersonId);
    }

    [Fact]
    public void Who_has_left_meanwhile_or_is_somebody_else_is_sent_none()
    {
        var reminder = Made(cast.Reader, ReminderKind.ReadingsOverdue);
        CannotSend("This reminder is for somebody else.", reminder, cast.Enrol("Rhea", MembershipKind.Reader));
        var left = Person.Enrol("Ruth", cast.Director, Cast.Noon); // as she is loaded when no membership is in force
        typeof(Recorded).GetProperty(nameof(Recorded.Id))!.SetValue(left, cast.Reader.Id);
        CannotSend("Only this programme's readers are reminded of what they should read.", reminder, left);
    }

    [Theory] // ISO 8601: the week with the year's first Thursday is the first; 2026 begins on a Thursday and has 53
    [InlineData("2026-01-01", "2026-W01")]
    [InlineData("2026-03-08", "2026-W10")]
    [InlineData("2026-03-09", "2026-W11")]
    [InlineData("2027-01-03", "2026-W53")]
    [InlineData("2027-01-04", "2027-W01")]
    public void A_week_is_that_of_iso_8601(string day, string week) => Assert.Equal(week, Reminder.WeekOf(DateOnly.Parse(day, null)));

    [Theory] // Dublin's clocks go forward on 29 March 2026 and back on 25 October (tz database)
    [InlineData(ReminderKind.ReadingsOverdue, "2026-03-30", "2026-03-24T00:00:00Z")]
    [InlineData(ReminderKind.ReadingsOverdue, "2026-04-05", "2026-03-29T23:00:00Z")]
    [InlineData(ReminderKind.ReadingsLongOverdue, "2026-04-05", "2026-03-23T00:00:00Z")]
    [InlineData(ReminderKind.ReadingsOverdue, "2026-10-31", "2026-10-24T23:00:00Z")]
    [InlineData(ReminderKind.ReadingsOverdue, "2026-11-01", "2026-10-26T00:00:00Z")]
    public void Days_are_those_of_the_sites_calendar(ReminderKind kind, string today, string before)
    {
        var site = Site.Found(cast.Director, "Harbour", "Europe/Dublin", Cast.Noon);
        Assert.Equal(DateTime.Parse(before, null, System.Globalization.DateTimeStyles.AdjustToUniversal), Reminder.LateBefore(kind, site, DateOnly.Parse(today, null)));
    }

    private Reminder Made(Person person, ReminderKind kind) => Reminder.Make(person, kind, cast.Programme.Id, "2026-W09", Before, Cast.Noon);

    private void CannotMake(string why, Person person, ReminderKind kind) => Refused.With(why, Reminder.WhyNotMake(person, kind, cast.Programme.Id), () => Made(person, kind));

    private static void CannotSend(string why, Reminder reminder, Person person) => Refused.With(why, reminder.WhyNotSend(person), () => reminder.Send(person, Cast.Noon));
}
