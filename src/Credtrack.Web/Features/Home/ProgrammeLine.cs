namespace Credtrack.Web.Features.Home;

/// <summary>What a programme's director or coordinator wants to know at a glance.</summary>
public sealed record ProgrammeLine(Guid Id, string Name, int Trainees, int Waiting, DateTime? OldestSince, int Proposed)
{
    public static async Task<IReadOnlyList<ProgrammeLine>> Load(CredtrackDb db, Person person, DateOnly today)
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
                   select new ProgrammeLine(programme.Id, programme.Name, trainees.GetValueOrDefault(programme.Id), wait?.Number ?? 0, wait?.Oldest, proposed.GetValueOrDefault(programme.Id))];
    }
}
