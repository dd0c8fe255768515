using System.Globalization;
using System.Text.Json;
using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Rulebooks.Templates;
using Credtrack.Web.Commands;
using Credtrack.Web.Tests.Laws;

namespace Credtrack.Web.Tests.Commands;

public sealed class EvaluateCommandTests : IDisposable
{
    private const string Scans = "scan,person,application,performed_at,read_at\ns1,zoe,cardiac,2026-02-01,2026-02-02\ns2,Adam,cardiac,2026-02-03,\n";

    private readonly EvaluateFolder folder = new();

    [Theory]
    [InlineData("--scans FILE is needed.", "--rulebook", "r")]
    [InlineData("--rulebook FILE is needed.")]
    [InlineData("--verbose is no option of evaluate.", "--verbose")]
    [InlineData("--scans needs a value.", "--rulebook", "r", "--scans")]
    [InlineData("--scans is given twice.", "--scans", "a", "--scans", "b")]
    [InlineData("--as-of needs a date, YYYY-MM-DD.", "--rulebook", "r", "--scans", "s", "--as-of", "today")]
    [InlineData("--format is json or text.", "--rulebook", "r", "--scans", "s", "--format", "xml")]
    [InlineData("--person needs the id of a person.", "--rulebook", "r", "--scans", "s", "--person", "")]
    public void Wrong_usage_is_told_in_a_sentence(string sentence, params string[] args)
    {
        var (code, output, error) = EvaluateFolder.Run(TimeProvider.System, args);
        Assert.Equal((2, ""), (code, output));
        Assert.Equal([sentence, EvaluateOptions.Usage], error.Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(line => line.TrimEnd('\r')));
    }

    [Fact]
    public void A_file_that_is_not_there_and_a_folder_are_told_together()
    {
        var (code, output, error) = EvaluateFolder.Run(TimeProvider.System, "--rulebook", "no-such-file.json", "--scans", ".");
        Assert.Equal((2, ""), (code, output));
        Assert.Equal(["no-such-file.json: expected a file, but there is none of this name", ".: expected a file, but this is a folder"], error.Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(line => line.TrimEnd('\r')));
    }

    [Fact]
    public void Everyone_in_either_file_has_a_standing_also_with_nothing_visible()
    {
        using var json = Json("--as-of", "2026-01-01", "--items", folder.Write("items.csv", "person,item,at\nMia,course,2026-02-01\n"));
        Assert.Equal(["Adam", "Mia", "zoe"], json.RootElement.EnumerateArray().Select(p => p.GetProperty("person").GetString()));
        Assert.All(json.RootElement.EnumerateArray(), p => Assert.Equal(0, p.GetProperty("scans").GetArrayLength()));
    }

    [Fact]
    public void One_person_is_one_object_even_if_in_neither_file()
    {
        using var zoe = Json("--as-of", "2026-03-01", "--person", "zoe");
        Assert.Equal(1, zoe.RootElement.GetProperty("applications")[0].GetProperty("counted").GetInt32());
        using var nobody = Json("--as-of", "2026-03-01", "--person", "nobody");
        Assert.Equal(("nobody", 0), (nobody.RootElement.GetProperty("person").GetString(), nobody.RootElement.GetProperty("scans").GetArrayLength()));
    }

    [Theory] // 18:30 UTC is past midnight in Kathmandu
    [InlineData("Asia/Kathmandu", "2026-02-02")]
    [InlineData("America/Chicago", "2026-02-01")]
    public void Without_a_day_it_is_today_in_the_rulebooks_zone(string zone, string day)
    {
        var rulebook = EvaluateFolder.Rulebook.Replace("{ \"format\"", $"{{ \"timeZone\": \"{zone}\", \"format\"", StringComparison.Ordinal);
        var clock = new StoppedClock(new DateTimeOffset(2026, 2, 1, 18, 30, 0, TimeSpan.Zero));
        var (_, output, _) = EvaluateFolder.Run(clock, "--rulebook", folder.Write("rulebook.json", rulebook), "--scans", folder.Write("scans.csv", Scans), "--person", "zoe");
        using var json = JsonDocument.Parse(output);
        Assert.Equal(day, json.RootElement.GetProperty("asOf").GetString());
    }

    [Fact]
    public void Text_tells_people_what_is_missing_and_why()
    {
        var text = Output("--as-of", "2026-03-01", "--format", "text");
        Assert.Contains("2 scans: missing 1 scan", text, StringComparison.Ordinal);
        Assert.Contains("s2 (cardiac) is pending: waits for a reading", text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_scan_log_is_evaluated_by_the_template()
    {
        var log = Path.Combine(Sources.Root, "tests/data/scan-log.csv");
        var (code, output, error) = EvaluateFolder.Run(TimeProvider.System, "--rulebook", folder.Write("rulebook.json", Template.Find("acep-2016")!.Text), "--scans", log, "--as-of", "2027-12-31");
        Assert.Equal((0, ""), (code, error));
        using var json = JsonDocument.Parse(output);
        var standings = json.RootElement.EnumerateArray().ToList();
        // 2,400 invented rows of 24 people; what counts is found a second time here, from the file alone.
        var rows = File.ReadLines(log).Skip(1).Select(line => line.Split(',')).ToList();
        Assert.Equal((24, 2400), (standings.Count, standings.Sum(s => s.GetProperty("scans").GetArrayLength())));
        var listed = standings[0].GetProperty("applications").EnumerateArray().Select(a => a.GetProperty("code").GetString()!).ToHashSet();
        var countable = rows.Where(r => listed.Contains(r[2])).GroupBy(r => (r[1], r[2], r[5].Length > 0 ? r[5] : r[0])).Select(g => g.MinBy(r => (DateTimeOffset.Parse(r[4], CultureInfo.InvariantCulture), r[0]))!);
        Assert.Equal(countable.Count(r => r[11].Length > 0), standings.Sum(s => (int)s.GetProperty("overall").GetProperty("requirements")[0].GetProperty("value").GetDouble()));
    }

    [Fact]
    public void Four_times_the_scans_take_about_four_times_the_work_not_sixteen()
    {
        var rules = RulesReader.Read(Template.Find("acep-2016")!.Text, "America/Chicago").Rules!;
        var scans = ScansCsv.Read(File.ReadAllText(Path.Combine(Sources.Root, "tests/data/scan-log.csv")), rules.Zone, []).Select(s => s.Scan).Take(2000).ToList();
        Assert.InRange((double)Allocated(rules, scans) / Allocated(rules, scans[..500]), 1, 8);
    }

    // Bytes, unlike seconds, do not depend on what else the machine is doing.
    private static long Allocated(Rules rules, List<ScanEvidence> scans)
    {
        Standing.Of(rules, scans, [], new DateOnly(2027, 12, 31));
        var before = GC.GetAllocatedBytesForCurrentThread();
        Assert.Equal(scans.Count, Standing.Of(rules, scans, [], new DateOnly(2027, 12, 31)).Findings.Count);
        return GC.GetAllocatedBytesForCurrentThread() - before;
    }

    private JsonDocument Json(params string[] more) => JsonDocument.Parse(Output(more));

    private string Output(params string[] more)
    {
        var (code, output, error) = EvaluateFolder.Run(TimeProvider.System, ["--rulebook", folder.Write("rulebook.json", EvaluateFolder.Rulebook), "--scans", folder.Write("scans.csv", Scans), .. more]);
        Assert.Equal((0, ""), (code, error));
        return output;
    }

    public void Dispose() => folder.Dispose();

    private sealed class StoppedClock(DateTimeOffset now) : TimeProvider
    {
        public override DateTimeOffset GetUtcNow() => now;
    }
}
