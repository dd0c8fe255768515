using Credtrack.Core.People;
using Credtrack.Core.Plumbing;
using Credtrack.Core.Readings;

namespace Credtrack.Core.Scans;

public sealed partial class Scan
{
    public string? WhyNotCorrect(Person by, Reading reading) =>
          reading.ReaderId != by.Id                    ? "Only the reader who gave a reading corrects it."
        : !by.Is(MembershipKind.Reader, ProgrammeId)   ? "Only this programme's readers correct its readings."
        : reading.IsElsewhere                          ? "This reading was given elsewhere and attested with its import; it is not corrected here."
        : Withdrawal is not null                       ? "This scan is withdrawn."
        : null;

    /// <summary>What cannot be so, each with the name of the value it is about.</summary>
    public IEnumerable<(string About, string Why)> FaultsOfCorrection(Reading reading, Judgement judgement, string? reason)
    {
        foreach (var fault in judgement.Faults(this, reading)) yield return fault;
        if (FreeText.WhyNotReason(reason) is { } why) yield return (nameof(Correction.Reason), why);
        if (reading.Now.ChangesTo(Judged.Of(this, judgement, reading)).Length == 0)
            yield return (nameof(Judgement.Feedback), "Nothing is changed: this is the reading as it stands.");
    }

    /// <summary>The day of the original decides from when there is a reading; what it says now applies to every day.</summary>
    public void Correct(Person by, Reading reading, Judgement judgement, string reason, DateTime at)
    {
        RuleBroken.If(WhyNotCorrect(by, reading) ?? FaultsOfCorrection(reading, judgement, reason).Select(f => f.Why).FirstOrDefault());
        var before = reading.Now;
        reading.Correct(Judged.Of(this, judgement, reading), reason, at);
        Record(new ReadingCorrected(by, at, reading.Number, before.ChangesTo(reading.Now)));
    }
}
