using System.ComponentModel.DataAnnotations;
using Credtrack.Core.Catalogue;
using Credtrack.Core.Grants;

namespace Credtrack.Web.Features.Grants;

public sealed class GrantForm
{
    public Guid Holder { get; set; }
    public Guid Programme { get; set; }
    public string? Application { get; set; }

    [Display(Name = "What is allowed"), Required(ErrorMessage = "Say what is allowed."), StringLength(200, ErrorMessage = "Keep it within 200 characters."), OneLine]
    public string? Privilege { get; set; }
}

/// <summary>A trainee of the programme that the director leads; whoever is not one is not found.</summary>
public sealed record ProposalPage(Person Holder, Programme Programme, Application Application, IReadOnlyList<Grant> Earlier, string? WhyNot, GrantForm Form)
{
    public static async Task<ProposalPage?> Load(CredtrackDb db, Me me, GrantForm form)
    {
        var programme = me.Person.Memberships.FirstOrDefault(m => m.Kind == MembershipKind.Director && m.ProgrammeId == form.Programme)?.Programme;
        var holder = await db.TraineesVisibleTo(me.Person).SingleOrDefaultAsync(p => p.Id == form.Holder && p.Memberships.Any(m => m.Kind == MembershipKind.Trainee && m.ProgrammeId == form.Programme));
        var application = await db.Applications.SingleOrDefaultAsync(a => a.Code == form.Application);
        if (programme is null || holder is null || application is null) return null;
        var earlier = await db.Grants.AsNoTracking().Where(g => g.HolderId == holder.Id && g.ProgrammeId == programme.Id && g.ApplicationId == application.Id).ToListAsync();
        form.Privilege ??= $"{application.Name}: point-of-care ultrasound without supervision";
        return new(holder, programme, application, earlier, Grant.WhyNotPropose(me.Person, holder, programme, earlier), form);
    }
}
