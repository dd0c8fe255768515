using Credtrack.Core.Reminders;
using Hangfire;

namespace Credtrack.Web.Features.Reminders;

/// <summary>Makes the reminders of scans that wait too long for a reading. Each is saved by itself, so that a run cut off is simply run again.</summary>
public sealed class OverdueReadings(CredtrackDb db, TimeProvider clock)
{
    [DisableConcurrentExecution(timeoutInSeconds: 60)]
    public async Task Run(CancellationToken stop)
    {
        if (await db.Sites.AsNoTracking().SingleOrDefaultAsync(stop) is not { } site) return;
        var day = clock.UtcNow().DayIn(TimeZoneInfo.FindSystemTimeZoneById(site.TimeZone));
        var staff = await db.PeopleAtWorkOn(day).Where(p => p.Memberships.Any(m => m.Kind == MembershipKind.Reader || m.Kind == MembershipKind.Coordinator)).ToListAsync(stop);
        foreach (var person in staff)
            foreach (var kind in Enum.GetValues<ReminderKind>().Where(k => person.Is(Reminder.For(k)))) await Remind(person, kind, site, day, stop);
    }

    private async Task Remind(Person person, ReminderKind kind, Site site, DateOnly day, CancellationToken stop)
    {
        var (before, week) = (Reminder.LateBefore(kind, site, day), Reminder.WeekOf(day));
        var due = await db.ProgrammesToRemindOf(kind, person, before, week).ToListAsync(stop);
        foreach (var programme in due)
        {
            db.Add(Reminder.Make(person, kind, programme, week, before, clock.UtcNow()));
            await db.SaveChangesAsync(stop);
        }
        db.ChangeTracker.Clear();
    }
}
