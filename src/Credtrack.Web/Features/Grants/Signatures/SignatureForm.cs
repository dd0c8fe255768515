using System.ComponentModel.DataAnnotations;
using Credtrack.Core.Grants;
using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Grants.Signatures;

public sealed class SignatureForm
{
    public int Version { get; set; }

    /// <summary>Of the text that was on the screen; what is signed is what was shown.</summary>
    public string? Digest { get; set; }

    [StringLength(Signature.LongestText)]
    public string? Shown { get; set; }

    [Display(Name = "Your signature means"), Required(ErrorMessage = "Choose what your signature means.")]
    public Meaning? Meaning { get; set; }

    [Display(Name = "Why you sign although not everything is met"), NamesNobody]
    public string? GapReason { get; set; }

    [Display(Name = "Your password, again"), DataType(DataType.Password), Required(ErrorMessage = "Enter your password, so that the signature is yours and not that of an open screen.")]
    [StringLength(200, ErrorMessage = "A password has 200 characters at most.")]
    public string? Password { get; set; }

    /// <summary>What only the page and the account can judge: a gap asks for its reason, and the password must be the signer's.</summary>
    public async Task Judge(SignaturePage page, UserManager<Account> accounts, PasswordPace pace, Person signer, ModelStateDictionary faults)
    {
        if (page.Statement.Gaps.Count > 0 && string.IsNullOrWhiteSpace(GapReason))
            faults.AddModelError("Form.GapReason", "Not everything is met: say why you sign all the same. The reason is printed on the paper.");
        if (string.IsNullOrEmpty(Password)) return;
        if (await pace.Judge(accounts, (await accounts.FindByIdAsync(signer.Id.ToString()))!, Password) is { } why) faults.AddModelError("Form.Password", $"{why} Nothing was signed.");
    }
}
