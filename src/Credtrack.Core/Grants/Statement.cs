using System.Security.Cryptography;
using System.Text;
using Credtrack.Core.Measures.Standings;

namespace Credtrack.Core.Grants;

/// <summary>One requirement as it stood: what was asked, what there was, and whether it was met.</summary>
public sealed record Evidenced(string Asked, string Value, bool Met);

/// <summary>
/// What exactly is signed, line by line in one fixed order, so that two statements are the same text if and only if nothing moved.
/// The last line seals the whole trace: one scan more, one verdict changed, and the digest is another.
/// </summary>
public sealed record Statement(
    string Site, string Holder, Guid HolderId, string Programme, string Privilege, string Application, DateOnly AsOf,
    int Performed, int Read, int Counted, IReadOnlyList<Evidenced> Requirements, string Rulebook, int Edition, string Trace)
{
    /// <summary>The plain number of scans that is asked for, where the rulebook asks for one; a figure is drawn from it, nothing is signed by it.</summary>
    public int? Required { get; init; }

    public IReadOnlyList<Evidenced> Gaps => [.. Requirements.Where(r => !r.Met)];

    public IReadOnlyList<string> Lines =>
    [
        "format: credtrack-grant/1",
        $"site: {Site}",
        $"holder: {Holder} ({HolderId})",
        $"programme: {Programme}",
        $"privilege: {Privilege}",
        $"application: {Application}",
        $"as of: {AsOf:O}",
        $"scans performed: {Performed}",
        $"scans read: {Read}",
        $"scans that count: {Counted}",
        .. Requirements.Select(r => $"requirement: {r.Asked}; {r.Value}; {(r.Met ? "met" : "not met")}"),
        $"rulebook: {Rulebook}, version {Edition}",
        $"trace: SHA-256 {Trace}",
    ];

    public string Text => string.Join('\n', Lines.Select(l => l.ReplaceLineEndings(" "))) + "\n";

    /// <summary>SHA-256 of the text in UTF-8, in lower-case hexadecimal digits.</summary>
    public string Digest => Hex(Text);

    /// <summary>The lines of one text that the other has not: as it was, and as it is.</summary>
    public static IReadOnlyList<(string Was, string Is)> Difference(string before, string after)
    {
        var (old, now) = (before.Split('\n'), after.Split('\n'));
        var (gone, come) = (old.Except(now).ToList(), now.Except(old).ToList());
        return [.. Enumerable.Range(0, Math.Max(gone.Count, come.Count)).Select(n => (gone.ElementAtOrDefault(n) ?? "", come.ElementAtOrDefault(n) ?? ""))];
    }

    /// <summary>The trace of one application as text: every scan, its verdict and reason, in the order of the standing.</summary>
    public static string Seal(IEnumerable<Finding> findings) =>
        Hex(string.Join('\n', findings.Select(f => $"{f.Scan} {f.Verdict} {f.Reason} {f.Seen.Result} {f.Seen.Reading?.Quality}")));

    internal static string Hex(string text) => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text)));
}
