using System.ComponentModel.DataAnnotations;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Features.Scans.Returns;

public sealed class ReturnForm
{
    public int Version { get; set; }

    [Display(Name = "What is missing?"), Required(ErrorMessage = "Say what is missing, so that the trainee can mend it.")]
    [NamesNobody]
    public string? Missing { get; set; }
}

public sealed record ReturnPage(Scan Scan, string Application, string? WhyNot, ReturnForm Form)
{
    public static async Task<ReturnPage?> Load(CredtrackDb db, Person person, Guid scanId, ReturnForm form)
    {
        var row = await db.ScansVisibleTo(person).AsNoTracking().Where(s => s.Id == scanId).Select(s => new { Scan = s, Application = s.Application.Name }).SingleOrDefaultAsync();
        if (row is null) return null;
        form.Version = row.Scan.Version;
        return new(row.Scan, row.Application, row.Scan.WhyNotReturn(person), form);
    }
}
