using Credtrack.Core.Scans;
using Credtrack.Web.Features.Readings;
using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Home;

public sealed record ToDoLine(Guid ScanId, string Application, DateTime PerformedAt, ScanState State, string? Missing);

/// <summary>What a programme's director or coordinator wants to know at a glance.</summary>
public sealed record ProgrammeLine(string Name, int Trainees, int Waiting, DateTime? OldestSince, int Proposed);

/// <summary>What is to be done, each membership's part on its own; a part that does not concern the person is null.</summary>
public sealed record HomePage(IReadOnlyList<ToDoLine>? ToDo, int Waiting, StandingLine? NearestGap, Bench? Bench, IReadOnlyList<ProgrammeLine> Programmes)
{
    public OpenCare Care { get; init; } = OpenCare.None;
    public ToConfirm Supervised { get; init; } = ToConfirm.None;

    public static async Task<HomePage> Load(CredtrackDb db, Me me, DateOnly today) =>
        await ByMembership(db, me, today) with { Care = await OpenCare.Load(db, me.Person), Supervised = await ToConfirm.Load(db, me.Person) };

    private static async Task<HomePage> ByMembership(CredtrackDb db, Me me, DateOnly today)
    {
        var person = me.Person;
        var programmes = await Led(db, person, today);
        var bench = person.Is(MembershipKind.Reader) ? await Bench.Load(db, person) : null;
        if (!person.Is(MembershipKind.Trainee)) return new(null, 0, null, bench, programmes);
        var own = db.ScansVisibleTo(person).Standing().AsNoTracking().Where(s => s.TraineeId == person.Id && !s.Readings.Any());
        // A scan whose pictures were taken out waits for nobody until it has another.
        var open = await own.OrderByDescending(s => s.PerformedAt).Where(s => !s.Submissions.Any(x => x.Return == null) || (s.Pictures.All(p => p.RemovedAt != null) && (s.SupervisorId == null || s.Confirmations.Any(c => !c.WasThere)))).Take(20)
            .Select(s => new { Scan = s, Application = s.Application.Name }).ToListAsync();
        var waiting = await own.CountAsync(s => s.Submissions.Any(x => x.Return == null));
        var standing = await StandingPage.Load(db, me, person.Id, new StandingQuery(), today);
        var todo = open.Select(o => new ToDoLine(o.Scan.Id, o.Application, o.Scan.PerformedAt, o.Scan.State, o.Scan.ReturnedWith?.Missing ?? (o.Scan.State == ScanState.Waiting ? o.Scan.WhyIncomplete : null)))
            .Where(t => t.State != ScanState.Waiting || t.Missing is not null).OrderByDescending(t => t.State);
        return new([.. todo], waiting, standing?.NearestGaps.FirstOrDefault(), bench, programmes);
    }

    private static async Task<IReadOnlyList<ProgrammeLine>> Led(CredtrackDb db, Person person, DateOnly today)
    {
        var led = person.ProgrammesAs(MembershipKind.Director, MembershipKind.Coordinator).ToList();
        if (led.Count == 0) return [];
        var trainees = await db.People.SelectMany(p => p.Memberships)
            .Where(m => led.Contains(m.ProgrammeId) && m.Kind == MembershipKind.Trainee && m.FirstDay <= today && (m.LastDay == null || m.LastDay >= today))
            .GroupBy(m => m.ProgrammeId).Select(g => new { g.Key, Number = g.Count() }).ToDictionaryAsync(g => g.Key, g => g.Number);
        var waiting = await db.Scans.Where(s => led.Contains(s.ProgrammeId) && s.Withdrawal == null && !s.Readings.Any())
            .SelectMany(s => s.Submissions.Where(x => x.Return == null), (s, x) => new { s.ProgrammeId, x.At })
            .GroupBy(x => x.ProgrammeId).Select(g => new { g.Key, Number = g.Count(), Oldest = g.Min(x => x.At) }).ToDictionaryAsync(g => g.Key);
        var proposed = await db.Grants.Where(g => led.Contains(g.ProgrammeId) && g.Decline == null && !g.Signatures.Any())
            .GroupBy(g => g.ProgrammeId).Select(g => new { g.Key, Number = g.Count() }).ToDictionaryAsync(g => g.Key, g => g.Number);
        return [.. from programme in person.Memberships.Select(m => m.Programme).DistinctBy(p => p.Id)
                   where led.Contains(programme.Id)
                   let wait = waiting.GetValueOrDefault(programme.Id)
                   orderby programme.Name
                   select new ProgrammeLine(programme.Name, trainees.GetValueOrDefault(programme.Id), wait?.Number ?? 0, wait?.Oldest, proposed.GetValueOrDefault(programme.Id))];
    }
}
