using System.ComponentModel.DataAnnotations;
using Credtrack.Web.Features.Programmes.Invitations;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Administrators;

public sealed class AdministratorForm
{
    private (Person Person, Account Account)? known;

    [Display(Name = "Name"), Required(ErrorMessage = "Give the person's name."), StringLength(Person.LongestName, ErrorMessage = "A name has 120 characters at most."), OneLine]
    public string? Name { get; set; }

    [Display(Name = "E-mail address"), Required(ErrorMessage = "Give the person's e-mail address."), EmailAddress(ErrorMessage = "Write the address like name@hospital.example."), StringLength(Account.LongestAddress, ErrorMessage = "An address has 200 characters at most.")]
    public string? Address { get; set; }

    [Display(Name = "How the link to choose a password gets there")]
    public Delivery Delivery { get; set; }

    public async Task Judge(Inviting inviting, Site site, Me me, ModelStateDictionary faults)
    {
        if (!faults.IsValid) return;
        if ((await inviting.Known(Address!.Trim())).Values.ToList() is [var found]) known = found;
        if (known is { } one && site.WhyNotAppoint(me.Person, one.Person) is { } why) faults.AddModelError("Form.Address", why);
    }

    public void Appoint(Site site, Me me, Inviting inviting, DateTime at)
    {
        var person = known?.Person ?? inviting.Enrol(Name!.Trim());
        site.Appoint(me.Person, person, at);
        var account = known?.Account ?? inviting.Open(person, Address!.Trim());
        if (!account.HasPassword) inviting.Invite(person, account, InvitationKind.Member);
    }
}

public sealed record AdministratorPage(AdministratorForm Form);

public sealed record AdministratorLine(Person Person, DateTime BeganAt, bool SignsIn, string? WhyNotDismiss);

public sealed record AdministratorsPage(IReadOnlyList<AdministratorLine> Lines)
{
    public const int Most = 100;

    public static async Task<AdministratorsPage> Load(CredtrackDb db, Me me)
    {
        var rows = await db.Sites.AsNoTracking().IgnoreAutoIncludes().SelectMany(s => s.Administrators).Where(a => a.EndedAt == null).OrderBy(a => a.BeganAt).Take(Most).Select(a => new { a.Person, a.BeganAt }).ToListAsync();
        var able = await SigningIn(db);
        return new([.. rows.Select(r => new AdministratorLine(r.Person, r.BeganAt, able.Contains(r.Person.Id), me.Site.WhyNotDismiss(me.Person, r.Person, able)))]);
    }

    /// <summary>The administrators who have chosen a password.</summary>
    public static Task<List<Guid>> SigningIn(CredtrackDb db) => db.Sites.IgnoreAutoIncludes().SelectMany(s => s.Administrators)
        .Where(a => a.EndedAt == null && db.Users.Any(u => u.Id == a.PersonId && u.PasswordHash != null)).Select(a => a.PersonId).ToListAsync();
}
