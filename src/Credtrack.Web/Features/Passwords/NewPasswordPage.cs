using Credtrack.Core.Catalogue;
using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Passwords;

/// <summary>What stands behind a link. Who opens the first one of all sets the site up with it.</summary>
public sealed record NewPasswordPage(Person Person, Invitation Invitation, Account? Account, Site? Site, string? WhyNot, NewPasswordForm Form)
{
    public bool AsksForPerson => Account is null;
    public bool AsksForSite => Site is null;

    public static async Task<NewPasswordPage?> Load(CredtrackDb db, NewPasswordForm form, DateTime at)
    {
        var digest = SecretKey.DigestOf(form.Key ?? "");
        var person = await db.People.Include(p => p.Invitations).SingleOrDefaultAsync(p => p.Invitations.Any(i => i.Digest == digest));
        if (person is null) return null;
        var (invitation, account) = (person.Invitations.Single(i => i.Digest == digest), await db.Users.SingleOrDefaultAsync(a => a.Id == person.Id));
        return new(person, invitation, account, await db.Sites.SingleOrDefaultAsync(), Person.WhyNotChoosePassword(invitation, at), form);
    }

    public async Task Judge(CredtrackDb db, ModelStateDictionary faults)
    {
        if (AsksForPerson)
        {
            if (string.IsNullOrWhiteSpace(Form.Name)) faults.AddModelError("Form.Name", "Give your name, as it is to stand on pages and papers.");
            if (string.IsNullOrWhiteSpace(Form.Address)) faults.AddModelError("Form.Address", "Give your e-mail address; you sign in with it.");
            else if (await db.Users.AnyAsync(a => a.NormalizedUserName == Account.Folded(Form.Address.Trim()))) faults.AddModelError("Form.Address", "This address has an account already. Give another one.");
        }
        if (AsksForSite)
        {
            if (string.IsNullOrWhiteSpace(Form.SiteName)) faults.AddModelError("Form.SiteName", "Give the name of the institution; it stands on every paper.");
            if (Site.WhyNotFound(Form.TimeZone ?? "") is { } why) faults.AddModelError("Form.TimeZone", why);
        }
        string?[] around = [Account?.Email ?? Form.Address, Form.Name, Person.Name, Site?.Name ?? Form.SiteName];
        if (Form.Password is not null && PasswordRule.WhyNot(Form.Password, around.OfType<string>()) is { } weak) faults.AddModelError("Form.Password", weak);
    }

    /// <summary>All that a link does, to be saved at once: the account, the site if there is none, and the end of whatever was signed in with an older password.</summary>
    public void Choose(CredtrackDb db, IPasswordHasher<Account> hasher, DateTime at)
    {
        Person.ChoosePassword(Invitation, at);
        if (AsksForPerson) Person.Rename(Person, Form.Name!.Trim(), at);
        var account = Account ?? db.Add(Data.Account.Open(Person, Form.Address!.Trim(), Person, at)).Entity;
        account.PasswordHash = hasher.HashPassword(account, Form.Password!);
        foreach (var session in db.Sessions.Open(at).Where(s => s.AccountId == Person.Id)) session.End(at);
        if (AsksForSite)
        {
            db.Add(Site.Found(Person, Form.SiteName!.Trim(), Form.TimeZone!, at));
            db.AddRange(CatalogueEntry.Shipped.Select(entry => Application.List(Person, entry, at)));
        }
        else if (Invitation.Kind == InvitationKind.Administrator)
        {
            Site!.AppointInvited(Person, Invitation, at);
        }
    }
}
