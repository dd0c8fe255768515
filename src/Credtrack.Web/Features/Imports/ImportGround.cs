using Credtrack.Core.Catalogue;
using Credtrack.Core.Imports;
using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Imports;

/// <summary>A trainee of the programme, past ones too, whom a file may speak of.</summary>
public sealed record KnownTrainee(Guid Id, string Name, string? Address);

/// <summary>Where a row of the programme's imports stands already.</summary>
public sealed record HeldRow(string Key, Guid ImportId, int Line, bool IsConfirmed);

/// <summary>What a file is read against: the catalogue, the people and the rows that are here, all loaded once.</summary>
public sealed record ImportGround(
    Programme Programme, Person By, string? ByAddress, TimeZoneInfo Zone, DateTime Now,
    IReadOnlyList<Application> Applications, IReadOnlyList<KnownTrainee> Trainees, IReadOnlyDictionary<string, HeldRow> Held)
{
    public static async Task<ImportGround> Load(CredtrackDb db, Site site, Programme programme, Person by, DateTime now)
    {
        var rulebook = await db.RulebookInForce(programme.Id);
        var applications = await db.Applications.AsNoTracking().OrderBy(a => a.Name).ToListAsync();
        var trainees = await db.People.Where(p => p.Memberships.Any(m => m.Kind == MembershipKind.Trainee && m.ProgrammeId == programme.Id)).OrderBy(p => p.Name)
            .Select(p => new KnownTrainee(p.Id, p.Name, db.Users.Where(a => a.Id == p.Id).Select(a => a.Email).FirstOrDefault())).ToListAsync();
        var held = await db.ImportedRows.IgnoreAutoIncludes().Where(r => r.ProgrammeId == programme.Id && r.Key != null)
            .Select(r => new HeldRow(r.Key!, r.ImportId, r.Line, r.Import.Steps.Any(s => s.Kind == ImportStepKind.Confirmed))).ToDictionaryAsync(r => r.Key);
        var address = await db.Users.Where(a => a.Id == by.Id).Select(a => a.Email).SingleOrDefaultAsync();
        return new(programme, by, address, RulesOf.InForce(rulebook, site)?.Zone ?? TimeZoneInfo.FindSystemTimeZoneById(site.TimeZone), now, applications, trainees, held);
    }

    /// <summary>The words that a field may say here.</summary>
    public IReadOnlyList<string>? WordsOf(ImportField field) => field.Name switch
    {
        "application" => [.. Applications.Select(a => a.Code)],
        "subtype" => [.. Applications.SelectMany(a => a.Subtypes).Distinct().Order(StringComparer.Ordinal)],
        _ => field.Words,
    };

    /// <summary>A word as people read it: the name of an application beside its code.</summary>
    public string Printed(ImportField field, string word) => field.Name == "application" ? $"{Applications.Single(a => a.Code == word).Name} ({word})" : word;

    /// <summary>Whom a cell names: by name or address, the case aside.</summary>
    public IReadOnlyList<KnownTrainee> Called(string cell) => [.. Trainees.Where(t => Same(cell, t.Name) || (t.Address is not null && Same(cell, t.Address)))];

    public bool IsImporter(string cell) => Same(cell, By.Name) || (ByAddress is not null && Same(cell, ByAddress));

    private static bool Same(string cell, string name) => cell.Trim().Equals(name.Trim(), StringComparison.OrdinalIgnoreCase);
}
