using Microsoft.AspNetCore.DataProtection;

namespace Credtrack.Web.Plumbing;

/// <summary>
/// A browser in which somebody has signed in before keeps a note of it. Its wrong passwords are counted on their own, so that a stranger's
/// guessing slows the stranger down and not the owner.
/// </summary>
public sealed class KnownDevice(IDataProtectionProvider protection)
{
    private const string Cookie = "credtrack-device";
    private static readonly TimeSpan Kept = TimeSpan.FromDays(180);

    private readonly IDataProtector seal = protection.CreateProtector("device");

    /// <summary>The browser's own note, if this person has signed in with it before.</summary>
    public string? NoteOf(HttpRequest request, Guid? accountId) =>
        accountId is { } id && seal.Opened(request.Cookies[Cookie]) is { } note && note.StartsWith($"{id} ", StringComparison.Ordinal) ? note : null;

    public void Remember(HttpContext context, Guid accountId)
    {
        if (seal.Opened(context.Request.Cookies[Cookie])?.StartsWith($"{accountId} ", StringComparison.Ordinal) == true) return;
        var options = new CookieOptions { HttpOnly = true, SameSite = SameSiteMode.Strict, Secure = context.Request.IsHttps, MaxAge = Kept, IsEssential = true };
        context.Response.Cookies.Append(Cookie, seal.Protect($"{accountId} {Guid.NewGuid()}"), options);
    }
}
