using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Features.Standings;

/// <summary>One scan of a standing. What is closed to the viewer says only that it is read or waits, not what came of it.</summary>
public sealed record TraceLine(Finding Finding, Guid ScanId, string Application, DateTime PerformedAt, ScanState State, bool IsClosed, string Because)
{
    /// <summary>The scans that the viewer may open, newest first. Those of other programmes are in the counts alone.</summary>
    public static async Task<IReadOnlyList<TraceLine>> Load(CredtrackDb db, Person viewer, Guid personId, Standing standing, Dictionary<string, string> names)
    {
        var scans = await db.ScansVisibleTo(viewer).AsNoTracking().Handed().Where(s => s.TraineeId == personId).ToDictionaryAsync(s => s.Id.ToString());
        return [.. from finding in standing.Findings.Reverse()
                   where scans.ContainsKey(finding.Scan)
                   let scan = scans[finding.Scan]
                   let closed = scan.IsClosedTo(viewer)
                   select new TraceLine(finding, scan.Id, names.GetValueOrDefault(finding.Application, finding.Application), scan.PerformedAt, scan.State, closed, closed ? Closed(scan) : Open(scan, finding))];
    }

    private static string Closed(Scan scan) => scan.State == ScanState.Read ? "open to you once you have read it" : "waits for a reading";

    private static string Open(Scan scan, Finding finding)
    {
        if (finding.Verdict == Verdict.Pending && scan.ReturnedWith is { } back) return $"returned: {back.Missing}";
        var read = finding.Seen.Reading is null ? null : scan.Readings.MinBy(r => r.Number);
        string?[] said =
        [
            read is null ? scan.State == ScanState.Imported ? "imported unread" : null : $"{(read.IsElsewhere ? "read elsewhere, attested" : "read")} by {read.Reader.Name}{(read.Quality is { } quality ? $", quality {quality} of 5" : "")}",
            scan.Imported?.Assumed is { } assumed ? $"assumed: {assumed}" : null,
        ];
        var by = string.Join("; ", said.OfType<string>());
        return finding.Words() is { } why ? by.Length > 0 && (finding.Verdict == Verdict.Excluded || scan.Imported is not null) ? $"{why}; {by}" : why : by;
    }
}
