using System.Text.Json;
using Credtrack.Web.Commands;
using Credtrack.Web.Tests.Laws;

namespace Credtrack.Web.Tests.Commands;

public sealed class EvaluateTests
{
    private static readonly string Cases = Path.Combine(Sources.Root, "tests/Credtrack.Web.Tests/Commands/cases");

    public static TheoryData<string> Names => [.. Directory.GetDirectories(Cases).Select(folder => Path.GetFileName(folder)!).Order(StringComparer.Ordinal)];

    [Fact]
    public void There_are_twenty_cases() => Assert.Equal(20, Names.Count);

    [Theory] // source: evaluations by an independent program, see cases/README.md
    [MemberData(nameof(Names))]
    public void A_second_program_comes_to_the_same_standings(string name)
    {
        var folder = Path.Combine(Cases, name);
        var day = File.ReadAllText(Path.Combine(folder, "as-of.txt")).Trim();
        var (code, output, error) = Ran("--rulebook", Path.Combine(folder, "rulebook.json"), "--scans", Path.Combine(folder, "scans.csv"),
            "--items", Path.Combine(folder, "items.csv"), "--as-of", day);
        Assert.Equal((0, ""), (code, error));
        using var expected = JsonDocument.Parse(File.ReadAllText(Path.Combine(folder, "expected.json")));
        using var actual = JsonDocument.Parse(output);
        Assert.Empty(Differences(expected.RootElement, actual.RootElement, "$").Take(10));
    }

    private static (int Code, string Output, string Error) Ran(params string[] args) => EvaluateFolder.Run(TimeProvider.System, args);

    /// <summary>Numbers to 1e-9, everything else exactly, the set of keys too.</summary>
    private static IEnumerable<string> Differences(JsonElement expected, JsonElement actual, string path)
    {
        if (expected.ValueKind != actual.ValueKind) return [$"{path}: {expected.ValueKind}, not {actual.ValueKind}"];
        return expected.ValueKind switch
        {
            JsonValueKind.Number => Math.Abs(expected.GetDouble() - actual.GetDouble()) <= 1e-9 ? [] : [$"{path}: {expected}, not {actual}"],
            JsonValueKind.String => expected.GetString() == actual.GetString() ? [] : [$"{path}: {expected}, not {actual}"],
            JsonValueKind.Array => expected.GetArrayLength() != actual.GetArrayLength() ? [$"{path}: {expected.GetArrayLength()} long, not {actual.GetArrayLength()}"]
                : expected.EnumerateArray().Zip(actual.EnumerateArray()).SelectMany((pair, at) => Differences(pair.First, pair.Second, $"{path}[{at}]")),
            JsonValueKind.Object => Keys(expected) != Keys(actual) ? [$"{path}: keys {Keys(expected)}, not {Keys(actual)}"]
                : expected.EnumerateObject().SelectMany(p => Differences(p.Value, actual.GetProperty(p.Name), $"{path}.{p.Name}")),
            _ => [],
        };
    }

    private static string Keys(JsonElement element) => string.Join(", ", element.EnumerateObject().Select(p => p.Name).Order(StringComparer.Ordinal));
}
