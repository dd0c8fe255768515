namespace Credtrack.Web.Features.Sessions;

/// <summary>Sign-ins that are long over: by then nobody looks for them, and the browsers that they name are nobody's business.</summary>
public sealed class EndedSessions(CredtrackDb db, TimeProvider clock)
{
    private const int AtOnce = 500;
    private static readonly TimeSpan Kept = TimeSpan.FromDays(30);

    public async Task Run(CancellationToken stop)
    {
        var before = clock.UtcNow() - Kept;
        while (await db.Sessions.Where(s => s.EndedAt < before || s.GoodUntil < before).OrderBy(s => s.StartedAt).Take(AtOnce).ToListAsync(stop) is { Count: > 0 } old)
        {
            db.RemoveRange(old);
            await db.SaveChangesAsync(stop);
        }
    }
}
