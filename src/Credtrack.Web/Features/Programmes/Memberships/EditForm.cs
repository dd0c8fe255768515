using System.ComponentModel.DataAnnotations;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Programmes.Memberships;

public sealed class EditForm
{
    public int Version { get; set; }

    [Display(Name = "Name"), Required(ErrorMessage = "Give the person's name."), StringLength(Person.LongestName, ErrorMessage = "A name has 120 characters at most."), OneLine]
    public string? Name { get; set; }

    [Display(Name = "Year group"), StringLength(MembershipTerms.LongestYearGroup, ErrorMessage = "Keep it within 40 characters."), OneLine]
    public string? YearGroup { get; set; }

    [Display(Name = "First day"), Required(ErrorMessage = "Give the first day.")]
    public DateOnly? FirstDay { get; set; }

    [Display(Name = "Last day")]
    public DateOnly? LastDay { get; set; }
}

/// <param name="Absent">for whom this person stands in</param>
/// <param name="Coordinators">who coordinates the programme with no last day</param>
public sealed record EditPage(Person Person, Membership Membership, Person? Absent, IReadOnlyList<Person> Coordinators, string? WhyNot, DateOnly Today, EditForm Form)
{
    private MembershipTerms Terms => new(Membership.Kind, Form.FirstDay ?? default, Form.LastDay, string.IsNullOrWhiteSpace(Form.YearGroup) ? null : Form.YearGroup.Trim(), Absent);

    public static async Task<EditPage?> Load(CredtrackDb db, Me me, Guid programmeId, Guid id, DateOnly today)
    {
        if (await MembershipPage.Find(db.People, db, me, programmeId, id) is not { } found) return null;
        var (person, membership) = found;
        var coordinators = await CoordinatorsOf(db, programmeId, today);
        var form = new EditForm { Version = person.Version, Name = person.Name, YearGroup = membership.YearGroup, FirstDay = membership.FirstDay, LastDay = membership.LastDay };
        var absent = membership.StandsInForId is { } other ? await db.People.AsNoTracking().SingleAsync(p => p.Id == other) : null;
        return new(person, membership, absent, coordinators, person.WhyNotAdmit(me.Person, me.Site, membership.Programme, membership.Kind), today, form);
    }

    /// <summary>Who coordinates a programme today, with no last day, and can sign in.</summary>
    public static Task<List<Person>> CoordinatorsOf(CredtrackDb db, Guid programmeId, DateOnly today) => db.People.AsNoTracking()
        .Where(p => p.Memberships.Any(m => m.ProgrammeId == programmeId && m.Kind == MembershipKind.Coordinator && m.FirstDay <= today && m.LastDay == null) && db.Users.Any(a => a.Id == p.Id && a.PasswordHash != null))
        .Take(500).ToListAsync();

    public void Judge(ModelStateDictionary faults)
    {
        if (Form.FirstDay is null) return;
        foreach (var (about, why) in Terms.Faults()) faults.AddModelError($"Form.{about}", why);
    }

    public void Change(Me me, DateTime at)
    {
        Person.Change(me.Person, me.Site, Membership, Terms, Coordinators, Today, at);
        Person.Rename(me.Person, Form.Name!.Trim(), at);
    }
}
