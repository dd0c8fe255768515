using System.ComponentModel.DataAnnotations;
using Credtrack.Core.FollowUps;
using Credtrack.Core.Measures;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.FollowUps.Closings;

public sealed class ClosingForm
{
    public int Version { get; set; }

    [Display(Name = "Who was told?")]
    public string? Told { get; set; }

    [Display(Name = "When?")]
    public DateTime? ToldAt { get; set; }

    [Display(Name = "How?")]
    public Way? How { get; set; }

    [Display(Name = "Remark")]
    public string? Remark { get; set; }

    /// <summary>What was typed as the noun takes it. Every fault goes to its field; null if there is one.</summary>
    public ClosingEntry? ToEntry(DateTime readAt, TimeZoneInfo zone, DateTime now, ModelStateDictionary faults)
    {
        if (ToldAt is not { Year: > 1 and < 9999 } local)
        {
            faults.GetValueOrDefault("Form.ToldAt")?.Errors.Clear();
            faults.AddModelError("Form.ToldAt", "Enter when they were told.");
        }
        if (How is null)
        {
            faults.GetValueOrDefault("Form.How")?.Errors.Clear();
            faults.AddModelError("Form.How", "Choose how they were told.");
        }
        // What is missing has its sentence already; a stand-in keeps the rest in view.
        var at = faults.ContainsFault("Form.ToldAt") ? now : LocalTimes.ToUtc(DateTime.SpecifyKind(ToldAt!.Value, DateTimeKind.Unspecified), zone);
        var entry = new ClosingEntry(Told?.Trim() ?? "", at, How ?? default, string.IsNullOrWhiteSpace(Remark) ? null : Remark.Trim());
        faults.Tell(entry.Faults(readAt, now));
        return faults.IsValid ? entry : null;
    }
}

public sealed record ClosingPage(FollowUp FollowUp, string Application, DateTime PerformedAt, string? WhyNot, ClosingForm Form)
{
    public static async Task<ClosingPage?> Load(CredtrackDb db, Person person, Guid id, ClosingForm form)
    {
        var row = await db.FollowUpsVisibleTo(person).AsNoTracking().Where(f => f.Id == id).Select(f => new { FollowUp = f, Application = f.Scan.Application.Name, f.Scan.PerformedAt }).SingleOrDefaultAsync();
        if (row is null) return null;
        form.Version = row.FollowUp.Version;
        return new(row.FollowUp, row.Application, row.PerformedAt, row.FollowUp.WhyNotClose(person), form);
    }
}
