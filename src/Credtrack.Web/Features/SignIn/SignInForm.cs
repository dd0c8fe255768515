using System.ComponentModel.DataAnnotations;
using Microsoft.AspNetCore.Identity;

namespace Credtrack.Web.Features.SignIn;

public sealed class SignInForm : IValidatableObject
{
    // A well-formed hash of a word nobody knows: an unknown address costs as much time as a known one.
    private static readonly string Nobody = new PasswordHasher<Account>().HashPassword(new Account(), Guid.NewGuid().ToString());

    /// <summary>A demo person's own button; it counts only in demo mode.</summary>
    public Guid? PersonId { get; set; }

    [Display(Name = "E-mail address"), StringLength(200, ErrorMessage = "An address has 200 characters at most.")]
    public string? Address { get; set; }

    [Display(Name = "Password"), DataType(DataType.Password), StringLength(200, ErrorMessage = "A password has 200 characters at most.")]
    public string? Password { get; set; }

    public string? ReturnUrl { get; set; }

    public IEnumerable<ValidationResult> Validate(ValidationContext validationContext)
    {
        if (PersonId is not null) yield break;
        if (string.IsNullOrWhiteSpace(Address)) yield return new("Enter the e-mail address of your account.", [nameof(Address)]);
        if (string.IsNullOrEmpty(Password)) yield return new("Enter your password.", [nameof(Password)]);
    }

    public async Task<Account?> Prove(SignInManager<Account> signIn)
    {
        var account = await signIn.UserManager.FindByNameAsync(Address!.Trim());
        if (account is null)
        {
            signIn.UserManager.PasswordHasher.VerifyHashedPassword(new Account(), Nobody, Password!);
            return null;
        }
        return await signIn.UserManager.CheckPasswordAsync(account, Password!) ? account : null;
    }
}
