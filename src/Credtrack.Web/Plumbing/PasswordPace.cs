using System.Globalization;
using System.Net;
using Microsoft.AspNetCore.Identity;

namespace Credtrack.Web.Plumbing;

/// <summary>
/// Slows down who guesses passwords: after ten wrong ones each further try has to wait, twice as long each time, up to a quarter of an hour.
/// Kept in memory: a restart forgets it, and the few tries won by that do not matter.
/// </summary>
public sealed class PasswordPace(TimeProvider clock)
{
    public const int Free = 10;

    /// <summary>From many places together, for one address.</summary>
    public const int FreeFromAll = 100;
    private const int Most = 100_000;
    private static readonly TimeSpan Longest = TimeSpan.FromMinutes(15), Forgotten = TimeSpan.FromDays(1);

    private readonly Dictionary<string, (int Wrong, DateTime Last)> tries = new(StringComparer.Ordinal);
    private readonly Lock door = new();

    /// <summary>Counts one more try as wrong, until it is found right; or says how long to wait before the next one is looked at.</summary>
    public TimeSpan WaitBefore(string key, int free = Free)
    {
        lock (door)
        {
            var (now, (wrong, last)) = (clock.UtcNow(), tries.GetValueOrDefault(key));
            if (now - last > Forgotten) wrong = 0;
            var next = last + (wrong < free ? TimeSpan.Zero : TimeSpan.FromSeconds(Math.Min(Longest.TotalSeconds, Math.Pow(2, wrong - free + 1))));
            if (wrong >= free && now < next) return next - now;
            if (tries.Count >= Most) tries.Remove(tries.MinBy(t => (t.Value.Wrong, t.Value.Last)).Key);
            tries[key] = (wrong + 1, now);
            return TimeSpan.Zero;
        }
    }

    /// <summary>
    /// Of a browser that is not known: counted by address and by where it comes from, so that one stranger does not take the owner's turns; and, far
    /// more loosely, by the address alone.
    /// </summary>
    public TimeSpan WaitBefore(string address, IPAddress? from)
    {
        var here = WaitBefore(Here(address, from));
        return here > TimeSpan.Zero ? here : WaitBefore(address.ToUpperInvariant(), FreeFromAll);
    }

    public void Right(string address, IPAddress? from)
    {
        Right(Here(address, from));
        Right(address.ToUpperInvariant());
    }

    private static string Here(string address, IPAddress? from) => $"{address.ToUpperInvariant()} {from}";

    public void Right(string key)
    {
        lock (door) tries.Remove(key);
    }

    /// <summary>Of somebody who is signed in already and proves it afresh: null, or why not.</summary>
    public async Task<string?> Judge(UserManager<Account> accounts, Account account, string password)
    {
        if (WaitBefore($"{account.Id}") is { Ticks: > 0 } wait) return TooMany(wait);
        if (!account.HasPassword || !await accounts.CheckPasswordAsync(account, password)) return "This is not your password.";
        Right($"{account.Id}");
        return null;
    }

    public static string TooMany(TimeSpan wait) => string.Create(CultureInfo.InvariantCulture, $"Too many wrong passwords were tried. Wait {Math.Ceiling(wait.TotalSeconds)} seconds, then try again.");
}
