using System.ComponentModel.DataAnnotations;
using Credtrack.Core;
using Credtrack.Web.Features.Programmes.Invitations;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Programmes.Memberships.Invitations;

public sealed class InvitationForm
{
    [Display(Name = "E-mail address"), EmailAddress(ErrorMessage = "Write the address like name@hospital.example."), StringLength(Account.LongestAddress, ErrorMessage = "An address has 200 characters at most.")]
    public string? Address { get; set; }

    [Display(Name = "How the link to choose a password gets there")]
    public Delivery Delivery { get; set; }
}

/// <summary>
/// A link for somebody who is here already: to choose the first password, or a new one. Whoever holds it can sign in as that person and sign
/// with that person's name; so of somebody with a password a coordinator never sees it.
/// </summary>
public sealed record InvitationPage(Person Person, Membership Membership, Account? Account, string? WhyNot, InvitationForm Form)
{
    public bool MayBeShown(Me me) => Account?.HasPassword != true || me.IsAdministrator;

    public static async Task<InvitationPage?> Load(CredtrackDb db, Me me, Guid programmeId, Guid membershipId, InvitationForm form, DateOnly today)
    {
        if (await MembershipPage.Find(db.People, db, me, programmeId, membershipId) is not var (person, membership)) return null;
        var account = await db.Users.SingleOrDefaultAsync(a => a.Id == person.Id);
        return new(person, membership, account, person.WhyNotBeInvited(me.Person, me.Site, membership, today), form);
    }

    public async Task Judge(Inviting inviting, Me me, ModelStateDictionary faults)
    {
        if (Form.Delivery == Delivery.Shown && !MayBeShown(me)) faults.AddModelError("Form.Delivery", "This person has a password already: a new link goes to their own address, or an administrator hands it over.");
        if (Account is not null) return;
        if (string.IsNullOrWhiteSpace(Form.Address)) faults.AddModelError("Form.Address", "Give the person's e-mail address; it is needed to sign in.");
        else if ((await inviting.Known(Form.Address.Trim())).Count > 0) faults.AddModelError("Form.Address", "This address belongs to another person. Check it.");
    }

    public void Invite(Inviting inviting)
    {
        RuleBroken.If(WhyNot);
        inviting.Invite(Person, Account ?? inviting.Open(Person, Form.Address!.Trim()), InvitationKind.Member);
    }
}
