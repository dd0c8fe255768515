using System.ComponentModel.DataAnnotations;

namespace Credtrack.Web.Features.Imports.Mappings;

public sealed class WordChoice
{
    public string Field { get; set; } = "";
    public string Said { get; set; } = "";
    public string? Means { get; set; }
}

public sealed class PersonChoice
{
    public string Said { get; set; } = "";
    public string? Is { get; set; }
}

/// <summary>What the coordinator says a file means.</summary>
public sealed class MappingForm
{
    public Dictionary<string, string?> Columns { get; set; } = [];

    [Display(Name = "How dates run")]
    public DateOrder? Dates { get; set; }
    public List<WordChoice> Words { get; set; } = [];
    public List<PersonChoice> People { get; set; } = [];

    /// <summary>Which button: "look" shows what is open under the columns as they are now.</summary>
    public string? As { get; set; }

    public bool AsksAgain => As == "look";

    public Mapping Chosen(SentTable table) => new(
        Columns.Where(c => Fields.All.Any(f => f.Name == c.Key) && table.Header.Contains(c.Value!)).ToDictionary(c => c.Key, c => c.Value!),
        Words.Where(w => !string.IsNullOrEmpty(w.Means)).GroupBy(w => w.Field).ToDictionary(g => g.Key, g => g.DistinctBy(w => w.Said).ToDictionary(w => w.Said, w => w.Means!)),
        Dates, People.DistinctBy(p => p.Said).ToDictionary(p => p.Said, p => p.Is ?? ""), []);
}
