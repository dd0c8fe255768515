using Credtrack.Core.Scans;

namespace Credtrack.Web.Features.Readings;

/// <summary>What waits for a reader, oldest first, and where in it a scan stands. A scan that does not wait for this reader has no place in it.</summary>
public sealed record Bench(int Position, int Length, DateTime? OldestSince, Guid? Next)
{
    private sealed record Waiting
    {
        public required Guid Id { get; init; }
        public required DateTime Since { get; init; }
    }

    public static async Task<Bench> Load(CredtrackDb db, Person reader, Scan? at = null)
    {
        var queue = InOrder(db, reader);
        var (length, oldest) = (await queue.CountAsync(), await queue.FirstOrDefaultAsync());
        if (at?.WaitsSince is not { } since || !await queue.AnyAsync(w => w.Id == at.Id)) return new(0, length, oldest?.Since, oldest?.Id);
        var before = await queue.CountAsync(w => w.Since < since);
        var next = await queue.Where(w => w.Since >= since && w.Id != at.Id).FirstOrDefaultAsync();
        return new(before + 1, length, oldest!.Since, next?.Id ?? (oldest.Id == at.Id ? null : oldest.Id));
    }

    private static IQueryable<Waiting> InOrder(CredtrackDb db, Person reader) => db.ScansWaitingFor(reader)
        .Select(s => new Waiting { Id = s.Id, Since = s.Submissions.Where(x => x.Return == null).Max(x => x.At) }).OrderBy(w => w.Since).ThenBy(w => w.Id);
}
