using Credtrack.Core.Rulebooks;

namespace Credtrack.Web.Features.Standings;

public static class RulesOf
{
    public static Rules? InForce(Rulebook? rulebook, Site site) => rulebook is null ? null : Read(rulebook, site);

    /// <summary>Of several programmes in one query; one that has published none is not among them.</summary>
    public static async Task<IReadOnlyDictionary<Guid, Rules>> InForce(CredtrackDb db, IReadOnlyCollection<Guid> programmes, Site site)
    {
        var latest = await db.Rulebooks.AsNoTracking().Where(r => programmes.Contains(r.ProgrammeId) && !db.Rulebooks.Any(later => later.ProgrammeId == r.ProgrammeId && later.Edition > r.Edition)).ToListAsync();
        return latest.ToDictionary(r => r.ProgrammeId, r => Read(r, site));
    }

    /// <summary>What was published was read without a fault then; if it no longer is, that is our fault and must be seen.</summary>
    public static Rules Read(Rulebook rulebook, Site site)
    {
        var read = RulesReader.Read(rulebook.Text, site.TimeZone);
        return read.Rules ?? throw new InvalidOperationException($"Rulebook {rulebook.Id} does not read any more: {read.Faults[0]}");
    }
}
