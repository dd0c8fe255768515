using System.ComponentModel.DataAnnotations;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Features.Scans;

/// <summary>Withdrawing a scan and taking a picture out ask for the same thing: a reason in words.</summary>
public sealed class ReasonForm
{
    public const string Hint = "Nothing that identifies the patient: no name, number or date.";

    public int Version { get; set; }

    [Display(Name = "Reason"), Required(ErrorMessage = "Give the reason."), NamesNobody]
    public string? Reason { get; set; }
}

public sealed record ReasonPage(Scan Scan, string Application, Picture? Picture, string? WhyNot, ReasonForm Form)
{
    /// <param name="scans">those of which the person may do it</param>
    /// <param name="picture">the number of the one it is about</param>
    public static async Task<ReasonPage?> Load(IQueryable<Scan> scans, Person person, Guid scanId, ReasonForm form, int? picture = null)
    {
        var row = await scans.AsNoTracking().Where(s => s.Id == scanId).Select(s => new { Scan = s, Application = s.Application.Name }).SingleOrDefaultAsync();
        if (row is null) return null;
        form.Version = row.Scan.Version;
        if (picture is null) return new(row.Scan, row.Application, null, row.Scan.WhyNotWithdraw(person), form);
        return row.Scan.Pictures.SingleOrDefault(p => p.Number == picture) is { } one ? new(row.Scan, row.Application, one, row.Scan.WhyNotTakeOut(person, one), form) : null;
    }
}
