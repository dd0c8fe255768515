using Credtrack.Core.Catalogue;
using Credtrack.Core.People;
using Credtrack.Core.Plumbing;

namespace Credtrack.Core.Scans;

public sealed partial class Scan
{
    /// <summary>What a reader would miss, each with the name of the value it is about. A question that decides nothing may stay open.</summary>
    /// <param name="pictures">how many there are</param>
    /// <param name="supervised">at the bedside, by a person named</param>
    public static IEnumerable<(string About, string Why)> Missing(IEnumerable<Answered> answers, int pictures, bool supervised)
    {
        foreach (var open in answers.Where(a => a.Positive is not null && a.Given is null))
            yield return ($"{nameof(Answers)}[{open.Code}]", $"Answer “{open.Text}”; Unclear is an answer too.");
        if (pictures == 0 && !supervised)
            yield return (nameof(Pictures), "Attach a picture, or name who supervised at the bedside: without pictures only that person can read the scan.");
    }

    public string? WhyIncomplete => Missing(Answers, ShownPictures.Count(), IsSupervised).Select(m => m.Why).FirstOrDefault();

    public string? WhyNotSubmit(Person by) =>
          by.Id != TraineeId          ? "Only the person who logged a scan submits it."
        : State is ScanState.Waiting  ? "This scan is already submitted."
        : WhyNotChange(by) ?? WhyIncomplete;

    public void Submit(Person by, DateTime at)
    {
        RuleBroken.If(WhyNotSubmit(by));
        submissions.Add(new Submission(this, submissions.Count + 1, at));
        Record(new ScanSubmitted(by, at));
    }

    public string? WhyNotDiscard(Person by) =>
        WhyNotChange(by) ?? (submissions.Count > 0 || Imported is not null ? "Only a draft that was never submitted is discarded." : null);

    public void Discard(Person by, DateTime at)
    {
        RuleBroken.If(WhyNotDiscard(by));
        foreach (var picture in ShownPictures.ToList()) Remove(by, picture, at);
        Withdrawal = new Withdrawal(this, by, null, at);
        Record(new DraftDiscarded(by, at));
    }

    public string? WhyNotWithdraw(Person by) =>
          by.Id != TraineeId         ? "Only the person who logged a scan withdraws it."
        : Withdrawal is not null     ? "This scan is withdrawn."
        : State == ScanState.Draft   ? "This scan is a draft: discard it, there is nothing to withdraw."
        : null;

    /// <summary>Gone from the standing of every day, whatever stands in it. What was signed before keeps its evidence.</summary>
    public void Withdraw(Person by, string reason, DateTime at)
    {
        RuleBroken.If(WhyNotWithdraw(by) ?? FreeText.WhyNotReason(reason));
        Withdrawal = new Withdrawal(this, by, reason, at);
        Imported?.LetGo();
        Record(new ScanWithdrawn(by, at));
    }
}
