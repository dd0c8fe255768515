using Credtrack.Core.Scans;

namespace Credtrack.Web.Features.Readings;

/// <summary>What waits for a reader, oldest first, and where in it a scan stands. A scan that does not wait for this reader has no place in it.</summary>
public sealed record Bench(int Position, int Length, DateTime? OldestSince, Guid? Next)
{
    /// <summary>More than anybody reads in a row; those after it come up as the first ones are read.</summary>
    private const int Most = 1000;

    /// <summary>Since when each of them waits, in order.</summary>
    public IReadOnlyList<DateTime> Waits { get; private init; } = [];

    public int Before(DateTime at) => Waits.Count(since => since < at);

    /// <summary>For a scan that is looked at away from the bench.</summary>
    public static Bench None { get; } = new(0, 0, null, null);

    public static async Task<Bench> Load(CredtrackDb db, Person reader, Scan? at = null)
    {
        var queue = await db.ScansWaitingFor(reader)
            .Select(s => new { s.Id, Since = s.Submissions.Where(x => x.Return == null).Max(x => x.At) })
            .OrderBy(w => w.Since).ThenBy(w => w.Id).Take(Most).ToListAsync();
        var place = at is null ? -1 : queue.FindIndex(w => w.Id == at.Id);
        var next = queue.Skip(place + 1).Concat(queue).FirstOrDefault(w => w.Id != at?.Id);
        return new(place + 1, queue.Count, queue.FirstOrDefault()?.Since, next?.Id) { Waits = [.. queue.Select(w => w.Since)] };
    }
}
