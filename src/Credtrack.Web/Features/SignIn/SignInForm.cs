using System.ComponentModel.DataAnnotations;
using Microsoft.AspNetCore.Identity;

namespace Credtrack.Web.Features.SignIn;

public sealed class SignInForm : IValidatableObject
{
    // A well-formed hash of a word nobody knows: an unknown address costs as much time as a known one.
    private static readonly string Nobody = new PasswordHasher<Account>(Microsoft.Extensions.Options.Options.Create(new PasswordHasherOptions { IterationCount = Accounts.HashRounds })).HashPassword(new Account(), Guid.NewGuid().ToString());

    /// <summary>A demo person's own button; it counts only in demo mode.</summary>
    public Guid? PersonId { get; set; }

    [Display(Name = "E-mail address"), StringLength(Account.LongestAddress, ErrorMessage = "An address has 200 characters at most.")]
    public string? Address { get; set; }

    [Display(Name = "Password"), DataType(DataType.Password), StringLength(PasswordRule.Longest, ErrorMessage = "A password has 200 characters at most.")]
    public string? Password { get; set; }

    public string? ReturnUrl { get; set; }

    public IEnumerable<ValidationResult> Validate(ValidationContext validationContext)
    {
        if (PersonId is not null) yield break;
        if (string.IsNullOrWhiteSpace(Address)) yield return new("Enter the e-mail address of your account.", [nameof(Address)]);
        if (string.IsNullOrEmpty(Password)) yield return new("Enter your password.", [nameof(Password)]);
    }

    /// <summary>The account, or what is wrong: said alike of an address that is unknown, one that has no password yet, and a wrong password.</summary>
    public async Task<(Account? Account, string? Why)> Prove(UserManager<Account> accounts, PasswordPace pace, KnownDevice device, HttpContext context)
    {
        var account = await accounts.FindByNameAsync(Address!.Trim());
        var (note, from) = (device.NoteOf(context.Request, account?.Id), context.Connection.RemoteIpAddress);
        var wait = note is null ? pace.WaitBefore(Address.Trim(), from) : pace.WaitBefore(note);
        if (wait > TimeSpan.Zero) return (null, PasswordPace.TooMany(wait));
        if (account?.HasPassword != true)
        {
            accounts.PasswordHasher.VerifyHashedPassword(new Account(), Nobody, Password!);
        }
        else if (await accounts.CheckPasswordAsync(account, Password!))
        {
            if (note is null) pace.Right(Address.Trim(), from);
            else pace.Right(note);
            device.Remember(context, account.Id);
            return (account, null);
        }
        return (null, "This address and password do not belong together. Check both and try again.");
    }
}
