using System.ComponentModel.DataAnnotations;
using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Passwords;

public sealed class PasswordForm
{
    [Display(Name = "Your password now"), DataType(DataType.Password), Required(ErrorMessage = "Enter the password that you have now.")]
    [StringLength(PasswordRule.Longest, ErrorMessage = "A password has 200 characters at most.")]
    public string? Current { get; set; }

    [Display(Name = "New password"), DataType(DataType.Password), Required(ErrorMessage = "Choose a new password.")]
    public string? Password { get; set; }

    [Display(Name = "The new password again"), DataType(DataType.Password)]
    [Compare(nameof(Password), ErrorMessage = "The two passwords differ. Type the same one twice.")]
    public string? Repeated { get; set; }

    public async Task Judge(UserManager<Account> accounts, Account account, Me me, PasswordPace pace, ModelStateDictionary faults)
    {
        if (await pace.Judge(accounts, account, Current!) is { } why) faults.AddModelError("Form.Current", why);
        if (PasswordRule.WhyNot(Password!, account.Email ?? "", me.Person.Name, me.Site.Name) is { } weak) faults.AddModelError("Form.Password", weak);
    }
}

public sealed record PasswordPage(PasswordForm Form);
