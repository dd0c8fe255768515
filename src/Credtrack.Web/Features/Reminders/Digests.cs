using System.Security.Cryptography;
using System.Text;
using Credtrack.Core.Measures;
using Credtrack.Core.Reminders;
using Credtrack.Web.Plumbing.Mail;
using Hangfire;

namespace Credtrack.Web.Features.Reminders;

/// <summary>
/// Gathers what a person has not been sent into one letter a day, from eight in the morning by the site's clock. It is marked as sent once it was
/// handed over: cut off in between, the same letter goes out again under the same id; refused, it is tried again in the next hour.
/// </summary>
public sealed class Digests(CredtrackDb db, IPost post, Settings settings, TimeProvider clock)
{
    private static readonly TimeOnly Hour = new(8, 0);

    // The schedule comes by every quarter of an hour, because zones differ by quarters; by the site's clock this is once an hour.
    private const int Quarter = 15;

    // What could not be sent for so long is told by a newer one, if it still waits.
    private static readonly TimeSpan Stale = TimeSpan.FromDays(14);

    [DisableConcurrentExecution(timeoutInSeconds: 60)]
    public async Task Run(CancellationToken stop)
    {
        if (await db.Sites.AsNoTracking().SingleOrDefaultAsync(stop) is not { } site) return;
        var (now, zone) = (clock.UtcNow(), TimeZoneInfo.FindSystemTimeZoneById(site.TimeZone));
        var day = now.DayIn(zone);
        var (midnight, eight) = (LocalTimes.StartOfDay(day, zone), LocalTimes.ToUtc(day.ToDateTime(Hour), zone));
        if (now < eight || now.In(zone).Minute >= Quarter) return;
        var unsent = Unsent(eight);
        var due = await unsent.Where(r => !db.Reminders.Any(other => other.PersonId == r.PersonId && other.SentAt >= midnight)).Select(r => r.PersonId).Distinct().ToListAsync(stop);
        foreach (var person in due) await Send(person, unsent, site, day, stop);
    }

    // What came up after the hour of today's letter is for tomorrow's.
    private IQueryable<Reminder> Unsent(DateTime eight)
    {
        var oldest = eight - Stale;
        return db.Reminders.Where(r => r.SentAt == null && r.MadeAt < eight && r.MadeAt >= oldest);
    }

    private async Task Send(Guid id, IQueryable<Reminder> unsent, Site site, DateOnly day, CancellationToken stop)
    {
        db.ChangeTracker.Clear();
        var person = await db.PeopleAtWorkOn(day).SingleAsync(p => p.Id == id, stop);
        var address = await db.Users.Where(a => a.Id == id).Select(a => a.Email).SingleOrDefaultAsync(stop);
        var told = (await unsent.Where(r => r.PersonId == id).ToListAsync(stop)).Where(r => r.WhyNotSend(person) is null).ToLookup(r => r.Kind);
        var matters = new List<(ReminderKind Kind, int Days, int Scans)>();
        foreach (var kind in told)
        {
            var programmes = kind.Select(r => r.SubjectId).Distinct().ToList();
            var scans = await db.MatterOf(kind.Key, person).WaitingSinceBefore(Reminder.LateBefore(kind.Key, site, day)).CountAsync(s => programmes.Contains(s.ProgrammeId), stop);
            if (scans > 0) matters.Add((kind.Key, Reminder.DaysUntil(kind.Key, site), scans));
        }
        if (address is null || matters.Count == 0) return;
        var letter = new Letter(IdOf(id, day), address, person.Name, $"Credtrack at {site.Name}: scans wait for a reading", TextOf(matters));
        if ((await post.Send([letter])).Count > 0) return;
        foreach (var reminder in matters.SelectMany(m => told[m.Kind])) reminder.Send(person, clock.UtcNow());
        await db.SaveChangesAsync(stop);
    }

    /// <summary>The same for a person and a day, so that a letter which goes out twice is one.</summary>
    public static Guid IdOf(Guid person, DateOnly day) => new(SHA256.HashData(Encoding.UTF8.GetBytes($"digest {person} {day:O}")).AsSpan(0, 16));

    // Numbers and links: whoever may see more signs in. A letter lies in many places.
    private string TextOf(IEnumerable<(ReminderKind Kind, int Days, int Scans)> matters) => $"""
        {string.Join("\n\n", matters.OrderBy(m => m.Kind).Select(m => m.Kind == ReminderKind.ReadingsOverdue
            ? $"{m.Scans.Of("scan")} {(m.Scans == 1 ? "has" : "have")} waited for your reading for {m.Days.Of("day")} or longer:\n{settings.Link("readings")}"
            : $"{m.Scans.Of("scan")} {(m.Scans == 1 ? "has" : "have")} waited for {m.Days.Of("day")} or longer where you are coordinator:\n{settings.Link("scans?state=Waiting")}"))}

        All your reminders:
        {settings.Link("reminders")}
        """;
}
