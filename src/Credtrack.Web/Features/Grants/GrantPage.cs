using Credtrack.Core.Grants;
using Credtrack.Core.Measures.Standings;
using Credtrack.Web.Features.Scans;
using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Grants;

public sealed record GrantPage(
    Grant Grant, string Holder, string Application, string Code, string Programme, string ProposedBy, Guid? DocumentId, string? DocumentCode, IReadOnlyList<HistoryLine> History, Person Viewer)
{
    /// <summary>Scans of the evidence that were withdrawn after the signature.</summary>
    public int WithdrawnSince { get; init; }
    public bool IsDirector => Viewer.Is(MembershipKind.Director, Grant.ProgrammeId);
    /// <summary>The holder's standing; null for who may not open it.</summary>
    public string? Standing => Viewer.Id == Grant.HolderId || Viewer.SeesScansOf(Grant.ProgrammeId) ? $"~/standings/{Grant.HolderId}?programme={Grant.ProgrammeId}" : null;

    /// <summary>Where the scans behind the signed values are, as known today.</summary>
    public string Scans(DateOnly asOf, Verdict? verdict = null, bool? read = null) =>
        $"{Standing}&asOf={asOf.Iso()}{new StandingQuery(Application: Code, Verdict: verdict, Read: read).Picks}#scans";

    public string? WhyNotSign => Grant.WhyNotSign(Viewer);
    public string? WhyNotEnd => Grant.WhyNotEnd(Viewer);

    public static async Task<GrantPage?> Load(CredtrackDb db, Me me, Guid id)
    {
        var row = await db.GrantsVisibleTo(me.Person).AsNoTracking().Where(g => g.Id == id).Select(g => new
        {
            Grant = g,
            Holder = g.Holder.Name,
            Application = g.Application.Name,
            g.Application.Code,
            Programme = g.Programme.Name,
            ProposedBy = g.ProposedBy.Name,
            Document = g.Documents.Select(d => new { d.Id, d.Code }).FirstOrDefault(),
        }).SingleOrDefaultAsync();
        if (row is null) return null;
        return new(row.Grant, row.Holder, row.Application, row.Code, row.Programme, row.ProposedBy, row.Document?.Id, row.Document?.Code, await HistoryLine.Of(db, id), me.Person)
        {
            WithdrawnSince = row.Grant.Signature is { } signed ? await SignedOver.WithdrawnSince(db, row.Grant.HolderId, row.Grant.ApplicationId, signed.At) : 0,
        };
    }
}
