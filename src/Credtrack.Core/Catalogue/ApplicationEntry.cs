using Credtrack.Core.Plumbing;

namespace Credtrack.Core.Catalogue;

/// <summary>What a coordinator says of an application, before it is tied to a person and a moment. Depth in millimetres, frequency in kilohertz.</summary>
public sealed record ApplicationEntry(
    string Name, string Transducer, int DepthFromMm, int DepthToMm, int FrequencyFromKhz, int FrequencyToKhz, string? Note,
    IReadOnlyList<View> Views, IReadOnlyList<Question> Questions, IReadOnlyList<string> Subtypes)
{
    // Twenty of the longest, with the answers of a scan beside them, fit into the column of a list.
    public const int Most = 20, LongestName = 80, LongestTransducer = 80, LongestNote = 500, LongestView = 100, LongestGroup = 30, LongestQuestion = 120;

    /// <summary>What cannot be so, each with the name of the value it is about.</summary>
    /// <param name="others">the other applications of the catalogue</param>
    public IEnumerable<(string About, string Why)> Faults(ApplicationKind kind, IEnumerable<Application> others) =>
        [.. Own(others), .. Ranges(), .. OfViews(), .. kind == ApplicationKind.Procedure ? OfProcedure() : OfDiagnosis(), .. OfQuestions(), .. OfParts()];

    private IEnumerable<(string About, string Why)> Own(IEnumerable<Application> others)
    {
        if (Name.Length == 0) yield return (nameof(Name), "Give the application a name.");
        if (TextLine.WhyNot(Name, LongestName) is { } name) yield return (nameof(Name), name);
        if (others.Any(a => !a.IsRetired && string.Equals(a.Name, Name, StringComparison.OrdinalIgnoreCase))) yield return (nameof(Name), "Another application of the catalogue bears this name; choose another one.");
        if (Transducer.Length == 0) yield return (nameof(Transducer), "Name the usual transducer, such as: curved or linear.");
        if (TextLine.WhyNot(Transducer, LongestTransducer) is { } transducer) yield return (nameof(Transducer), transducer);
        if (TextLine.WhyNot(Note ?? "", LongestNote) is { } note) yield return (nameof(Note), note);
    }

    // The wide limits are those of MachineSettings.
    private IEnumerable<(string About, string Why)> Ranges()
    {
        if (DepthFromMm is < 5 or > 400) yield return (nameof(DepthFromMm), "Give the depth in cm, from 0.5 to 40.");
        if (DepthToMm is < 5 or > 400) yield return (nameof(DepthToMm), "Give the depth in cm, from 0.5 to 40.");
        else if (DepthFromMm >= DepthToMm) yield return (nameof(DepthToMm), "Give a depth greater than the one it starts from.");
        if (FrequencyFromKhz is < 500 or > 60_000) yield return (nameof(FrequencyFromKhz), "Give the frequency in MHz, from 0.5 to 60.");
        if (FrequencyToKhz is < 500 or > 60_000) yield return (nameof(FrequencyToKhz), "Give the frequency in MHz, from 0.5 to 60.");
        else if (FrequencyFromKhz >= FrequencyToKhz) yield return (nameof(FrequencyToKhz), "Give a frequency greater than the one it starts from.");
    }

    private IEnumerable<(string About, string Why)> OfViews()
    {
        if (Views.All(v => v.Need == ViewNeed.Optional)) yield return ($"{nameof(Views)}[0].{nameof(View.Name)}", "Name at least one view that is required, or a group of which one suffices.");
        if (Views.Count > Most) yield return ($"{nameof(Views)}[{Most}].{nameof(View.Name)}", $"An application has {Most} views at most; empty the ones beyond.");
        foreach (var (n, view) in Views.Index())
        {
            var about = $"{nameof(Views)}[{n}].{nameof(View.Name)}";
            if (TextLine.WhyNot(view.Name, LongestView) is { } why) yield return (about, why);
            if (Views.Take(n).Any(v => Alike(v.Name, view.Name))) yield return (about, "This view is already there; name each view once.");
            else if (!Codes.IsCode(view.Code) || Views.Take(n).Any(v => v.Code == view.Code)) yield return (about, "This view has lost its code; empty the row and add the view anew.");
            if (OfGroup(view) is { } group) yield return ($"{nameof(Views)}[{n}].{nameof(View.Group)}", group);
        }
    }

    private string? OfGroup(View view) => (view.Need, view.Group) switch
    {
        (ViewNeed.OneOf, null) => "Name the group of which one view suffices, such as heart.",
        (ViewNeed.OneOf, { } name) => TextLine.WhyNot(name, LongestGroup) ?? (Views.Count(v => v.Need == ViewNeed.OneOf && v.Group == name) < 2 ? "A group has two views or more: name another view of this group, or make this one required." : null),
        (_, not null) => "Only one of a group has a group: choose that, or empty this.",
        _ => null,
    };

    private IEnumerable<(string About, string Why)> OfDiagnosis()
    {
        if (Questions.All(q => q.Positive is null)) yield return ($"{nameof(Questions)}[0].{nameof(Question.Text)}", "Ask at least one question that has a positive answer: it gives a scan its result.");
        foreach (var (n, question) in Questions.Index())
            if (question.Positive == Answer.Unclear) yield return ($"{nameof(Questions)}[{n}].{nameof(Question.Positive)}", "Choose yes, no or neither as the positive answer.");
    }

    private IEnumerable<(string About, string Why)> OfProcedure()
    {
        if (Questions.All(q => q.Code != Question.TargetReached)) yield return ($"{nameof(Questions)}[0].{nameof(Question.Text)}", "A procedure always asks whether the target was reached.");
        foreach (var (n, question) in Questions.Index())
            if (question.Positive is not null) yield return ($"{nameof(Questions)}[{n}].{nameof(Question.Text)}", "A question of a procedure has no positive answer.");
    }

    private IEnumerable<(string About, string Why)> OfQuestions()
    {
        if (Questions.Count > Most) yield return ($"{nameof(Questions)}[{Most}].{nameof(Question.Text)}", $"An application has {Most} questions at most; empty the ones beyond.");
        foreach (var (n, question) in Questions.Index())
        {
            var about = $"{nameof(Questions)}[{n}].{nameof(Question.Text)}";
            if (question.Text.Length == 0) yield return (about, "Say what is asked; this question cannot go.");
            if (TextLine.WhyNot(question.Text, LongestQuestion) is { } why) yield return (about, why);
            if (Questions.Take(n).Any(q => Alike(q.Text, question.Text))) yield return (about, "This question is already there; ask each one once.");
            else if (!Codes.IsCode(question.Code) || Questions.Take(n).Any(q => q.Code == question.Code)) yield return (about, "This question has lost its code; empty the row and add the question anew.");
        }
    }

    private IEnumerable<(string About, string Why)> OfParts()
    {
        if (Subtypes.Count > Most) yield return ($"{nameof(Subtypes)}[{Most}]", $"An application has {Most} parts at most; empty the ones beyond.");
        foreach (var (n, part) in Subtypes.Index())
        {
            if (!Codes.IsCode(part)) yield return ($"{nameof(Subtypes)}[{n}]", $"Write the part in small letters, digits and single hyphens, such as long-bone, within {Codes.Longest} characters.");
            else if (Subtypes.Take(n).Contains(part)) yield return ($"{nameof(Subtypes)}[{n}]", "This part is already there; name each one once.");
        }
    }

    // The ledger tells a change by these texts, without the question mark.
    private static bool Alike(string one, string other) => string.Equals(one.TrimEnd('?', ' '), other.TrimEnd('?', ' '), StringComparison.OrdinalIgnoreCase);
}
