using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Readings;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Rulebooks;

public sealed class FilterTests
{
    private static readonly ScanEvidence Unread = Book.Scan("a", 10);

    // A read, clinical, indicated, unassisted scan of 10 March, performed, supervised later, subtype femoral, quality 3, views adequate, TP.
    private static readonly ScanEvidence Typical = Unread.As(Result.TP) with { Subtype = "femoral" };

    [Theory]
    [InlineData("{}", Fit.Yes)]
    [InlineData("""{ "performed": {} }""", Fit.Yes)]
    [InlineData("""{ "performed": { "from": "2026-03-10", "to": "2026-03-10" } }""", Fit.Yes)]
    [InlineData("""{ "performed": { "from": "2026-03-11" } }""", Fit.No, "performed", "performed before 2026-03-11")]
    [InlineData("""{ "performed": { "to": "2026-03-09" } }""", Fit.No, "performed", "performed after 2026-03-09")]
    [InlineData("""{ "role": ["interpreted", "performed"] }""", Fit.Yes)]
    [InlineData("""{ "role": ["interpreted"] }""", Fit.No, "role", "role is performed, not interpreted")]
    [InlineData("""{ "setting": ["clinical"] }""", Fit.Yes)]
    [InlineData("""{ "setting": ["education", "simulation"] }""", Fit.No, "setting", "setting is clinical, not teaching or simulation")]
    [InlineData("""{ "indicated": true }""", Fit.Yes)]
    [InlineData("""{ "indicated": false }""", Fit.No, "indicated", "clinically indicated")]
    [InlineData("""{ "supervision": ["later"] }""", Fit.Yes)]
    [InlineData("""{ "supervision": ["direct", "none"] }""", Fit.No, "supervision", "supervision is later, not direct or none")]
    [InlineData("""{ "assisted": false }""", Fit.Yes)]
    [InlineData("""{ "assisted": true }""", Fit.No, "assisted", "unassisted")]
    [InlineData("""{ "subtype": ["femoral"] }""", Fit.Yes)]
    [InlineData("""{ "subtype": ["Femoral"] }""", Fit.No, "subtype", "part is femoral, not Femoral")]
    [InlineData("""{ "read": true }""", Fit.Yes)]
    [InlineData("""{ "read": false }""", Fit.Yes)]
    [InlineData("""{ "quality": { "min": 3 } }""", Fit.Yes)]
    [InlineData("""{ "quality": { "min": 4 } }""", Fit.No, "quality", "image quality below 4")]
    [InlineData("""{ "views": true }""", Fit.Yes)]
    [InlineData("""{ "views": false }""", Fit.No, "views", "all required views are adequate")]
    [InlineData("""{ "result": ["TP", "TN"] }""", Fit.Yes)]
    [InlineData("""{ "result": ["FN"] }""", Fit.No, "result", "result is TP, not FN")]
    [InlineData("""{ "positive": true }""", Fit.Yes)]
    [InlineData("""{ "positive": false }""", Fit.No, "positive", "result TP is not negative")]
    [InlineData("""{ "positive": false, "assisted": true, "quality": { "min": 5 } }""", Fit.No, "assisted", "unassisted")]
    public void A_read_scan_is_answered_with_yes_or_the_first_key_that_fails(string filter, Fit answer, string? key = null, string? words = null) =>
        Assert.Equal((answer, key, words), Ask(filter, Typical));

    [Theory]
    [InlineData("{}", Fit.Open)]
    [InlineData("""{ "read": false }""", Fit.Yes)]
    [InlineData("""{ "read": false, "role": ["performed"] }""", Fit.Yes)]
    [InlineData("""{ "read": false, "quality": { "min": 1 } }""", Fit.Open)]
    [InlineData("""{ "read": false, "views": false }""", Fit.Open)]
    [InlineData("""{ "read": false, "result": ["TP"] }""", Fit.Open)]
    [InlineData("""{ "read": false, "positive": true }""", Fit.Open)]
    [InlineData("""{ "quality": { "min": 5 }, "assisted": true }""", Fit.No, "assisted")]
    public void An_unread_scan_stays_open_where_a_reading_may_decide(string filter, Fit answer, string? key = null)
    {
        var (given, failed, _) = Ask(filter, Unread);
        Assert.Equal((answer, key), (given, failed));
    }

    [Theory]
    [InlineData("""{ "subtype": ["femoral"] }""", "subtype", "no subtype given")]
    [InlineData("""{ "quality": { "min": 1 } }""", "quality", "no image quality given")]
    [InlineData("""{ "views": false }""", "views", "the required views were not judged")]
    [InlineData("""{ "result": ["ID"] }""", "result", "no result given")]
    [InlineData("""{ "positive": false }""", "positive", "no result given")]
    public void A_read_scan_that_lacks_the_value_fails_at_its_key(string filter, string key, string words) =>
        Assert.Equal((Fit.No, key, words), Ask(filter, Unread.As(null, null, null)));

    [Theory] // positive holds where the truth is positive; ID is neither
    [InlineData(Result.TP, true)]
    [InlineData(Result.FN, true)]
    [InlineData(Result.TN, false)]
    [InlineData(Result.FP, false)]
    [InlineData(Result.ID, null)]
    public void Positive_is_the_truth_and_not_the_answer(Result result, bool? truth)
    {
        Assert.Equal(truth == true, Ask("""{ "positive": true }""", Unread.As(result)).Answer == Fit.Yes);
        Assert.Equal(truth == false, Ask("""{ "positive": false }""", Unread.As(result)).Answer == Fit.Yes);
    }

    [Theory]
    [InlineData("{}", "read", "1 scan")]
    [InlineData("""{ "read": false }""", "read or not", "1 scan")]
    [InlineData("""{ "setting": ["education"], "assisted": false, "quality": { "min": 3 } }""", "teaching, unassisted, of image quality 3 or better", "1 teaching unassisted scan of image quality 3 or better")]
    [InlineData("""{ "positive": true, "supervision": ["direct"], "views": true }""", "directly supervised, with all required views adequate, positive", "1 positive scan directly supervised with all required views adequate")]
    [InlineData("""{ "role": ["performed", "interpreted"], "subtype": ["a", "b"], "result": ["TP", "TN"] }""", "performed or interpreted, of subtype a or b, with result TP or TN", "1 performed or interpreted scan of subtype a or b with result TP or TN")]
    [InlineData("""{ "performed": { "from": "2026-01-01" }, "indicated": false }""", "performed from 2026-01-01, not clinically indicated", "1 not clinically indicated scan performed from 2026-01-01")]
    public void A_filter_reads_as_words(string filter, string words, string oneScan)
    {
        var read = Counting(filter);
        Assert.Equal((words, oneScan), (read.Words, read.Scans(1)));
        Assert.Equal(oneScan.Replace("1 ", "7 ", StringComparison.Ordinal).Replace("scan", "scans", StringComparison.Ordinal), read.Scans(7));
    }

    [Theory] // the application's counting laid over {"role": ["interpreted"], "quality": {"min": 4}, "performed": {"to": "2026-03-01"}}
    [InlineData("{}", "performed", "role", "quality")]
    [InlineData("""{ "role": ["performed"], "performed": {} }""", "quality")]
    [InlineData("""{ "role": null, "performed": null }""", "quality")]
    [InlineData("""{ "role": null, "quality": null, "performed": null, "read": null, "views": null }""")]
    [InlineData("""{ "role": null, "quality": { "min": 3 }, "performed": null, "positive": false }""", "positive")]
    public void A_key_of_the_application_replaces_the_whole_value_and_null_removes_it(string own, params string[] failing)
    {
        var counting = Book.Read($$"""
            "counting": { "role": ["interpreted"], "quality": { "min": 4 }, "performed": { "to": "2026-03-01" }, "read": false },
            "applications": [{ "code": "cardiac", "counting": {{own}}, "require": [] }]
            """).Applications[0].Counting;
        Assert.Equal(failing, counting.Conditions.Where(c => !c.Holds(See(Typical))).Select(c => c.Key));
        Assert.Equal(own.Contains("read", StringComparison.Ordinal) ? null : false, counting.Read);
    }

    private static (Fit Answer, string? Key, string? Words) Ask(string filter, ScanEvidence scan)
    {
        var answer = Counting(filter).For(See(scan), out var failed);
        return (answer, failed?.Key, failed?.WhyNot(See(scan)));
    }

    private static Filter Counting(string filter) => Book.Cardiac($$""" "counting": {{filter}}, "require": [] """).Applications[0].Counting;

    private static SeenScan See(ScanEvidence scan) => SeenScan.On(Book.Day, scan, TimeZoneInfo.Utc)!;
}
