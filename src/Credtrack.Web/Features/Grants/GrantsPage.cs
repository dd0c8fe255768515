using Credtrack.Core.Grants;

namespace Credtrack.Web.Features.Grants;

public sealed record GrantLine(Guid Id, string Holder, string Privilege, GrantState State, DateTime Since, string By, Guid? DocumentId, string? WhyNotSign);

/// <summary>The sign-off desk: what is to be done comes first, then what stands, then what is over. The holder sees their own.</summary>
public sealed record GrantsPage(IReadOnlyList<GrantLine> Lines, int Page, int All, int ToSign, int Active)
{
    public const int Size = 50;
    public bool HasMore => Page * Size < All;
    public IEnumerable<GrantLine> In(GrantState state) => Lines.Where(l => l.State == state);

    public static async Task<GrantsPage> Load(CredtrackDb db, Me me, int page)
    {
        var visible = db.GrantsVisibleTo(me.Person).AsNoTracking();
        // In the order of the page's sections.
        var rows = await visible.OrderBy(g => g.Ending != null ? 2 : g.Decline != null ? 3 : g.Signatures.Any() ? 1 : 0).ThenByDescending(g => g.ProposedAt).ThenBy(g => g.Id).Skip((page - 1) * Size).Take(Size).Select(g => new
        {
            Grant = g,
            Holder = g.Holder.Name,
            ProposedBy = g.ProposedBy.Name,
            DocumentId = g.Documents.Select(d => (Guid?)d.Id).FirstOrDefault(),
        }).ToListAsync();
        var lines = rows.Select(r => new GrantLine(r.Grant.Id, r.Holder, r.Grant.Privilege, r.Grant.State,
            r.Grant.Ending?.At ?? r.Grant.Decline?.At ?? r.Grant.Signature?.At ?? r.Grant.ProposedAt,
            r.Grant.Ending?.By.Name ?? r.Grant.Decline?.By.Name ?? r.Grant.Signature?.Signer.Name ?? r.ProposedBy, r.DocumentId, r.Grant.WhyNotSign(me.Person)));
        return new([.. lines], page, await visible.CountAsync(),
            await db.GrantsToSignBy(me.Person).CountAsync(),
            await visible.CountAsync(g => g.IsOpen == true && g.Signatures.Any()));
    }
}
