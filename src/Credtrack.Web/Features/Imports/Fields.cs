using Credtrack.Core.Rulebooks;

namespace Credtrack.Web.Features.Imports;

/// <summary>A column of the format: its name, what it is called on pages, and what other logs call it.</summary>
/// <param name="Words">the words it may say; null where it says something else</param>
public sealed record ImportField(string Name, string Label, IReadOnlyList<string>? Words, params string[] Otherwise)
{
    public bool IsRequired => Commands.ScansCsv.Required.Contains(Name);
    public bool IsTime => Name is "performed_at" or "read_at" or "outcome_at";
}

/// <summary>The columns of the format of scans, in its order. Applications and parts have the words of the site's catalogue.</summary>
public static class Fields
{
    private static readonly string[] YesNo = [.. RuleWords.YesNo.Keys];
    private static readonly string[] Results = [.. RuleWords.Results.Keys];

    public static IReadOnlyList<ImportField> All { get; } =
    [
        new("scan", "Id of the scan", null, "scan id", "id", "no", "number", "record"),
        new("person", "Trainee", null, "trainee", "name", "resident", "fellow", "operator", "user", "e-mail", "email", "performed by"),
        new("application", "Application", [], "exam", "examination", "type", "exam type", "study type", "scan type"),
        new("subtype", "Part", [], "part", "region", "site"),
        new("performed_at", "Performed at", null, "performed", "date", "exam date", "scan date", "date performed", "time"),
        new("encounter", "Patient contact", null, "visit", "contact"),
        new("role", "Role", [.. RuleWords.Roles.Keys]),
        new("setting", "Setting", [.. RuleWords.Settings.Keys], "context"),
        new("indicated", "Clinically indicated", YesNo, "clinically indicated", "indication"),
        new("supervision", "Supervision", [.. RuleWords.Supervisions.Keys], "supervised"),
        new("assisted", "Hands-on help", YesNo, "help", "assistance"),
        new("read_at", "Read at", null, "read", "reviewed", "review date", "date read", "date reviewed"),
        new("quality", "Image quality, 1 to 5", ["1", "2", "3", "4", "5"], "image quality", "score"),
        new("views", "All required views adequate", YesNo, "views adequate", "adequate views"),
        new("result", "Result", Results, "outcome", "agreement"),
        new("outcome_at", "Later outcome, when", null, "follow-up date"),
        new("outcome_result", "Later outcome", Results, "follow-up result"),
    ];

    public static ImportField Of(string name) => All.Single(f => f.Name == name);

    /// <summary>Whether a header is what this field is called here or elsewhere.</summary>
    public static bool IsCalled(this ImportField field, string header) =>
        new[] { field.Name, field.Label }.Concat(field.Otherwise).Any(name => Folded(name) == Folded(header));

    public static string Folded(string text) => string.Concat(text.ToLowerInvariant().Where(char.IsLetterOrDigit));
}
