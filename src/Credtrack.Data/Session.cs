namespace Credtrack.Data;

/// <summary>One sign-in, on the server: what the cookie names. Ended here, it is over wherever its cookie has been copied to.</summary>
public sealed class Session
{
    public const int LongestBrowser = 200;

    public Guid Id { get; private init; }
    public Guid AccountId { get; private init; }
    public DateTime StartedAt { get; private init; }
    public DateTime GoodUntil { get; private init; }
    public DateTime? EndedAt { get; private set; }

    /// <summary>As the browser calls itself, so that its owner knows it again.</summary>
    public string Browser { get; private init; } = "";

    private Session() { }

    public static Session Start(Guid accountId, string browser, DateTime at, TimeSpan good) => new()
    {
        Id = Guid.NewGuid(), // nothing in it to guess the next one by
        AccountId = accountId,
        StartedAt = at,
        GoodUntil = at + good,
        Browser = browser.Length > LongestBrowser ? browser[..LongestBrowser] : browser,
    };

    public void End(DateTime at) => EndedAt ??= at;
}

public static class Sessions
{
    public static IQueryable<Session> Open(this IQueryable<Session> sessions, DateTime at) => sessions.Where(s => s.EndedAt == null && s.GoodUntil > at);
}
