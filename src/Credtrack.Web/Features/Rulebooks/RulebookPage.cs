using Credtrack.Core.Rulebooks;
using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Rulebooks;

public sealed record RulebookPage(Rulebook Rulebook, string Programme, Rules Rules, IReadOnlyDictionary<string, string> Names)
{
    public string NameOf(ApplicationRules application) => application.Name ?? Names.GetValueOrDefault(application.Code, application.Code);

    /// <summary>An edition of one of one's programmes, past ones too: old decisions point to them.</summary>
    public static async Task<RulebookPage?> Load(CredtrackDb db, Me me, Guid id)
    {
        var mine = me.Person.Memberships.Select(m => m.ProgrammeId).Distinct().ToList();
        var row = await db.Rulebooks.AsNoTracking().Where(r => r.Id == id && mine.Contains(r.ProgrammeId)).Select(r => new { Rulebook = r, Programme = r.Programme.Name }).SingleOrDefaultAsync();
        return row is null ? null : new(row.Rulebook, row.Programme, RulesOf.Read(row.Rulebook, me.Site), await db.Applications.ToDictionaryAsync(a => a.Code, a => a.Name));
    }
}
