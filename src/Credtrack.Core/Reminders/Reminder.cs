using System.Globalization;
using Credtrack.Core.Measures;
using Credtrack.Core.People;

namespace Credtrack.Core.Reminders;

/// <summary>ReadingsOverdue is for those who read, ReadingsLongOverdue for those who see to it that somebody does.</summary>
public enum ReminderKind { ReadingsOverdue, ReadingsLongOverdue }

/// <summary>That one person is told, once in a period, that a matter waits. Whether it still waits is looked up, never stored.</summary>
public sealed class Reminder : Recorded
{
    public const int LongestPeriod = 20;

    /// <summary>After the readers have had their days, the coordinators hear of it.</summary>
    public const int DaysOfReaders = 7;

    public Guid PersonId { get; private init; }
    public ReminderKind Kind { get; private init; }

    /// <summary>The programme, of the kinds there are so far.</summary>
    public Guid SubjectId { get; private init; }

    /// <summary>In which one such reminder is enough: 2026-W10.</summary>
    public string Period { get; private init; } = "";

    /// <summary>Its matter is what has waited since before this instant.</summary>
    public DateTime Before { get; private init; }
    public DateTime MadeAt { get; private init; }

    /// <summary>When a letter with it was handed over.</summary>
    public DateTime? SentAt { get; private set; }

    private Reminder() { }

    /// <summary>The ISO week of a day.</summary>
    public static string WeekOf(DateOnly day) => string.Create(CultureInfo.InvariantCulture, $"{ISOWeek.GetYear(day):D4}-W{ISOWeek.GetWeekOfYear(day):D2}");

    public static int DaysUntil(ReminderKind kind, Site site) => site.LateAfterDays + (kind == ReminderKind.ReadingsLongOverdue ? DaysOfReaders : 0);

    /// <summary>What was submitted before this instant has on that day waited so many calendar days of the site.</summary>
    public static DateTime LateBefore(ReminderKind kind, Site site, DateOnly today) =>
        LocalTimes.StartOfDay(today.AddDays(1 - DaysUntil(kind, site)), TimeZoneInfo.FindSystemTimeZoneById(site.TimeZone));

    public static MembershipKind For(ReminderKind kind) => kind == ReminderKind.ReadingsOverdue ? MembershipKind.Reader : MembershipKind.Coordinator;

    /// <param name="person">with the memberships in force</param>
    public static string? WhyNotMake(Person person, ReminderKind kind, Guid programmeId) =>
          person.Is(For(kind), programmeId)           ? null
        : kind == ReminderKind.ReadingsOverdue        ? "Only this programme's readers are reminded of what they should read."
        :                                               "Only this programme's coordinators are reminded of what nobody has read.";

    public static Reminder Make(Person person, ReminderKind kind, Guid programmeId, string period, DateTime before, DateTime at)
    {
        RuleBroken.If(WhyNotMake(person, kind, programmeId));
        var reminder = new Reminder { Id = Guid.CreateVersion7(at), PersonId = person.Id, Kind = kind, SubjectId = programmeId, Period = period, Before = before, MadeAt = at };
        reminder.Record(new ReminderMade(person, at, kind, period));
        return reminder;
    }

    /// <summary>Asked again before a letter goes out: who has left meanwhile gets none.</summary>
    public string? WhyNotSend(Person person) =>
          person.Id != PersonId ? "This reminder is for somebody else."
        : SentAt is not null    ? "This reminder has been sent."
        : WhyNotMake(person, Kind, SubjectId);

    /// <summary>Once the letter is handed over.</summary>
    public void Send(Person person, DateTime at)
    {
        RuleBroken.If(WhyNotSend(person));
        SentAt = at;
        Record(new ReminderSent(person, at, Kind, Period));
    }
}
