using Credtrack.Core.People;
using Credtrack.Core.Readings;

namespace Credtrack.Core.Scans;

public sealed partial class Scan
{
    public IReadOnlyList<Confirmation> Confirmations => confirmations;

    /// <summary>The answer of the person named, about the examination as it is now; null while there is none.</summary>
    public Confirmation? Confirmation => confirmations.SingleOrDefault(c => c.IsAbout(this));

    /// <summary>Somebody is named who was at the bedside, and has not said otherwise.</summary>
    public bool IsSupervised => Supervision == Supervision.Direct && SupervisorId is not null && Confirmation is not { WasThere: false };

    /// <summary>What counts, of all that the trainee, the person named and the governing reader said.</summary>
    public Supervision CountingSupervision => Counting(readings.MinBy(r => r.Number));

    public string? WhyNotConfirm(Person by) =>
          Supervision != Supervision.Direct || SupervisorId != by.Id ? "Only the person named as direct supervisor answers for it."
        : !by.Is(MembershipKind.Reader, ProgrammeId)   ? "Only this programme's readers supervise its scans."
        : Withdrawal is not null                       ? "This scan is withdrawn."
        : submissions.Count == 0                       ? "This scan is a draft: it has not been submitted."
        : Confirmation is not null                     ? "You have answered for this scan already."
        : readings.Any(r => r.ReaderId == by.Id)       ? "Your reading of this scan has answered for it already."
        : readings.Any(r => r.AtMost < Supervision.Direct) ? "A reader has lowered the supervision of this scan."
        : null;

    public void Confirm(Person by, bool wasThere, DateTime at)
    {
        RuleBroken.If(WhyNotConfirm(by));
        confirmations.Add(new Confirmation(this, confirmations.Count + 1, by, wasThere, at));
        Record(wasThere ? new SupervisionConfirmed(by, at) : new SupervisionDenied(by, at));
    }

    private Supervision Counting(Reading? governing) => Supervisions.Counting(Supervision, SupervisorId, governing?.ReaderId, governing?.AtMost, Confirmation?.WasThere, IsAttested);
}
