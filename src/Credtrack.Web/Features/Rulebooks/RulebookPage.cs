using Credtrack.Core.Rulebooks;
using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Rulebooks;

public sealed record RulebookPage(Rulebook Rulebook, string Programme, RulesInWords Words)
{
    /// <summary>An edition of one of one's programmes, past ones too: old decisions point to them.</summary>
    public static async Task<RulebookPage?> Load(CredtrackDb db, Me me, Guid id)
    {
        var row = await db.RulebooksVisibleTo(me.Person).AsNoTracking().Where(r => r.Id == id).Select(r => new { Rulebook = r, Programme = r.Programme.Name }).SingleOrDefaultAsync();
        return row is null ? null : new(row.Rulebook, row.Programme, new(RulesOf.Read(row.Rulebook, me.Site), await db.Applications.ToDictionaryAsync(a => a.Code, a => a.Name)));
    }
}
