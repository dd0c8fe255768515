namespace Credtrack.Web.Features.Sessions;

public sealed record SessionLine(Guid Id, DateTime StartedAt, DateTime GoodUntil, string Browser);

/// <summary>Where one is signed in at present, the newest first.</summary>
public sealed record SessionsPage(IReadOnlyList<SessionLine> Lines, string? Address)
{
    public const int Most = 50;

    public static async Task<SessionsPage> Load(CredtrackDb db, Me me, DateTime at) => new(
        await db.Sessions.Open(at).Where(s => s.AccountId == me.Person.Id).OrderByDescending(s => s.StartedAt).Take(Most).Select(s => new SessionLine(s.Id, s.StartedAt, s.GoodUntil, s.Browser)).ToListAsync(),
        await db.Users.Where(a => a.Id == me.Person.Id).Select(a => a.Email).SingleOrDefaultAsync());
}
