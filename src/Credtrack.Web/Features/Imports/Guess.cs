namespace Credtrack.Web.Features.Imports;

/// <summary>What a file most likely means, by what was decided for the file before, by names that are alike, and by what is in it. Whatever is open stays open.</summary>
public static class Guess
{
    private static readonly string[][] Alike = [["yes", "y", "true", "1", "x"], ["no", "n", "false", "0"], ["education", "teaching"], ["simulation", "simulated"], ["direct", "directly"], ["none", "unsupervised"]];

    /// <param name="before">what was decided for an earlier file, or, where it is chosen, for this one</param>
    public static Mapping Of(SentTable table, ImportGround ground, Mapping before, bool isChosen = false)
    {
        var chosen = isChosen ? before.Columns : Columns(table, before);
        var times = Fields.All.Where(f => f.IsTime && chosen.ContainsKey(f.Name)).SelectMany(f => table.Says(chosen[f.Name])).ToList();
        var orders = DateOrders.Possible(times.Select(t => t.Trim()));
        var words = Fields.All.Where(f => chosen.ContainsKey(f.Name) && ground.WordsOf(f) is not null && (f.Name == "application" || !table.IsOurs)).ToDictionary(f => f.Name, f => Words(f, table.Says(chosen[f.Name]), ground, before));
        return new(chosen, words, before.Dates is { } held && (isChosen || orders.Contains(held)) ? held : orders is [var only] ? only : null, People(table.Says(chosen.GetValueOrDefault("person")), ground, before, isChosen), []);
    }

    private static Dictionary<string, string> Columns(SentTable table, Mapping before)
    {
        var free = table.Header.ToList();
        var found = new Dictionary<string, string>();
        foreach (var field in Fields.All)
        {
            var header = free.Contains(field.Name) ? field.Name
                : table.IsOurs ? null
                : before.Columns.TryGetValue(field.Name, out var held) && free.Contains(held) ? held
                : free.Find(field.IsCalled);
            if (header is null) continue;
            found[field.Name] = header;
            free.Remove(header);
        }
        return found;
    }

    private static Dictionary<string, string> Words(ImportField field, IReadOnlyList<string> said, ImportGround ground, Mapping before)
    {
        var known = ground.WordsOf(field)!;
        return said.Where(s => !known.Contains(s)).ToDictionary(s => s, s =>
            before.Words.GetValueOrDefault(field.Name)?.GetValueOrDefault(s) is { } held && (known.Contains(held) || held == Mapping.Nothing) ? held : known.FirstOrDefault(word => Means(field, ground, word, s)) ?? "");
    }

    private static bool Means(ImportField field, ImportGround ground, string word, string said)
    {
        var folded = Fields.Folded(said);
        return folded.Length > 0 && (Fields.Folded(word) == folded || Alike.Any(a => a[0] == word && a.Contains(folded))
            || (field.Name == "application" && Fields.Folded(ground.Applications.Single(a => a.Code == word).Name) == folded));
    }

    private static Dictionary<string, string> People(IReadOnlyList<string> said, ImportGround ground, Mapping before, bool isChosen) => said.ToDictionary(s => s, s =>
          isChosen && before.People.TryGetValue(s, out var choice) ? choice
        : before.People.GetValueOrDefault(s) is { } held && ground.Trainees.Any(t => $"{t.Id}" == held) ? held
        : ground.IsImporter(s) ? Mapping.Out
        : ground.Called(s) switch { [] => Mapping.New, [var one] => $"{one.Id}", _ => "" });
}
