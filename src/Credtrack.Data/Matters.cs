using Credtrack.Core.People;
using Credtrack.Core.Reminders;
using Credtrack.Core.Scans;

namespace Credtrack.Data;

/// <summary>What reminders are about, and whom they may reach.</summary>
public static class Matters
{
    /// <summary>The scans of which a person is reminded: a reader of those on their own bench, a coordinator of all that wait for somebody.</summary>
    public static IQueryable<Scan> MatterOf(this CredtrackDb db, ReminderKind kind, Person person) =>
        kind == ReminderKind.ReadingsOverdue ? db.ScansWaitingFor(person) : db.ScansWaitingUnder(person);

    public static IQueryable<Scan> WaitingSinceBefore(this IQueryable<Scan> scans, DateTime before) =>
        scans.Where(s => s.Submissions.Any(x => x.Return == null && x.At < before));

    /// <summary>Those in which something has waited since before an instant, and of which this person has not been reminded in this period.</summary>
    public static IQueryable<Guid> ProgrammesToRemindOf(this CredtrackDb db, ReminderKind kind, Person person, DateTime before, string period) =>
        db.MatterOf(kind, person).WaitingSinceBefore(before).Select(s => s.ProgrammeId).Distinct()
            .Where(id => !db.Reminders.Any(r => r.PersonId == person.Id && r.Kind == kind && r.SubjectId == id && r.Period == period));

    /// <summary>A person's reminders, each with whether its matter still waits.</summary>
    public static IQueryable<KnownReminder> RemindersOf(this CredtrackDb db, Person person)
    {
        var (own, led) = (db.ScansWaitingFor(person), db.ScansWaitingUnder(person));
        return db.Reminders.Where(r => r.PersonId == person.Id).Select(r => new KnownReminder
        {
            Reminder = r,
            Programme = db.Programmes.Where(p => p.Id == r.SubjectId).Select(p => p.Name).Single(),
            IsOpen = (r.Kind == ReminderKind.ReadingsOverdue && own.Any(s => s.ProgrammeId == r.SubjectId && s.Submissions.Any(x => x.Return == null && x.At < r.Before)))
                || (r.Kind == ReminderKind.ReadingsLongOverdue && led.Any(s => s.ProgrammeId == r.SubjectId && s.Submissions.Any(x => x.Return == null && x.At < r.Before))),
        });
    }

    /// <summary>With the memberships in force on a day. Whose place somebody else takes that day is left in peace.</summary>
    public static IQueryable<Person> PeopleAtWorkOn(this CredtrackDb db, DateOnly day)
    {
        var inForce = db.People.SelectMany(p => p.Memberships).Where(m => m.FirstDay <= day && (m.LastDay == null || m.LastDay >= day));
        return db.People.AsNoTracking().Include(p => p.Memberships.Where(m => m.FirstDay <= day && (m.LastDay == null || m.LastDay >= day)
            && !inForce.Any(other => other.StandsInForId == m.PersonId && other.ProgrammeId == m.ProgrammeId && other.Kind == m.Kind)));
    }
}

/// <summary>A reminder as its person sees it.</summary>
public sealed class KnownReminder
{
    public required Reminder Reminder { get; init; }
    public required string Programme { get; init; }
    public required bool IsOpen { get; init; }
}
