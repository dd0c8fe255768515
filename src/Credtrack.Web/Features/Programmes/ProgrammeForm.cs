using System.ComponentModel.DataAnnotations;
using Credtrack.Web.Features.Programmes.Invitations;
using Credtrack.Web.Features.Scans;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Programmes;

/// <summary>A programme begins with its coordinator, who brings in the others.</summary>
public sealed class ProgrammeForm
{
    private (Person Person, Account Account)? known;

    [Display(Name = "Name of the programme"), Required(ErrorMessage = "Give the programme a name."), StringLength(Programme.LongestName, ErrorMessage = "A name has 120 characters at most."), OneLine]
    public string? Name { get; set; }

    [Display(Name = "Name of its coordinator"), Required(ErrorMessage = "Name the coordinator; it may be yourself."), StringLength(Person.LongestName, ErrorMessage = "A name has 120 characters at most."), OneLine]
    public string? Coordinator { get; set; }

    [Display(Name = "E-mail address of the coordinator"), Required(ErrorMessage = "Give the coordinator's e-mail address."), EmailAddress(ErrorMessage = "Write the address like name@hospital.example."), StringLength(Account.LongestAddress, ErrorMessage = "An address has 200 characters at most.")]
    public string? Address { get; set; }

    [Display(Name = "How the link to choose a password gets there")]
    public Delivery Delivery { get; set; }

    public async Task Judge(CredtrackDb db, Inviting inviting, ModelStateDictionary faults)
    {
        if (Name is not null && await db.Programmes.AnyAsync(p => p.Name == Name.Trim())) faults.AddModelError("Form.Name", "Another programme has this name already.");
        if (Address is not null && (await inviting.Known(Address.Trim())).Values.ToList() is [var found]) known = found;
    }

    public Programme Found(CredtrackDb db, Me me, Inviting inviting, DateTime at)
    {
        var programme = Programme.Found(me.Person, Name!.Trim(), at);
        db.Add(programme);
        var person = known?.Person ?? inviting.Enrol(Coordinator!.Trim());
        person.Join(me.Person, programme, new MembershipTerms(MembershipKind.Coordinator, at.DayIn(me.Zone)), at);
        var account = known?.Account ?? inviting.Open(person, Address!.Trim());
        if (!account.HasPassword) inviting.Invite(person, account, InvitationKind.Member);
        return programme;
    }
}

public sealed record ProgrammePage(Programme? Programme, ProgrammeForm Form);

public sealed class RenamingForm
{
    public int Version { get; set; }

    [Display(Name = "Name of the programme"), Required(ErrorMessage = "Give the programme a name."), StringLength(Programme.LongestName, ErrorMessage = "A name has 120 characters at most."), OneLine]
    public string? Name { get; set; }
}

public sealed record RenamingPage(Programme Programme, IReadOnlyList<HistoryLine> History, RenamingForm Form);
