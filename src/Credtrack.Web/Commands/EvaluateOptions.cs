using Credtrack.Core.Measures;

namespace Credtrack.Web.Commands;

/// <summary>What was asked of evaluate.</summary>
public sealed record EvaluateOptions(string Rulebook, string Scans, string? Items, DateOnly? AsOf, string? Person, bool AsText)
{
    public const string Usage =
        "usage: evaluate --rulebook FILE --scans FILE [--items FILE] [--as-of DATE] [--person ID] [--format json|text]";

    private static readonly string[] Names = ["--rulebook", "--scans", "--items", "--as-of", "--person", "--format"];

    /// <summary>The options, or null and a sentence about the first thing that is wrong.</summary>
    public static EvaluateOptions? Read(string[] args, out string? fault)
    {
        var given = new Dictionary<string, string>();
        fault = null;
        for (var at = 0; at < args.Length && fault is null; at += 2)
        {
            fault = !Names.Contains(args[at]) ? $"{args[at]} is no option of evaluate."
                : at + 1 == args.Length ? $"{args[at]} needs a value."
                : !given.TryAdd(args[at], args[at + 1]) ? $"{args[at]} is given twice."
                : null;
        }
        fault ??= WhyNot(given);
        if (fault is not null) return null;
        return new(given["--rulebook"], given["--scans"], given.GetValueOrDefault("--items"),
            given.TryGetValue("--as-of", out var day) ? TimeText.ReadDay(day) : null, given.GetValueOrDefault("--person"), given.GetValueOrDefault("--format") == "text");
    }

    private static string? WhyNot(Dictionary<string, string> given) =>
          !given.ContainsKey("--rulebook")                                                    ? "--rulebook FILE is needed."
        : !given.ContainsKey("--scans")                                                       ? "--scans FILE is needed."
        : given.TryGetValue("--as-of", out var day) && TimeText.ReadDay(day) is null          ? "--as-of needs a date, YYYY-MM-DD."
        : given.TryGetValue("--person", out var person) && person.Length == 0                 ? "--person needs the id of a person."
        : given.TryGetValue("--format", out var format) && format is not ("json" or "text")   ? "--format is json or text."
        : null;
}
