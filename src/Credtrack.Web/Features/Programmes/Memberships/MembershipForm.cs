using System.ComponentModel.DataAnnotations;
using Credtrack.Web.Features.Programmes.Invitations;
using Microsoft.AspNetCore.Mvc.ModelBinding;
using Microsoft.AspNetCore.Mvc.Rendering;

namespace Credtrack.Web.Features.Programmes.Memberships;

public sealed class MembershipForm
{
    [Display(Name = "Name"), Required(ErrorMessage = "Give the person's name."), StringLength(Person.LongestName, ErrorMessage = "A name has 120 characters at most."), OneLine]
    public string? Name { get; set; }

    [Display(Name = "E-mail address"), EmailAddress(ErrorMessage = "Write the address like name@hospital.example."), StringLength(Account.LongestAddress, ErrorMessage = "An address has 200 characters at most.")]
    public string? Address { get; set; }

    [Display(Name = "Membership"), Required(ErrorMessage = "Choose what the person is in this programme.")]
    public MembershipKind? Kind { get; set; }

    [Display(Name = "Year group"), StringLength(MembershipTerms.LongestYearGroup, ErrorMessage = "Keep it within 40 characters."), OneLine]
    public string? YearGroup { get; set; }

    [Display(Name = "First day"), Required(ErrorMessage = "Give the first day.")]
    public DateOnly? FirstDay { get; set; }

    [Display(Name = "Last day")]
    public DateOnly? LastDay { get; set; }

    [Display(Name = "Stands in for")]
    public Guid? StandsInFor { get; set; }

    [Display(Name = "How the link to choose a password gets there")]
    public Delivery Delivery { get; set; }

    public MembershipTerms Terms(IEnumerable<Person> staff) => new(Kind ?? default, FirstDay ?? default, LastDay, string.IsNullOrWhiteSpace(YearGroup) ? null : YearGroup.Trim(), staff.SingleOrDefault(p => p.Id == StandsInFor));
}

/// <param name="Staff">for whom somebody may stand in</param>
public sealed record NewMembershipPage(Programme Programme, IReadOnlyList<Person> Staff, string? WhyNot, MembershipForm Form)
{
    private (Person Person, Account Account)? known;

    public IEnumerable<SelectListItem> StaffOptions => Staff.Select(p => ($"{p.Id}", p.Name)).AsOptions();

    public static async Task<NewMembershipPage?> Load(CredtrackDb db, Me me, Guid programmeId, MembershipForm form)
    {
        if (await db.ProgrammesVisibleTo(me.Person, me.Site).Find(programmeId) is not { } programme) return null;
        return new(programme, await StaffOf(db, programmeId), programme.WhyNotStaff(me.Person, form.Kind ?? MembershipKind.Coordinator, me.Site), form);
    }

    internal static Task<List<Person>> StaffOf(CredtrackDb db, Guid programmeId) => db.People.AsNoTracking()
        .Where(p => p.Memberships.Any(m => m.ProgrammeId == programmeId && m.Kind != MembershipKind.Trainee && m.LastDay == null)).OrderBy(p => p.Name).Take(500).ToListAsync();

    public async Task Judge(Inviting inviting, ModelStateDictionary faults)
    {
        if (Form.Kind is null || Form.FirstDay is null) return;
        if (Form.Address is not null && (await inviting.Known(Form.Address.Trim())).Values.ToList() is [var found]) known = found;
        var terms = Form.Terms(Staff);
        foreach (var (about, why) in terms.Faults()) faults.AddModelError($"Form.{about}", why);
        if (faults.IsValid && known?.Person.WhyNotJoin(Programme, terms) is { } twice) faults.AddModelError("Form.Kind", twice);
    }

    public void Admit(Me me, Inviting inviting, DateTime at)
    {
        var person = known?.Person ?? inviting.Enrol(Form.Name!.Trim());
        person.Admit(me.Person, me.Site, Programme, Form.Terms(Staff), at);
        if (Form.Address is null) return;
        var account = known?.Account ?? inviting.Open(person, Form.Address.Trim());
        if (!account.HasPassword) inviting.Invite(person, account, InvitationKind.Member);
    }
}
