using Credtrack.Core.Grants;
using Credtrack.Core.Measures.Standings;
using Credtrack.Web.Features.Documents;
using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Grants.Signatures;

public sealed record SignaturePage(GrantEvidence Evidence, string ProposedBy, string? WhyNot, SignatureForm Form)
{
    public Grant Grant => Evidence.Grant;
    public Statement Statement => Evidence.Statement;

    /// <summary>What was to be signed is not what there is now.</summary>
    public bool HasMoved { get; init; }

    /// <summary>What moved since the text was shown, line by line.</summary>
    public IReadOnlyList<(string Was, string Is)> Moved { get; init; } = [];

    /// <summary>The standing in which the scans behind the values are found.</summary>
    public string Standing => $"~/standings/{Grant.HolderId}?asOf={Statement.AsOf.Iso()}&programme={Grant.ProgrammeId}";

    /// <summary>Where the scans of the application are, or those of them of one verdict, or those that are read.</summary>
    public string Scans(Verdict? verdict = null, bool? read = null) => $"{Standing}{new StandingQuery(Application: Evidence.Code, Verdict: verdict, Read: read).Picks}#scans";

    public static async Task<SignaturePage?> Load(CredtrackDb db, Me me, Guid grantId, SignatureForm form, Issuing issuing, DateTime now)
    {
        var row = await db.GrantsVisibleTo(me.Person).AsNoTracking().Where(g => g.Id == grantId).Select(g => new { Grant = g, ProposedBy = g.ProposedBy.Name }).SingleOrDefaultAsync();
        if (row is null) return null;
        var evidence = await GrantEvidence.Load(db, me.Site, row.Grant, now.DayIn(me.Zone));
        var moved = form.Digest is not null && form.Digest != evidence.Statement.Digest ? Statement.Difference(form.Shown ?? "", evidence.Statement.Text) : [];
        (form.Version, form.Digest, form.Shown) = (row.Grant.Version, evidence.Statement.Digest, evidence.Statement.Text);
        return new(evidence, row.ProposedBy, row.Grant.WhyNotSign(me.Person) ?? issuing.WhyNotSeal(now), form) { Moved = moved };
    }
}
