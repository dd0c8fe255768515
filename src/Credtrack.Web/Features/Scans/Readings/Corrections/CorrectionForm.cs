using System.ComponentModel.DataAnnotations;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;
using Credtrack.Web.Features.Readings;

namespace Credtrack.Web.Features.Scans.Readings.Corrections;

/// <summary>All of the judgement again, as it stands until it is changed, and why it is changed.</summary>
public sealed class CorrectionForm : ReadingForm
{
    [Display(Name = "Why do you correct it?")]
    public string? Reason { get; set; }

    public static CorrectionForm Of(Scan scan, Reading reading, string application) => new()
    {
        Version = scan.Version,
        Application = application,
        Subtype = reading.Subtype,
        Indicated = reading.Indicated,
        Assisted = reading.Assisted,
        AtMost = reading.AtMost,
        Answers = reading.Answers.Where(a => a.Given is not null).ToDictionary(a => a.Code, a => a.Given!.Value),
        Views = [.. reading.Views.Where(v => v.Marked).Select(v => v.Code)],
        Quality = reading.Quality,
        Feedback = reading.Feedback,
    };
}

/// <summary>The form of a reading filled with an own one. Whose it is not finds nothing.</summary>
public sealed record CorrectionPage(ReadingPage Judged, Reading Reading, CorrectionForm Form)
{
    public Scan Scan => Judged.Scan;

    public static async Task<CorrectionPage?> Load(CredtrackDb db, Person person, Guid scanId, int number, CorrectionForm? form = null, string? typed = null)
    {
        var scan = await db.ScansVisibleTo(person).AsNoTracking().Find(scanId);
        if (scan?.Readings.SingleOrDefault(r => r.Number == number && r.ReaderId == person.Id) is not { } reading) return null;
        var applications = await db.Applications.AsNoTracking().OrderBy(a => a.Name).ToListAsync();
        var chosen = applications.Find(a => a.Code == (form?.Application ?? typed)) ?? applications.Single(a => a.Id == reading.ApplicationId);
        form ??= CorrectionForm.Of(scan, reading, chosen.Code);
        return new(new(scan, chosen, [.. applications.Select(a => (a.Code, a.Name))], null, Bench.None, [], scan.WhyNotCorrect(person, reading), form) { Given = reading }, reading, form);
    }
}
