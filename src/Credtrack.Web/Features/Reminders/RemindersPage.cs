using Credtrack.Core.Reminders;

namespace Credtrack.Web.Features.Reminders;

public sealed record ReminderLine(ReminderKind Kind, string Programme, DateTime MadeAt, DateTime? SentAt, bool IsOpen);

/// <summary>Those whose matter still waits first, then the others; the newest at the top. Fifty a page.</summary>
public sealed record RemindersPage(IReadOnlyList<ReminderLine> Lines, int Page, int Open, int All)
{
    public const int Size = 50;
    public bool HasMore => Page * Size < All;

    public static async Task<RemindersPage> Load(CredtrackDb db, Person person, int page)
    {
        var (all, open) = (await db.Reminders.CountAsync(r => r.PersonId == person.Id), await OpenOf(db, person));
        var lines = await db.RemindersOf(person).OrderBy(k => k.IsOpen ? 0 : 1).ThenByDescending(k => k.Reminder.MadeAt).ThenBy(k => k.Reminder.Id).Skip((page - 1) * Size).Take(Size)
            .Select(k => new ReminderLine(k.Reminder.Kind, k.Programme, k.Reminder.MadeAt, k.Reminder.SentAt, k.IsOpen)).ToListAsync();
        return new(lines, page, open, all);
    }

    /// <summary>How many of a person's reminders are about something that still waits; Open.cshtml says it.</summary>
    public static Task<int> OpenOf(CredtrackDb db, Person person) => db.RemindersOf(person).CountAsync(k => k.IsOpen);
}
