using Credtrack.Core.Imports;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Features.Imports;

/// <summary>Carries a plan out: people and rows are staged in batches, each a transaction, and the last small one makes all of them evidence. Begun anew it goes on where it was cut off.</summary>
public sealed class Staging(CredtrackDb db, TimeProvider clock)
{
    private const int Batch = 500;

    public async Task Run(Guid importId, Person by, Site site, ImportPlan plan)
    {
        Core.RuleBroken.If(plan.WhyNot);
        var import = await db.Imports.SingleAsync(i => i.Id == importId);
        var mapping = await Begin(import, by, plan);
        var staged = (await db.ImportedRows.IgnoreAutoIncludes().Where(r => r.ImportId == importId).Select(r => r.Line).ToListAsync()).ToHashSet();
        var people = await People(mapping);
        foreach (var rows in plan.New.Where(r => !staged.Contains(r.Line)).Chunk(Batch))
        {
            db.ChangeTracker.Clear();
            var at = clock.UtcNow();
            db.AddRange(rows.Select(row => Scan.Bring(by, people[Guid.Parse(mapping.People[row.Person])], import, row.Entry!, at)));
            await db.SaveChangesAsync();
        }
        await Finish(importId, by, site, plan, mapping);
    }

    /// <summary>People first, so that each has an id; they are in no programme until the import is confirmed.</summary>
    private async Task<Mapping> Begin(Import import, Person by, ImportPlan plan)
    {
        var at = clock.UtcNow();
        var enrolled = plan.NewPeople.ToDictionary(name => name, name => Person.Enrol(name, by, at));
        if (import.StagedAt is not null && enrolled.Count == 0) return plan.Mapping;
        var mapping = plan.Mapping with
        {
            People = plan.Mapping.People.ToDictionary(p => p.Key, p => enrolled.TryGetValue(p.Key, out var person) ? $"{person.Id}" : p.Value),
            Enrolled = [.. plan.Mapping.Enrolled, .. enrolled.Values.Select(p => p.Id)],
        };
        db.AddRange(enrolled.Values);
        import.Stage(by, mapping.ToJson(), enrolled.Count, at);
        await db.SaveChangesAsync();
        return mapping;
    }

    private async Task<Dictionary<Guid, Person>> People(Mapping mapping)
    {
        var ids = mapping.People.Values.Select(v => Guid.TryParse(v, out var id) ? id : Guid.Empty).ToList();
        return await db.People.AsNoTracking().Where(p => ids.Contains(p.Id)).ToDictionaryAsync(p => p.Id);
    }

    private async Task Finish(Guid importId, Person by, Site site, ImportPlan plan, Mapping mapping)
    {
        db.ChangeTracker.Clear();
        var (at, import) = (clock.UtcNow(), await db.Imports.Include(i => i.File).SingleAsync(i => i.Id == importId));
        var first = plan.New.GroupBy(r => mapping.People[r.Person]).ToDictionary(g => g.Key, g => g.Min(r => r.PerformedAt));
        var zone = TimeZoneInfo.FindSystemTimeZoneById(site.TimeZone);
        foreach (var person in await db.People.Include(p => p.Memberships).Where(p => mapping.Enrolled.Contains(p.Id)).ToListAsync())
            if (first.TryGetValue($"{person.Id}", out var since)) person.Admit(by, site, import.Programme, new MembershipTerms(MembershipKind.Trainee, since.DayIn(zone)), at);
        import.Confirm(by, await db.ImportedRows.CountAsync(r => r.ImportId == importId), plan.Assumed, at);
        await db.SaveChangesAsync();
    }
}
