using System.Globalization;
using Credtrack.Core.Catalogue;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Readings;

/// <summary>What a reading says at one time: the values that govern, and the result that follows from both sets of answers.</summary>
public sealed record Judged(
    Guid ApplicationId, string? Subtype, bool Indicated, bool Assisted, Supervision AtMost,
    IReadOnlyList<Answered> Answers, IReadOnlyList<MarkedView> Views, int? Quality, Result? Result, string? Feedback)
{
    /// <param name="given">the reading that is corrected, if there is one: it keeps the questions it was asked</param>
    internal static Judged Of(Scan scan, Judgement judgement, Reading? given)
    {
        var application = judgement.Application;
        List<Answered> answers = [.. scan.QuestionsUnder(application, given).Select(q => q.With(judgement.Answers.TryGetValue(q.Code, out var answer) ? answer : null))];
        return new(application.Id, judgement.Subtype, judgement.Indicated, judgement.Assisted, judgement.AtMost, answers,
            [.. scan.ViewsUnder(application, given).Select(v => v.With(judgement.AdequateViews.Contains(v.Code)))],
            judgement.Quality, Comparison.Together(application.Kind, scan.Answers, answers), judgement.Feedback);
    }

    /// <summary>What the ledger says of a correction; empty if nothing is another. Free text is named, never quoted.</summary>
    public string ChangesTo(Judged now) => Scan.Difference(Described, now.Described);

    private List<(string Kind, string Name, string Value)> Described =>
    [
        (Scan.Own, "image quality", Quality is { } q ? string.Create(CultureInfo.InvariantCulture, $"{q} of 5") : "not scored"),
        (Scan.Own, "result", Result?.ToString() ?? "none"),
        (Scan.Own, "application", ApplicationId.ToString()),
        (Scan.Own, "part", Subtype ?? "none"),
        (Scan.Own, "clinically indicated", Scan.Said(Indicated)),
        (Scan.Own, "hands-on help", Scan.Said(Assisted)),
        (Scan.Own, "supervision at most", AtMost.ToString()),
        (Scan.Own, "feedback", Feedback ?? ""),
        .. Views.Select(v => ("view", $"view {v.Name}", v.Marked ? "adequate" : "not adequate")),
        .. Answers.Select(a => ("question", a.Text.TrimEnd('?'), a.Given?.ToString() ?? "open")),
    ];
}
