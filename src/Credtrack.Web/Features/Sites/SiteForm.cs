using System.ComponentModel.DataAnnotations;
using Credtrack.Web.Features.Scans;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Sites;

public sealed class SiteForm
{
    public int Version { get; set; }

    [Display(Name = "Name of the institution"), StringLength(SiteEntry.LongestName, ErrorMessage = "A name has 120 characters at most.")]
    public string? Name { get; set; }

    [Display(Name = "Time zone")]
    public string? TimeZone { get; set; }

    [Display(Name = "Whom outsiders ask"), StringLength(SiteEntry.LongestContact, ErrorMessage = "Keep it within 200 characters.")]
    public string? Contact { get; set; }

    [Display(Name = "A reading is late after"), Required(ErrorMessage = "Give a number of days from 1 to 90.")]
    public int? LateAfterDays { get; set; }

    public SiteEntry ToEntry(ModelStateDictionary faults)
    {
        var entry = new SiteEntry(Name?.Trim() ?? "", TimeZone ?? "", string.IsNullOrWhiteSpace(Contact) ? null : Contact.Trim(), LateAfterDays ?? 0);
        if (LateAfterDays is not null) foreach (var (about, why) in entry.Faults()) faults.AddModelError($"Form.{about}", why);
        return entry;
    }
}

public sealed record SitePage(Guid Id, IReadOnlyList<HistoryLine> History, SiteForm Form)
{
    public static async Task<SitePage?> Load(CredtrackDb db, Guid id)
    {
        if (await db.Sites.AsNoTracking().Find(id) is not { } site) return null;
        var form = new SiteForm { Version = site.Version, Name = site.Name, TimeZone = site.TimeZone, Contact = site.Contact, LateAfterDays = site.LateAfterDays };
        return new(id, await HistoryLine.Latest(db, id), form);
    }
}
