using Credtrack.Core.People;
using Microsoft.AspNetCore.Identity;

namespace Credtrack.Data;

/// <summary>How a person signs in. Its key is the person's; what happens to it is told as a fact of the person. Without a password it has been invited only.</summary>
public sealed class Account : IdentityUser<Guid>
{
    public const int LongestAddress = 200;

    public bool HasPassword => PasswordHash is not null;

    public static Account Open(Person person, string address, Person by, DateTime at)
    {
        person.OpenAccount(by, at);
        var folded = Folded(address);
        return new() { Id = person.Id, UserName = address, NormalizedUserName = folded, Email = address, NormalizedEmail = folded, SecurityStamp = Guid.NewGuid().ToString("N") };
    }

    /// <summary>As addresses are compared.</summary>
    public static string Folded(string address) => address.Normalize().ToUpperInvariant();
}
