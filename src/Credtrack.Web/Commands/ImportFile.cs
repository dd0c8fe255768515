using Credtrack.Core.Imports;
using Credtrack.Web.Features.Imports;
using Credtrack.Web.Features.Imports.Mappings;

namespace Credtrack.Web.Commands;

/// <summary>Brings a file of past scans in by the rules of the import page. Exit status 0, or 2 where anything is at fault; then nothing is saved.</summary>
public static class ImportFile
{
    public static async Task<int> Run(string[] args, TextWriter output, TextWriter error, IServiceProvider services)
    {
        if (ImportOptions.Read(args, out var wrong) is not { } options) return await Refused(error, $"{wrong}\n{ImportOptions.Usage}");
        var (db, clock) = (services.GetRequiredService<CredtrackDb>(), services.GetRequiredService<TimeProvider>());
        if (await db.Sites.SingleOrDefaultAsync() is not { } site) return await Refused(error, "This site is not set up yet.");
        if (await db.Programmes.SingleOrDefaultAsync(p => p.Name == options.Programme) is not { } programme) return await Refused(error, $"There is no programme {options.Programme} here.");
        if (await Who(db, options.By, clock.UtcNow().DayIn(TimeZoneInfo.FindSystemTimeZoneById(site.TimeZone))) is not { } by) return await Refused(error, $"Nobody here has the address {options.By}.");
        if (Import.WhyNotUpload(by, programme) is { } why) return await Refused(error, why);
        if (FileBytes.Read(options.File, out var fault) is not { } content || SentTable.Read(content, out fault) is not { } table) return await Refused(error, $"{options.File}: {fault}");

        var ground = await ImportGround.Load(db, site, programme, by, clock.UtcNow());
        var mapping = Guess.Of(table, ground, Mapping.Of(await MappingPage.Remembered(db, programme.Id)));
        var plan = ImportPlan.Of(table, mapping, ground, null);
        List<string> faults = [.. Undecided.Of(table, ground, mapping).Select(u => $"{options.File}: {u.Why}")];
        if (faults.Count > 0) faults.Add("What is said of a file on the import page is remembered for the next one.");
        else faults.AddRange(plan.Faults.Select(f => $"{options.File}:{f.Line}: {(f.Column is { } column ? $"{EvidenceFiles.OneLine(column)}: " : "")}{f.Expected}"));
        if (faults.Count > 0) return await Refused(error, string.Join('\n', faults));

        foreach (var line in Said(plan)) await output.WriteLineAsync(line);
        if (!options.Saves || plan.WhyNot is not null)
        {
            await output.WriteLineAsync(plan.WhyNot ?? "Nothing is saved yet: with --yes it is.");
            return 0;
        }
        var import = Import.Upload(by, programme, Path.GetFileName(options.File), content, clock.UtcNow());
        import.Map(by, mapping.ToJson(), clock.UtcNow());
        db.Add(import);
        await db.SaveChangesAsync();
        await new Staging(db, clock).Run(import.Id, by, site, plan);
        await output.WriteLineAsync("Imported.");
        return 0;
    }

    private static Task<Person?> Who(CredtrackDb db, string address, DateOnly today)
    {
        var folded = Account.Folded(address);
        return db.People.Include(p => p.Memberships.Where(m => m.FirstDay <= today && (m.LastDay == null || m.LastDay >= today)))
            .SingleOrDefaultAsync(p => db.Users.Any(a => a.Id == p.Id && a.NormalizedUserName == folded));
    }

    private static IEnumerable<string> Said(ImportPlan plan)
    {
        yield return $"rows that become scans: {plan.New.Count()}";
        yield return $"rows that are here already: {plan.Here}";
        yield return $"rows left out: {plan.Out}";
        yield return $"people enrolled without sign-in: {string.Join(", ", plan.NewPeople) switch { "" => "none", var names => names }}";
        yield return $"cells that take a default: {plan.Assumed}";
        if (plan.Dropped.Count > 0) yield return $"columns dropped: {string.Join(", ", plan.Dropped)}";
    }

    private static async Task<int> Refused(TextWriter error, string why)
    {
        await error.WriteLineAsync(why);
        return 2;
    }
}
