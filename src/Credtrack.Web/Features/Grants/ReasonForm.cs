using System.ComponentModel.DataAnnotations;
using Credtrack.Core.Grants;

namespace Credtrack.Web.Features.Grants;

/// <summary>Declining and ending ask for the same thing: a reason in words.</summary>
public sealed class ReasonForm
{
    public int Version { get; set; }

    [Display(Name = "Reason"), Required(ErrorMessage = "Give the reason."), NamesNobody]
    public string? Reason { get; set; }
}

public sealed record ReasonPage(Grant Grant, string Holder, string? WhyNot, ReasonForm Form)
{
    public static async Task<ReasonPage?> Load(CredtrackDb db, Person person, Guid grantId, Func<Grant, Person, string?> whyNot, ReasonForm form)
    {
        var row = await db.GrantsVisibleTo(person).AsNoTracking().Where(g => g.Id == grantId).Select(g => new { Grant = g, Holder = g.Holder.Name }).SingleOrDefaultAsync();
        if (row is null) return null;
        form.Version = row.Grant.Version;
        return new(row.Grant, row.Holder, whyNot(row.Grant, person), form);
    }
}
