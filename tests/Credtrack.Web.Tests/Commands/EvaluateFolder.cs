using System.Text;
using Credtrack.Web.Commands;

namespace Credtrack.Web.Tests.Commands;

/// <summary>A folder of its own with the files of one run, gone afterwards.</summary>
internal sealed class EvaluateFolder : IDisposable
{
    public const string Rulebook = """
        { "format": "credtrack-rulebook/1", "name": "Harbour", "version": 1, "effective": "2026-01-01",
          "applications": [{ "code": "cardiac", "require": [{ "kind": "count", "min": 2 }] }] }
        """;

    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("credtrack-evaluate-");

    public string Write(string name, string text) => Write(name, Encoding.UTF8.GetBytes(text));

    public string Write(string name, byte[] bytes)
    {
        var path = Path.Combine(folder.FullName, name);
        File.WriteAllBytes(path, bytes);
        return path;
    }

    /// <summary>The faults of these scans, without the path of the folder.</summary>
    public string[] Faults(string rulebook, string scans, string? items = null)
    {
        string[] args = ["--rulebook", Write("rulebook.json", rulebook), "--scans", Write("scans.csv", scans), .. items is null ? [] : new[] { "--items", Write("items.csv", items) }];
        var (code, output, error) = Run(TimeProvider.System, [.. args, "--as-of", "2026-12-31"]);
        Assert.Equal((error.Length > 0 ? 2 : 0, error.Length > 0), (code, output.Length == 0));
        return [.. error.Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(line => line.Replace(folder.FullName + Path.DirectorySeparatorChar, "", StringComparison.Ordinal).TrimEnd('\r'))];
    }

    public static (int Code, string Output, string Error) Run(TimeProvider clock, params string[] args)
    {
        using var output = new StringWriter();
        using var error = new StringWriter();
        var code = Evaluate.Run(args, output, error, clock);
        return (code, output.ToString(), error.ToString());
    }

    public void Dispose() => folder.Delete(recursive: true);
}
