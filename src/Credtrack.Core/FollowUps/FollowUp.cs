using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.FollowUps;

/// <summary>A discrepancy that touches a patient's care, until somebody writes who was told. It replaces no duty to tell the patient's team.</summary>
public sealed class FollowUp : Recorded
{
    public Guid ScanId { get; private init; }
    public Guid ProgrammeId { get; private init; }
    public Guid TraineeId { get; private init; }
    public Guid OpenedById { get; private init; }
    public DateTime OpenedAt { get; private init; }

    /// <summary>When the reading was given that found it; nobody was told before.</summary>
    public DateTime ReadAt { get; private init; }
    public Closing? Closing { get; private set; }

    /// <summary>Says once more what the closing says, so that the database can hold a scan to one that is open.</summary>
    public DateTime? ClosedAt { get; private set; }

    // For projections only; a verb compares ids.
    public Scan Scan { get; private init; } = null!;
    public Person OpenedBy { get; private init; } = null!;

    private FollowUp() { }

    public bool IsOpen => Closing is null;

    /// <summary>Also of a scan that was withdrawn: the patient is still there.</summary>
    /// <param name="earlier">all follow-ups of this scan</param>
    public static string? WhyNotOpen(Person by, Scan scan, IEnumerable<FollowUp> earlier) =>
          by.Id == scan.TraineeId                            ? "Nobody opens a follow-up of their own scan; ask its reader."
        : !by.Is(MembershipKind.Reader, scan.ProgrammeId)    ? "Only this programme's readers open a follow-up."
        : scan.Readings.All(r => r.ReaderId != by.Id)        ? "Only a reader who has read this scan opens a follow-up of it."
        : earlier.Any(f => f.IsOpen)                         ? "A follow-up of this scan is open already."
        : null;

    public static FollowUp Open(Person by, Scan scan, IEnumerable<FollowUp> earlier, DateTime at)
    {
        RuleBroken.If(WhyNotOpen(by, scan, earlier));
        var followUp = new FollowUp
        {
            Id = Guid.CreateVersion7(at),
            ScanId = scan.Id,
            ProgrammeId = scan.ProgrammeId,
            TraineeId = scan.TraineeId,
            OpenedById = by.Id,
            OpenedAt = at,
            ReadAt = scan.Readings.Single(r => r.ReaderId == by.Id).At,
        };
        followUp.Record(new FollowUpOpened(by, at));
        return followUp;
    }

    public string? WhyNotClose(Person by) =>
          by.Id == TraineeId    ? "Nobody closes a follow-up of their own scan."
        : by.Id != OpenedById && !by.Is(MembershipKind.Director, ProgrammeId) ? "Only the programme's director or the reader who opened a follow-up closes it."
        : Closing is not null   ? "This follow-up is closed."
        : null;

    public void Close(Person by, ClosingEntry entry, DateTime at)
    {
        RuleBroken.If(WhyNotClose(by) ?? entry.Faults(ReadAt, at).Select(f => f.Why).FirstOrDefault());
        Closing = new Closing(this, by, entry, at);
        ClosedAt = at;
        Record(new FollowUpClosed(by, at, entry.ToldAt, entry.How));
    }
}
