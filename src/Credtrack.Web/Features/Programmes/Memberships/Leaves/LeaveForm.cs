using System.ComponentModel.DataAnnotations;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Programmes.Memberships.Leaves;

public sealed class LeaveForm
{
    [Display(Name = "First day away"), Required(ErrorMessage = "Give the first day away.")]
    public DateOnly? FirstDay { get; set; }

    [Display(Name = "Last day away"), Required(ErrorMessage = "Give the last day away.")]
    public DateOnly? LastDay { get; set; }
}

public sealed record LeavePage(Person Person, Membership Membership, string? WhyNot, LeaveForm Form)
{
    public static async Task<LeavePage?> Load(CredtrackDb db, Me me, Guid programmeId, Guid membershipId, LeaveForm form) =>
        await MembershipPage.Find(db.People, db, me, programmeId, membershipId) is var (person, membership) && membership.Kind == MembershipKind.Trainee
            ? new(person, membership, person.WhyNotAdmit(me.Person, me.Site, membership.Programme, membership.Kind), form) : null;

    public void Judge(ModelStateDictionary faults)
    {
        if (Form is { FirstDay: { } first, LastDay: { } last } && Person.WhyNotBeAway(Membership.Programme, first, last) is { } why) faults.AddModelError("Form.LastDay", why);
    }
}
