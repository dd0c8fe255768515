using System.Reflection;

namespace Credtrack.Web.Commands;

/// <summary>The first word of the command line: what needs no settings is answered here, what is no command gets the list of them.</summary>
public static class CommandLine
{
    private static readonly (string Name, string What)[] Known =
    [
        ("(none)", "serve the site; options are settings, such as --ConnectionStrings:Credtrack VALUE"),
        ("migrate", "make the database, or bring it up to date"),
        ("demo", "fill an empty database with invented people and scans; in Development only"),
        ("import --programme NAME --by ADDRESS FILE [--yes]", "bring in past scans; without --yes only show what would happen"),
        ("invite --administrator", "print a link with which an administrator chooses name and password"),
        ("evaluate --rulebook FILE --scans FILE ...", "evaluate a rulebook over files, without a site"),
        ("check FILE...", "say whether documents are ours, unaltered and still stand"),
        ("verify", "look for changes in the ledger"),
        ("--help", "this list"),
        ("--version", "the version of this program"),
    ];

    /// <summary>The exit status, or null if the settings are needed.</summary>
    public static async Task<int?> Answer(string[] args)
    {
        if (args is not [var first, .. var rest]) return null;
        if (first == "check" && rest is ["--certificate", ..]) return await Check.Run(rest, Console.Out, Console.Error);
        if (first == "evaluate")
        {
            Console.OutputEncoding = System.Text.Encoding.UTF8;
            return Evaluate.Run(rest, Console.Out, Console.Error, TimeProvider.System);
        }
        if (first == "--help") return await Say(Console.Out, List, 0);
        if (first == "--version") return await Say(Console.Out, $"credtrack {typeof(CommandLine).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()!.InformationalVersion}", 0);
        return SiteCommands.Are(args) || IsOption(first) ? null : await Say(Console.Error, $"{first} is no command.\n{List}", 2);
    }

    private static string List => $"usage: dotnet Credtrack.Web.dll [COMMAND]\n{string.Join('\n', Known.Select(k => $"  {k.Name}\n      {k.What}"))}";

    // As the settings are read: --Key value, /Key value or Key=value.
    private static bool IsOption(string word) => word.StartsWith('-') || word.StartsWith('/') || word.Contains('=', StringComparison.Ordinal);

    private static async Task<int> Say(TextWriter output, string text, int code)
    {
        await output.WriteLineAsync(text);
        return code;
    }
}
