namespace Credtrack.Web.Commands;

/// <summary>What was asked of import.</summary>
public sealed record ImportOptions(string Programme, string By, string File, bool Saves)
{
    public const string Usage = "usage: import --programme NAME --by ADDRESS FILE [--yes]";

    /// <summary>The options, or null and a sentence about the first thing that is wrong.</summary>
    public static ImportOptions? Read(string[] args, out string? fault)
    {
        var (given, files, yes) = (new Dictionary<string, string>(), new List<string>(), false);
        fault = null;
        for (var at = 0; at < args.Length && fault is null; at++)
        {
            if (args[at] == "--yes") yes = true;
            else if (!args[at].StartsWith('-')) files.Add(args[at]);
            else if (args[at] is not ("--programme" or "--by")) fault = $"{args[at]} is no option of import.";
            else if (at + 1 == args.Length) fault = $"{args[at]} needs a value.";
            else if (!given.TryAdd(args[at], args[++at])) fault = $"{args[at - 1]} is given twice.";
        }
        fault ??= !given.ContainsKey("--programme") ? "--programme NAME is needed."
            : !given.ContainsKey("--by") ? "--by ADDRESS, that of the coordinator who attests the file, is needed."
            : files.Count != 1 ? "One FILE is needed." : null;
        return fault is null ? new(given["--programme"], given["--by"], files[0], yes) : null;
    }
}
