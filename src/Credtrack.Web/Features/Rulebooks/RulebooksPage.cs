using Credtrack.Core.Rulebooks;

namespace Credtrack.Web.Features.Rulebooks;

public sealed record EditionLine(Guid Id, Guid ProgrammeId, int Edition, string Name, DateTime PublishedAt, string? By, bool IsInForce);

/// <summary>The rulebooks of one's programmes, the edition in force first.</summary>
public sealed record RulebooksPage(IReadOnlyList<EditionLine> Lines, int Page, int All, Person Viewer)
{
    public const int Size = 50;
    public bool HasMore => Page * Size < All;

    /// <summary>On the first page those too that have published none yet.</summary>
    public IEnumerable<Programme> Programmes => Viewer.Memberships.Select(m => m.Programme).DistinctBy(p => p.Id).Where(p => Page == 1 || Of(p).Any()).OrderBy(p => p.Name);

    public IEnumerable<EditionLine> Of(Programme programme) => Lines.Where(l => l.ProgrammeId == programme.Id);

    public bool MayPublish(Programme programme) => Rulebook.WhyNotPublish(Viewer, programme) is null;

    public static async Task<RulebooksPage> Load(CredtrackDb db, Person viewer, int page)
    {
        var visible = db.RulebooksVisibleTo(viewer);
        var lines = await visible.OrderBy(r => r.Programme.Name).ThenByDescending(r => r.Edition).Skip((page - 1) * Size).Take(Size).Select(r => new EditionLine(
            r.Id, r.ProgrammeId, r.Edition, r.Name, r.PublishedAt,
            db.LedgerEntries.Where(l => l.SubjectId == r.Id && l.Number == 1).Join(db.People, l => l.ById, p => p.Id, (l, p) => p.Name).FirstOrDefault(),
            !db.Rulebooks.Any(later => later.ProgrammeId == r.ProgrammeId && later.Edition > r.Edition))).ToListAsync();
        return new(lines, page, await visible.CountAsync(), viewer);
    }
}
