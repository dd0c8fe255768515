using Credtrack.Core.Catalogue;
using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Scans;
using Credtrack.Web.Features.Shared.Figures;
using Credtrack.Web.Features.Standings;
using Credtrack.Web.Features.Scans.Pictures;

namespace Credtrack.Web.Features.Scans;

/// <summary>A recent choice with its short row: what is still missing of it.</summary>
public sealed record ApplicationTile(Application Application, Depth? Depth, string Missing);

/// <summary>The views and questions of one application, as the form asks them.</summary>
public sealed record AskedOf(Application Application, IReadOnlyList<View> Views, IReadOnlyList<Question> Questions, IReadOnlyList<string> Parts, bool IsChosen);

public sealed record ScanFormPage(
    ScanForm Form, Guid ProgrammeId, IReadOnlyList<Membership> Programmes, IReadOnlyList<Application> Applications, IReadOnlyList<ApplicationTile> Tiles,
    IReadOnlyList<Person> Readers, Scan? Scan, string? WhyNot)
{
    public IReadOnlyList<KeptPicture> Kept { get; set; } = [];

    /// <summary>The scan as it is, beside what was typed, after somebody else was faster.</summary>
    public ScanPage? Now { get; set; }
    public int PicturesAfter => Kept.Count + (Scan?.ShownPictures.Count(p => !Form.Remove.Contains(p.Id)) ?? 0);

    /// <summary>Whether the catalogue still asks what the form showed. What a scan was asked already, it keeps.</summary>
    public bool IsAskedAsShown(Application application) =>
        Scan?.ApplicationId == application.Id || !Form.Catalogue.TryGetValue(application.Code, out var shown) || shown == application.Version;

    public bool AsksForProgramme => Scan is null && Programmes.Count > 1;
    public Application? Chosen => Applications.SingleOrDefault(a => a.Code == Form.Application);

    /// <summary>A scan that is being edited keeps the views and questions it was asked.</summary>
    public IEnumerable<AskedOf> Asked => Applications.Select(a => Scan?.ApplicationId == a.Id
        ? new AskedOf(a, [.. Scan.ViewsUnder(a)], [.. Scan.QuestionsUnder(a)], Scan.PartsUnder(a), a == Chosen)
        : new AskedOf(a, a.Views, a.Questions, a.Subtypes, a == Chosen));

    public static async Task<ScanFormPage> Load(CredtrackDb db, Me me, ScanForm form, Scan? scan, TimeProvider clock)
    {
        var programmes = me.Person.Memberships.Where(m => m.Kind == MembershipKind.Trainee).DistinctBy(m => m.ProgrammeId).OrderBy(m => m.Programme.Name).ToList();
        var programmeId = scan?.ProgrammeId ?? programmes.Find(m => m.ProgrammeId == form.ProgrammeId)?.ProgrammeId ?? programmes[0].ProgrammeId;
        var (now, today) = (clock.UtcNow(), me.Today(clock));
        var kept = scan?.ApplicationId;
        var applications = await db.Applications.AsNoTracking().Where(a => a.RetiredAt == null || a.Id == kept).OrderBy(a => a.Name).ToListAsync();
        var readers = await db.People.AsNoTracking().Include(p => p.Memberships.Where(m => m.FirstDay <= today && (m.LastDay == null || m.LastDay >= today)))
            .Where(p => p.Id != me.Person.Id && p.Memberships.Any(m => m.Kind == MembershipKind.Reader && m.ProgrammeId == programmeId && m.FirstDay <= today && (m.LastDay == null || m.LastDay >= today)))
            .OrderBy(p => p.Name).ToListAsync();
        var evidence = (await db.EvidenceOf([me.Person.Id]))[me.Person.Id].ToList();
        var rules = RulesOf.InForce(await db.RulebookInForce(programmeId), me.Site);
        return new(form, programmeId, programmes, applications, Recent(applications, evidence, rules, today, form.Application), readers, scan, scan?.WhyNotChange(me.Person));
    }

    /// <summary>The four applications logged last; before there are any, the first of the rulebook. The one chosen is always among them.</summary>
    private static List<ApplicationTile> Recent(List<Application> applications, List<ScanEvidence> evidence, Rules? rules, DateOnly today, string? chosen)
    {
        var standing = rules is null ? null : Standing.Of(rules, evidence, [], today);
        var codes = evidence.OrderByDescending(e => e.PerformedAt).Select(e => e.Application).Concat(rules?.Applications.Select(a => a.Code) ?? []).Concat(applications.Select(a => a.Code)).Distinct().Where(code => applications.Exists(a => a.Code == code)).Take(4).ToList();
        if (chosen is not null && !codes.Contains(chosen)) codes = [chosen, .. codes.Take(3)];
        return [.. from code in codes
                   join application in applications on code equals application.Code
                   let line = standing is null ? null : StandingLine.Of(standing, application.Code, application.Name)
                   select new ApplicationTile(application, line?.Depth, line is null ? "" : line.Standing.Met ? "met" : line.Missing > 0 ? $"{line.Missing} missing" : line.Gap)];
    }
}
