namespace Credtrack.Web.Features.Home;

public sealed record LateLine(Guid ScanId, string Application, DateTime PerformedAt, DateTime Since);

/// <summary>Scans of the programmes that one leads whose reading is overdue: the oldest, and how many there are.</summary>
public sealed record LateScans(IReadOnlyList<LateLine> Lines, int All)
{
    public static LateScans None { get; } = new([], 0);

    /// <param name="before">what has waited since before then is late</param>
    public static async Task<LateScans> Load(CredtrackDb db, Person person, DateTime before)
    {
        var led = person.ProgrammesAs(MembershipKind.Director, MembershipKind.Coordinator).ToList();
        if (led.Count == 0) return None;
        var late = db.ScansVisibleTo(person).AsNoTracking().Standing().Where(s => led.Contains(s.ProgrammeId) && !s.Readings.Any() && s.Submissions.Any(x => x.Return == null && x.At < before));
        if (await late.CountAsync() is not (> 0 and var all)) return None;
        var oldest = await late.Select(s => new { s.Id, s.Application.Name, s.PerformedAt, Since = s.Submissions.Where(x => x.Return == null).Max(x => x.At) })
            .OrderBy(s => s.Since).ThenBy(s => s.Id).Take(5).ToListAsync();
        return new([.. oldest.Select(s => new LateLine(s.Id, s.Name, s.PerformedAt, s.Since))], all);
    }
}
