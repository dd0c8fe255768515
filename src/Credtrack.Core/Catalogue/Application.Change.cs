using System.Globalization;
using Credtrack.Core.People;
using Credtrack.Core.Plumbing;

namespace Credtrack.Core.Catalogue;

public sealed partial class Application
{
    private const string OnlyCoordinators = "Only a coordinator edits the catalogue.";

    public string? WhyNotChange(Person by) =>
          !by.Is(MembershipKind.Coordinator) ? OnlyCoordinators
        : IsRetired ? $"{Name} is retired; bring it back before you change it."
        : null;

    /// <summary>What scans were asked stays with them; this is for those to come.</summary>
    /// <param name="catalogue">all applications, this one among them or not</param>
    public void Change(Person by, ApplicationEntry entry, IEnumerable<Application> catalogue, DateTime at)
    {
        RuleBroken.If(WhyNotChange(by) ?? entry.Faults(Kind, catalogue.Where(a => a.Id != Id)).Select(f => f.Why).FirstOrDefault());
        var what = TextLine.Listed([.. Fields(entry), .. OfViews(entry.Views), .. OfQuestions(entry.Questions), .. Parts(entry.Subtypes)]);
        Take(entry);
        if (what.Length > 0) Record(new ApplicationChanged(by, at, what));
    }

    private IEnumerable<string> Fields(ApplicationEntry entry)
    {
        if (entry.Name != Name) yield return $"name from {Name} to {entry.Name}";
        if (entry.Transducer != Transducer) yield return $"transducer from “{Transducer}” to “{entry.Transducer}”";
        if ((entry.DepthFromMm, entry.DepthToMm) != (DepthFromMm, DepthToMm)) yield return Said($"depth in mm from {DepthFromMm} to {DepthToMm}, now {entry.DepthFromMm} to {entry.DepthToMm}");
        if ((entry.FrequencyFromKhz, entry.FrequencyToKhz) != (FrequencyFromKhz, FrequencyToKhz)) yield return Said($"frequency in kHz from {FrequencyFromKhz} to {FrequencyToKhz}, now {entry.FrequencyFromKhz} to {entry.FrequencyToKhz}");
        if (entry.Note != Note) yield return "another note";
    }

    private IEnumerable<string> OfViews(IReadOnlyList<View> after)
    {
        foreach (var gone in Views.ExceptBy(after.Select(v => v.Code), v => v.Code)) yield return $"view “{gone.Name}” removed";
        foreach (var view in after)
        {
            if (Views.FirstOrDefault(v => v.Code == view.Code) is not { } before) yield return $"view “{view.Name}” added, {Needed(view)}";
            else if (before != view) yield return before.Name == view.Name ? $"view “{view.Name}” from {Needed(before)} to {Needed(view)}" : $"view “{before.Name}” now “{view.Name}”, {Needed(view)}";
        }
        if (Moved(Views.Select(v => v.Code), after.Select(v => v.Code))) yield return "views in another order";
    }

    private IEnumerable<string> OfQuestions(IReadOnlyList<Question> after)
    {
        foreach (var gone in Questions.ExceptBy(after.Select(q => q.Code), q => q.Code)) yield return $"question “{gone.Text}” removed";
        foreach (var question in after)
        {
            if (Questions.FirstOrDefault(q => q.Code == question.Code) is not { } before) yield return $"question “{question.Text}” added, {Positive(question)}";
            else if (before != question) yield return before.Text == question.Text ? $"question “{question.Text}” from {Positive(before)} to {Positive(question)}" : $"question “{before.Text}” now “{question.Text}”, {Positive(question)}";
        }
        if (Moved(Questions.Select(q => q.Code), after.Select(q => q.Code))) yield return "questions in another order";
    }

    private IEnumerable<string> Parts(IReadOnlyList<string> after) =>
    [
        .. Subtypes.Except(after).Select(p => $"part {p} removed"),
        .. after.Except(Subtypes).Select(p => $"part {p} added"),
        .. Moved(Subtypes, after) ? new[] { "parts in another order" } : [],
    ];

    private static bool Moved(IEnumerable<string> before, IEnumerable<string> after) => !before.Intersect(after).SequenceEqual(after.Intersect(before));
    private static string Needed(View view) => view.Need == ViewNeed.OneOf ? $"one of {view.Group}" : view.Need == ViewNeed.Required ? "required" : "optional";
    private static string Positive(Question question) => question.Positive is { } positive ? $"positive with {(positive == Answer.Yes ? "yes" : "no")}" : "no positive answer";
    private static string Said(FormattableString words) => words.ToString(CultureInfo.InvariantCulture);
}
