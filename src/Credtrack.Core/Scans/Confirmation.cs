using Credtrack.Core.People;

namespace Credtrack.Core.Scans;

/// <summary>
/// What the person named as direct supervisor says: there, or not. It is about the examination as it stood then, and no longer counts
/// once the trainee makes it another application, another time or another supervisor.
/// </summary>
public sealed class Confirmation
{
    public Guid ScanId { get; private init; }
    public int Number { get; private init; }
    public Guid SupervisorId { get; private init; }
    public Guid ApplicationId { get; private init; }
    public DateTime PerformedAt { get; private init; }
    public bool WasThere { get; private init; }
    public DateTime At { get; private init; }

    private Confirmation() { }

    internal Confirmation(Scan scan, int number, Person by, bool wasThere, DateTime at) =>
        (ScanId, Number, SupervisorId, ApplicationId, PerformedAt, WasThere, At) = (scan.Id, number, by.Id, scan.ApplicationId, scan.PerformedAt, wasThere, at);

    internal bool IsAbout(Scan scan) => (SupervisorId, ApplicationId, PerformedAt) == (scan.SupervisorId, scan.ApplicationId, scan.PerformedAt);
}
