using Credtrack.Core.Catalogue;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Applications;

/// <param name="Now">the application as it is, beside what was typed, after somebody else was faster</param>
public sealed record ApplicationFormPage(ApplicationForm Form, Application? Application, IReadOnlyList<Application> Catalogue, string? WhyNot, Application? Now)
{
    /// <param name="form">what was typed; null for the form as it is opened</param>
    public static async Task<ApplicationFormPage> Load(CredtrackDb db, Person person, ApplicationForm? form, Application? application = null)
    {
        var catalogue = await db.Applications.AsNoTracking().OrderBy(a => a.Name).ToListAsync();
        var now = form is not null && form.Version != application?.Version ? application : null;
        form ??= ApplicationForm.Of(application!);
        if (application is not null) (form.Code, form.Kind) = (application.Code, application.Kind);
        return new(form.Spread(), application, catalogue, application is null ? Application.WhyNotAdd(person, catalogue) : application.WhyNotChange(person), now);
    }

    /// <summary>From what was typed to what the noun takes; null, with every fault at its field, if it cannot be.</summary>
    public ApplicationEntry? ToEntry(ModelStateDictionary faults)
    {
        var entry = new ApplicationEntry(Trimmed(Form.Name), Trimmed(Form.Transducer), Number(Form.DepthFrom, "DepthFrom", 10, "depth in cm", faults), Number(Form.DepthTo, "DepthTo", 10, "depth in cm", faults),
            Number(Form.FrequencyFrom, "FrequencyFrom", 1000, "frequency in MHz", faults), Number(Form.FrequencyTo, "FrequencyTo", 1000, "frequency in MHz", faults), Trimmed(Form.Note) is { Length: > 0 } note ? note : null,
            Views(), Questions(), [.. Form.Parts.Where(p => !string.IsNullOrWhiteSpace(p)).Select(p => p!.Trim())]);
        if (Application is null && Application.WhyNotCode(Trimmed(Form.Code), Catalogue) is { } code) faults.AddModelError("Form.Code", code);
        foreach (var (about, why) in entry.Faults(Form.Kind, Catalogue.Where(a => a.Id != Application?.Id)))
            if (!faults.ContainsFault($"Form.{FieldOf(about)}")) faults.AddModelError($"Form.{FieldOf(about)}", why);
        return faults.IsValid ? entry : null;
    }

    private List<View> Views()
    {
        var taken = Form.Views.Select(v => v.Code).Concat(Application?.Views.Select(v => v.Code) ?? []).OfType<string>().ToList();
        return [.. Form.Views.Where(v => !v.IsEmpty).Select(v => new View(CodeOf(v.Code, v.Name!, "view", taken), Trimmed(v.Name), v.Need, Trimmed(v.Group) is { Length: > 0 } group ? group : null))];
    }

    private List<Question> Questions()
    {
        var taken = Form.Questions.Select(q => q.Code).Concat(Application?.Questions.Select(q => q.Code) ?? []).OfType<string>().ToList();
        return [.. Form.Questions.Where(q => !q.IsEmpty).Select(q => new Question(CodeOf(q.Code, q.Text!, "question", taken), Trimmed(q.Text), Form.Kind == ApplicationKind.Procedure ? null : q.Positive))];
    }

    // What is removed keeps its code to the end of this change: what comes in its place is something else.
    private static string CodeOf(string? code, string text, string otherwise, List<string> taken)
    {
        if (!string.IsNullOrWhiteSpace(code)) return code;
        taken.Add(Codes.Of(text, otherwise, taken));
        return taken[^1];
    }

    private static int Number(string? typed, string field, int scale, string what, ModelStateDictionary faults)
    {
        if (typed?.Scaled(scale) is { } number) return number;
        faults.AddModelError($"Form.{field}", $"Give the {what}, a number such as 3 or 12.5.");
        return 0;
    }

    private static string FieldOf(string about) => about
        .Replace("Mm", "", StringComparison.Ordinal).Replace("Khz", "", StringComparison.Ordinal).Replace(nameof(Core.Catalogue.Application.Subtypes), nameof(ApplicationForm.Parts), StringComparison.Ordinal);

    private static string Trimmed(string? text) => text?.Trim() ?? "";
}
