using Credtrack.Core.Grants;
using Credtrack.Web.Features.Scans;

namespace Credtrack.Web.Features.Grants;

public sealed record GrantPage(
    Grant Grant, string Holder, string Application, string Programme, string ProposedBy, Guid? DocumentId, string? DocumentCode, IReadOnlyList<HistoryLine> History, Person Viewer)
{
    /// <summary>Scans of the evidence that were withdrawn after the signature.</summary>
    public int WithdrawnSince { get; init; }
    public bool IsDirector => Viewer.Is(MembershipKind.Director, Grant.ProgrammeId);
    public string? WhyNotSign => Grant.WhyNotSign(Viewer);
    public string? WhyNotEnd => Grant.WhyNotEnd(Viewer);

    public static async Task<GrantPage?> Load(CredtrackDb db, Me me, Guid id)
    {
        var row = await db.GrantsVisibleTo(me.Person).AsNoTracking().Where(g => g.Id == id).Select(g => new
        {
            Grant = g,
            Holder = g.Holder.Name,
            Application = g.Application.Name,
            Programme = g.Programme.Name,
            ProposedBy = g.ProposedBy.Name,
            Document = g.Documents.Select(d => new { d.Id, d.Code }).FirstOrDefault(),
        }).SingleOrDefaultAsync();
        if (row is null) return null;
        return new(row.Grant, row.Holder, row.Application, row.Programme, row.ProposedBy, row.Document?.Id, row.Document?.Code, await HistoryLine.Of(db, id), me.Person)
        {
            WithdrawnSince = row.Grant.Signature is { } signed ? await SignedOver.WithdrawnSince(db, row.Grant.HolderId, row.Grant.ApplicationId, signed.At) : 0,
        };
    }
}
