using Credtrack.Core.Scans;
using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Home;

public sealed record ToDoLine(Guid ScanId, string Application, DateTime PerformedAt, ScanState State, string? Missing);

/// <summary>What a trainee is to do, what waits for others, and the nearest gap.</summary>
public sealed record OwnWork(IReadOnlyList<ToDoLine> ToDo, int Waiting, StandingLine? NearestGap)
{
    public static async Task<OwnWork?> Load(CredtrackDb db, Me me, DateOnly today)
    {
        var person = me.Person;
        if (!person.Is(MembershipKind.Trainee)) return null;
        var own = db.ScansVisibleTo(person).Standing().AsNoTracking().Where(s => s.TraineeId == person.Id && !s.Readings.Any());
        // A scan whose pictures were taken out waits for nobody until it has another.
        var open = await own.OrderByDescending(s => s.PerformedAt).Where(s => !s.Submissions.Any(x => x.Return == null) || (s.Pictures.All(p => p.RemovedAt != null) && (s.SupervisorId == null || s.Confirmations.Any(c => !c.WasThere)))).Take(20)
            .Select(s => new { Scan = s, Application = s.Application.Name }).ToListAsync();
        var waiting = await own.CountAsync(s => s.Submissions.Any(x => x.Return == null));
        var standing = await StandingPage.Load(db, me, person.Id, new StandingQuery(), today);
        var todo = open.Select(o => new ToDoLine(o.Scan.Id, o.Application, o.Scan.PerformedAt, o.Scan.State, o.Scan.ReturnedWith?.Missing ?? (o.Scan.State == ScanState.Waiting ? o.Scan.WhyIncomplete : null)))
            .Where(t => t.State != ScanState.Waiting || t.Missing is not null).OrderByDescending(t => t.State);
        return new([.. todo], waiting, standing?.NearestGaps.FirstOrDefault());
    }
}
