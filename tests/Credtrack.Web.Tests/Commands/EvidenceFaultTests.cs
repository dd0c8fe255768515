using System.Text;

namespace Credtrack.Web.Tests.Commands;

public sealed class EvidenceFaultTests : IDisposable
{
    private readonly EvaluateFolder folder = new();

    [Theory] // further columns, their cells, and the faults expected of line 2
    [InlineData("role", "Performed", "role: expected one of performed, interpreted")]
    [InlineData("setting", "teaching", "setting: expected one of clinical, education, simulation")]
    [InlineData("indicated", "true", "indicated: expected one of yes, no")]
    [InlineData("supervision", " direct", "supervision: expected one of direct, later, none")]
    [InlineData("assisted", "YES", "assisted: expected one of yes, no")]
    [InlineData("read_at", "yesterday", "read_at: expected a date YYYY-MM-DD or a time YYYY-MM-DDThh:mm[:ss[.fraction]] with Z, +hh:mm, -hh:mm or nothing")]
    [InlineData("read_at", "2026-01-31T23:59", "read_at: expected a day not before that of performed_at")]
    [InlineData("quality", "3", "quality: expected read_at beside it")]
    [InlineData("views", "yes", "views: expected read_at beside it")]
    [InlineData("result", "TP", "result: expected read_at beside it")]
    [InlineData("read_at,quality", "2026-02-01,3.0", "quality: expected one of 1, 2, 3, 4, 5")]
    [InlineData("read_at,quality", "2026-02-01,6", "quality: expected one of 1, 2, 3, 4, 5")]
    [InlineData("read_at,views", "2026-02-01,adequate", "views: expected one of yes, no")]
    [InlineData("read_at,result", "2026-02-01,tp", "result: expected one of TP, TN, FP, FN, ID")]
    [InlineData("outcome_at", "2026-02-01", "outcome_result: expected a value, because outcome_at is given")]
    [InlineData("outcome_result", "TP", "outcome_at: expected a value, because outcome_result is given")]
    [InlineData("outcome_at,outcome_result", "2026-02-30,XX", "outcome_at: expected a date", "outcome_result: expected one of TP, TN, FP, FN, ID")]
    public void A_cell_at_fault_is_named_by_line_and_column(string columns, string cells, params string[] faults)
    {
        var found = folder.Faults(EvaluateFolder.Rulebook, $"scan,person,application,performed_at,{columns}\ns1,p1,cardiac,2026-02-01,{cells}\n");
        Assert.Equal(faults.Length, found.Length);
        Assert.All(faults.Zip(found), pair => Assert.StartsWith($"scans.csv:2: {pair.First}", pair.Second, StringComparison.Ordinal));
    }

    [Fact]
    public void What_is_required_is_missed_cell_by_cell() => Assert.Equal(
        ["scans.csv:2: scan: expected a value", "scans.csv:2: person: expected a value", "scans.csv:2: application: expected a value", "scans.csv:2: performed_at: expected a value"],
        folder.Faults(EvaluateFolder.Rulebook, "scan,person,application,performed_at,x\n,,,,1\n"));

    [Fact]
    public void The_line_is_the_first_of_the_record_and_every_record_is_looked_at() => Assert.Equal(
        [
            "scans.csv:4: expected 5 cells, found 4",
            "scans.csv:6: scan: expected each scan once",
            "scans.csv:7: encounter: expected quotes around the whole cell, and doubled inside",
            "scans.csv:8: encounter: expected quotes around the whole cell, and doubled inside",
        ],
        folder.Faults(EvaluateFolder.Rulebook, "scan,person,application,performed_at,encounter\r\ns1,p1,cardiac,2026-02-01,\"two\r\nlines\"\r\ns2,p1,cardiac,2026-02-01\r\n\r\ns1,p1,cardiac,2026-02-01,\r\ns3,p1,cardiac,2026-02-01,a\"b\"\r\ns4,p1,cardiac,2026-02-01,\"never closed\r\n"));

    [Fact]
    public void A_header_names_every_required_column_once() => Assert.Equal(
        ["scans.csv:1: x: expected this column once", "scans.csv:1: application: expected this column, which is missing", "scans.csv:2: role: expected one of performed, interpreted"],
        folder.Faults(EvaluateFolder.Rulebook, "scan,person,performed_at,role,x,x\ns1,p1,2026-02-01,none,,\n"));

    [Fact]
    public void An_empty_file_lacks_its_header() => Assert.Equal(["scans.csv:1: expected a header row"], folder.Faults(EvaluateFolder.Rulebook, ""));

    [Fact]
    public void A_quote_left_open_over_a_long_file_is_named_where_it_opens()
    {
        var rows = string.Concat(Enumerable.Range(0, 60_000).Select(i => $"s{i},p1,cardiac,2026-02-01\n"));
        Assert.StartsWith("scans.csv:3: expected a record of at most", Assert.Single(folder.Faults(EvaluateFolder.Rulebook, "scan,person,application,performed_at\ns,p,cardiac,2026-02-01\n\"t,p,cardiac,2026-02-01\n" + rows)), StringComparison.Ordinal);
    }

    [Fact]
    public void All_files_are_looked_at_in_one_run() => Assert.Equal(
        [
            "rulebook.json: $.name: expected a text that is not empty",
            "rulebook.json: $.version: expected a whole number, 1 or more (2^53 at most)",
            "scans.csv:2: read_at: expected a day not before that of performed_at",
            "items.csv:2: item: expected a value",
            "items.csv:2: at: expected a date YYYY-MM-DD or a time YYYY-MM-DDThh:mm[:ss[.fraction]] with Z, +hh:mm, -hh:mm or nothing",
            "items.csv:2: amount: expected a decimal number, 0 or more, such as 7.5",
            "items.csv:2: passed: expected one of yes, no",
        ],
        folder.Faults(EvaluateFolder.Rulebook.Replace("\"Harbour\"", "\"\"", StringComparison.Ordinal).Replace("\"version\": 1", "\"version\": 0", StringComparison.Ordinal),
            "scan,person,application,performed_at,read_at\ns1,p1,cardiac,2026-02-02,2026-02-01\n", "person,item,at,amount,passed\np1,,soon,-1,maybe\n"));

    [Fact]
    public void Days_are_not_compared_while_the_zone_is_unknown() => Assert.Equal(["rulebook.json: $.timeZone: expected the IANA name of a time zone, such as Europe/Lisbon"],
        folder.Faults(EvaluateFolder.Rulebook.Replace("{ \"format\"", "{ \"timeZone\": \"Harbour\", \"format\"", StringComparison.Ordinal), "scan,person,application,performed_at,read_at\ns1,p1,cardiac,2026-02-02,2026-02-01\n"));

    [Theory]
    [InlineData("1", true)]
    [InlineData("0", true)]
    [InlineData("7.25", true)]
    [InlineData("+1", false)]
    [InlineData("1e3", false)]
    [InlineData("1,5", false)]
    [InlineData(".5", false)]
    [InlineData("NaN", false)]
    [InlineData("99999999999999999999999999999999", false)]
    public void An_amount_is_a_plain_decimal(string amount, bool right) => Assert.Equal(right ? 0 : 1,
        folder.Faults(EvaluateFolder.Rulebook, "scan,person,application,performed_at\n", $"person,item,at,amount\np1,course,2026-02-01,\"{amount}\"\n").Length);

    [Fact]
    public void Bytes_that_are_no_text_are_refused()
    {
        var (code, output, error) = EvaluateFolder.Run(TimeProvider.System, "--rulebook", folder.Write("rulebook.json", EvaluateFolder.Rulebook), "--scans", folder.Write("scans.csv", [.. "scan\n"u8, 0xE9]));
        Assert.Equal((2, "", true), (code, output, error.TrimEnd().EndsWith("scans.csv: expected text in UTF-8", StringComparison.Ordinal)));
    }

    [Fact]
    public void A_byte_order_mark_quotes_unknown_columns_and_either_line_end_are_no_faults()
    {
        var text = "\uFEFF\"person\",scan,remark,application,performed_at\r\np1,\"s\"\"1\"\"\",\"a, b\r\nc\",cardiac,2026-02-01\r\n\r\n";
        var (code, output, error) = EvaluateFolder.Run(TimeProvider.System, "--rulebook", folder.Write("rulebook.json", "\uFEFF" + EvaluateFolder.Rulebook), "--scans", folder.Write("scans.csv", Encoding.UTF8.GetBytes(text)));
        Assert.Equal((0, ""), (code, error));
        Assert.Contains("\"scan\": \"s\\\"1\\\"\"", output, StringComparison.Ordinal);
    }

    public void Dispose() => folder.Dispose();
}
