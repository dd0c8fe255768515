using System.ComponentModel.DataAnnotations;

namespace Credtrack.Web.Features.Passwords;

/// <summary>What a link asks for. Name, address and the site are asked of a first administrator only; the page knows which.</summary>
public sealed class NewPasswordForm
{
    public string? Key { get; set; }

    [Display(Name = "Your name"), StringLength(Person.LongestName, ErrorMessage = "A name has 120 characters at most."), OneLine]
    public string? Name { get; set; }

    [Display(Name = "Your e-mail address"), StringLength(Account.LongestAddress, ErrorMessage = "An address has 200 characters at most."), EmailAddress(ErrorMessage = "Write the address like name@hospital.example.")]
    public string? Address { get; set; }

    [Display(Name = "Name of the institution"), StringLength(SiteEntry.LongestName, ErrorMessage = "A name has 120 characters at most."), OneLine]
    public string? SiteName { get; set; }

    [Display(Name = "Time zone")]
    public string? TimeZone { get; set; }

    [Display(Name = "Password"), DataType(DataType.Password), Required(ErrorMessage = "Choose a password.")]
    public string? Password { get; set; }

    [Display(Name = "The same password again"), DataType(DataType.Password)]
    [Compare(nameof(Password), ErrorMessage = "The two passwords differ. Type the same one twice.")]
    public string? Repeated { get; set; }
}
