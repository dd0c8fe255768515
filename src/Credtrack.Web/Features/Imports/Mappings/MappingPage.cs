using Credtrack.Core.Imports;
using Microsoft.AspNetCore.Mvc.ModelBinding;
using Microsoft.AspNetCore.Mvc.Rendering;

namespace Credtrack.Web.Features.Imports.Mappings;

/// <summary>A file beside what it is taken to mean: step one of an import.</summary>
public sealed record MappingPage(Import Import, SentTable Table, ImportGround Ground, Mapping Mapping, string? WhyNot)
{
    public MappingForm Form { get; } = new();

    public IReadOnlyList<(string Field, string Said, string Means)> Words { get; } = [.. Mapping.Words.SelectMany(f => f.Value.Select(w => (f.Key, w.Key, w.Value)))];
    public IReadOnlyList<(string Said, string Is)> People { get; } = [.. Mapping.People.Select(p => (p.Key, p.Value))];
    public bool HasTimes { get; } = Mapping.Dates != DateOrder.YearFirst;
    public IReadOnlyList<string> Dropped => [.. Table.Header.Except(Mapping.Columns.Values)];

    /// <summary>Null where the viewer may not see it, or where the file is gone.</summary>
    public static async Task<MappingPage?> Load(CredtrackDb db, Me me, TimeProvider clock, Guid id, MappingForm? form = null)
    {
        if (await db.ImportsVisibleTo(me.Person).AsNoTracking().Include(i => i.File).SingleOrDefaultAsync(i => i.Id == id) is not { File.Content: { } content } import) return null;
        var table = SentTable.Read(content, out _)!;
        var ground = await ImportGround.Load(db, me.Site, import.Programme, me.Person, clock.UtcNow());
        var before = form?.Chosen(table) ?? Mapping.Of(import.Mapping ?? await Remembered(db, import));
        return new(import, table, ground, Guess.Of(table, ground, before, form is not null), import.WhyNotMap(me.Person));
    }

    /// <summary>What was decided for the last file of the programme that was confirmed.</summary>
    public static Task<string?> Remembered(CredtrackDb db, Import import) => Remembered(db, import.ProgrammeId);

    public static Task<string?> Remembered(CredtrackDb db, Guid programmeId) => db.Imports.IgnoreAutoIncludes()
        .Where(i => i.ProgrammeId == programmeId && i.Steps.Any(s => s.Kind == ImportStepKind.Confirmed)).OrderByDescending(i => i.At).Select(i => i.Mapping).FirstOrDefaultAsync();

    public IEnumerable<SelectListItem> Headers(ImportField field) => Table.Header.Select(h => new SelectListItem(h, h, Mapping.Columns.GetValueOrDefault(field.Name) == h));

    public IEnumerable<SelectListItem> Means(string field, string means)
    {
        var of = Fields.Of(field);
        return [.. Ground.WordsOf(of)!.Select(w => new SelectListItem(Ground.Printed(of, w), w, w == means)), .. field == "application" ? [] : new[] { new SelectListItem("Nothing: as if the cell were empty", Mapping.Nothing, means == Mapping.Nothing) }];
    }

    public IEnumerable<SelectListItem> Who(string said, string choice) =>
    [
        new($"A new trainee without sign-in, called {said}", Mapping.New, choice == Mapping.New), new("Nobody: leave these rows out", Mapping.Out, choice == Mapping.Out),
        .. Ground.Trainees.Where(t => t.Id != Ground.By.Id).Select(t => new SelectListItem(t.Address is null ? t.Name : $"{t.Name}, {t.Address}", $"{t.Id}", $"{t.Id}" == choice)),
    ];

    public void Judge(ModelStateDictionary faults)
    {
        foreach (var (name, why) in Undecided.Of(Table, Ground, Mapping)) faults.AddModelError(name, why);
    }
}
