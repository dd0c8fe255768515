using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Rulebooks;

namespace Credtrack.Web.Commands;

/// <summary>The files that evaluate was given: what they hold, and every fault in all of them, each with its file.</summary>
public sealed class EvidenceFiles
{
    private ILookup<string, ScanEvidence> scans = Array.Empty<PersonScan>().ToLookup(s => s.Person, s => s.Scan);
    private ILookup<string, ItemEvidence> items = Array.Empty<PersonItem>().ToLookup(i => i.Person, i => i.Item);

    public Rules? Rules { get; private set; }
    public List<string> Faults { get; } = [];

    private EvidenceFiles() { }

    public static EvidenceFiles Read(EvaluateOptions options)
    {
        var files = new EvidenceFiles();
        TimeZoneInfo? zone = null;
        if (files.Text(options.Rulebook) is { } json) zone = files.ReadRules(options.Rulebook, json);
        if (files.Text(options.Scans) is { } scans)
            files.scans = files.Table(options.Scans, faults => ScansCsv.Read(scans, zone, faults)).ToLookup(s => s.Person, s => s.Scan, StringComparer.Ordinal);
        if (options.Items is { } path && files.Text(path) is { } items)
            files.items = files.Table(path, faults => ItemsCsv.Read(items, zone ?? TimeZoneInfo.Utc, faults)).ToLookup(i => i.Person, i => i.Item, StringComparer.Ordinal);
        return files;
    }

    /// <summary>The person asked for, whether in a file or not; else everyone in either file, by ordinal of the id.</summary>
    public IEnumerable<string> People(string? only) => only is not null ? [only]
        : scans.Select(s => s.Key).Union(items.Select(i => i.Key), StringComparer.Ordinal).Order(StringComparer.Ordinal);

    public IEnumerable<ScanEvidence> ScansOf(string person) => scans[person];

    public IEnumerable<ItemEvidence> ItemsOf(string person) => items[person];

    private TimeZoneInfo? ReadRules(string path, string json)
    {
        var read = RulesReader.Read(json, "UTC");
        Rules = read.Rules;
        Faults.AddRange(read.Faults.Select(fault => $"{path}: {fault}"));
        return read.Zone;
    }

    private string? Text(string path)
    {
        var text = FileText.Read(path, out var fault);
        if (fault is not null) Faults.Add($"{path}: {fault}");
        return text;
    }

    private IReadOnlyList<T> Table<T>(string path, Func<List<CsvFault>, IReadOnlyList<T>> read)
    {
        var faults = new List<CsvFault>();
        var rows = read(faults);
        Faults.AddRange(faults.Select(fault => $"{path}:{fault.Line}: {(fault.Column is { } column ? OneLine(column) + ": " : "")}{fault.Expected}"));
        return rows;
    }

    // The name of a column comes from the file and may hold anything.
    internal static string OneLine(string name) => new([.. name.Select(letter => char.IsControl(letter) ? ' ' : letter)]);
}
