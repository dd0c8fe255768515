using Credtrack.Core;
using Credtrack.Core.Measures;
using Credtrack.Core.Scans;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Scans;

/// <summary>From what was typed to what the noun takes. Every fault goes to its field; the sentences are the noun's own wherever it has one.</summary>
public static class ScanFormEntry
{
    public static ScanEntry? ToEntry(this ScanForm form, ScanFormPage page, ModelStateDictionary faults, Guid traineeId, TimeZoneInfo zone, DateTime now)
    {
        if (page.AsksForProgramme && page.Programmes.All(m => m.ProgrammeId != form.ProgrammeId)) faults.AddModelError("Form.ProgrammeId", "Choose the programme in which the scan is logged.");
        if (page.Chosen is not { } application)
        {
            faults.AddModelError("Form.Application", string.IsNullOrEmpty(form.Application) ? "Choose the application you scanned." : "This application is not offered any more. Choose another one.");
            return null;
        }
        RuleBroken.If(page.IsAskedAsShown(application) ? null : $"What is asked of {application.Name} has just been changed in the catalogue. Look at its views and questions again; what you typed is kept.");
        var settings = new MachineSettings(form.Transducer,
            Number(form.Depth, "Depth", 10, "15 or 15.5", faults), Number(form.Frequency, "Frequency", 1000, "3.5", faults),
            Number(form.MechanicalIndex, "MechanicalIndex", 100, "0.9", faults), Number(form.ThermalIndex, "ThermalIndex", 100, "0.4", faults));
        var supervisor = page.Readers.SingleOrDefault(r => r.Id == form.Supervisor);
        if (form.Supervisor is not null && supervisor is null) faults.AddModelError("Form.Supervisor", "Choose a reader of this programme.");
        // A part left over from another application is no fault where there is none to choose.
        var entry = new ScanEntry(application, (page.Scan?.PartsUnder(application) ?? application.Subtypes).Count == 0 ? null : Trimmed(form.Subtype), PerformedAt(form, page.Scan, faults, zone, now), form.Role, form.Setting, form.Indicated,
            supervisor is null ? Supervision.Later : Supervision.Direct, supervisor, form.Assisted, settings, Trimmed(form.Note), form.Views, form.Answers);
        foreach (var (about, why) in entry.Faults(traineeId, page.ProgrammeId, now, page.Scan)) faults.AddModelError($"Form.{FieldOf(about)}", why);
        foreach (var (about, why) in Missing(form, page, entry)) faults.AddModelError($"Form.{about}", why);
        return faults.IsValid ? entry : null;
    }

    public static Scan Log(this ScanForm form, Person by, ScanFormPage page, ScanEntry entry, Scan? samePatient, DateTime now)
    {
        var scan = Scan.Log(by, page.Programmes.First(m => m.ProgrammeId == page.ProgrammeId).Programme, form.Id, entry, samePatient, now);
        foreach (var picture in page.Kept) scan.Attach(by, picture.Still, now);
        if (!form.IsDraft) scan.Submit(by, now);
        return scan;
    }

    private static DateTime PerformedAt(ScanForm form, Scan? scan, ModelStateDictionary faults, TimeZoneInfo zone, DateTime now)
    {
        if (form.PerformedAt is not { } local)
        {
            faults.GetValueOrDefault("Form.PerformedAt")?.Errors.Clear();
            faults.AddModelError("Form.PerformedAt", "Enter when the scan was performed.");
            return now;
        }
        // The field shows no seconds, nor which of two equal times in autumn it was: a time left alone stays as it is.
        if (scan is not null && scan.PerformedAt.In(zone) is var shown && shown.AddTicks(-(shown.Ticks % TimeSpan.TicksPerMinute)) == local) return scan.PerformedAt;
        return local.Year is > 1 and < 9999 ? LocalTimes.ToUtc(DateTime.SpecifyKind(local, DateTimeKind.Unspecified), zone) : DateTime.SpecifyKind(local, DateTimeKind.Utc);
    }

    /// <summary>A draft may be as incomplete as it likes; what waits for a reading stays complete.</summary>
    private static IEnumerable<(string About, string Why)> Missing(ScanForm form, ScanFormPage page, ScanEntry entry)
    {
        if (form.IsDraft && page.Scan?.State != ScanState.Waiting) return [];
        var asked = page.Scan?.QuestionsUnder(entry.Application) ?? entry.Application.Questions;
        var answers = asked.Select(q => q.With(entry.Answers.TryGetValue(q.Code, out var given) ? given : null));
        return Scan.Missing(answers, page.PicturesAfter, entry.Supervision == Supervision.Direct && entry.Supervisor is not null);
    }

    private static int? Number(string? typed, string field, int scale, string example, ModelStateDictionary faults)
    {
        if (string.IsNullOrWhiteSpace(typed)) return null;
        if (typed.Scaled(scale) is { } number) return number;
        faults.AddModelError($"Form.{field}", $"Enter a number such as {example}, or leave this empty.");
        return null;
    }

    private static string FieldOf(string about) => about switch
    {
        nameof(MachineSettings.DepthMm) => nameof(ScanForm.Depth),
        nameof(MachineSettings.FrequencyKhz) => nameof(ScanForm.Frequency),
        _ => about,
    };

    private static string? Trimmed(string? text) => string.IsNullOrWhiteSpace(text) ? null : text.Trim();
}
