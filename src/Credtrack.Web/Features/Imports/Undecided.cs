namespace Credtrack.Web.Features.Imports;

/// <summary>What somebody has to decide before a file can be read, each with the field of the form that decides it.</summary>
public static class Undecided
{
    public const int MostPeople = 300;
    public const int MostWords = 100;

    public static IEnumerable<(string Name, string Why)> Of(SentTable table, ImportGround ground, Mapping mapping)
    {
        foreach (var field in Fields.All.Where(f => f.IsRequired && !mapping.Columns.ContainsKey(f.Name)))
            yield return ($"Form.Columns[{field.Name}]", $"Say which column holds “{field.Label}”.");
        foreach (var twice in mapping.Columns.GroupBy(c => c.Value).Where(g => g.Count() > 1))
            yield return ($"Form.Columns[{twice.Last().Key}]", $"The column “{twice.Key}” is chosen for {twice.Count()} fields; choose it once.");
        if (mapping.Dates is null) yield return ("Form.Dates", Example(table, mapping) is { } example ? $"Choose how dates run: “{example}” can be read in two ways." : "Choose how dates run: no one way reads all of them.");
        var words = mapping.Words.SelectMany(f => f.Value.Select(w => (Field: f.Key, Said: w.Key, Means: w.Value))).ToList();
        if (words.Count > MostWords) yield return ("", $"The file uses {words.Count} words that are not ours; {MostWords} at most can be explained here. Is a column chosen wrongly?");
        foreach (var (at, (field, said, means)) in words.Take(MostWords).Index())
            if (means.Length == 0) yield return ($"Form.Words[{at}].Means", $"Say what “{said}” means under “{Fields.Of(field).Label}”.");
        if (mapping.People.Count > MostPeople) yield return ("", $"The file names {mapping.People.Count} people; {MostPeople} at most come in one file. Split it, or is a column chosen wrongly?");
        foreach (var (at, (said, choice)) in mapping.People.Take(MostPeople).Index())
            if (choice.Length == 0) yield return ($"Form.People[{at}].Is", ground.Called(said).Count > 1 ? $"Say who “{said}” is: {ground.Called(said).Count} trainees are called so." : $"Say who “{said}” is.");
    }

    private static string? Example(SentTable table, Mapping mapping) => DateOrders.Possible(Times(table, mapping)).Count > 1 ? Times(table, mapping).FirstOrDefault() : null;

    private static IEnumerable<string> Times(SentTable table, Mapping mapping) =>
        Fields.All.Where(f => f.IsTime && mapping.Columns.ContainsKey(f.Name)).SelectMany(f => table.Says(mapping.Columns[f.Name])).Select(t => t.Trim());
}
