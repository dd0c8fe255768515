namespace Credtrack.Data;

public enum LedgerFault { Edited, Missing, OutOfOrder, Unreadable }

/// <summary>One place where a chain does not hold: an entry, or the first to the last of those that are missing.</summary>
public sealed record LedgerBreak(Guid SubjectId, int Number, LedgerFault Fault, int? To = null);

/// <summary>
/// Checks all chains, one entry after the other, without holding more than one in memory; only a broken chain is then read whole, to say what
/// is wrong with it. Seals need no secret: who may write everywhere can cut off an end or seal a whole rest anew, unseen from in here.
/// </summary>
public sealed class LedgerWalk(CredtrackDb db)
{
    private readonly HashSet<Guid> broken = [];
    private LedgerEntry? last;

    public int Chains { get; private set; }
    public int Entries { get; private set; }
    public IReadOnlyCollection<Guid> Broken => broken;

    /// <summary>The entry that was read last, null before the first: where the walk stood if a row could not be read.</summary>
    public (Guid SubjectId, int Number)? At => last is null ? null : (last.SubjectId, last.Number);

    /// <summary>Goes once through the ledger, subject by subject.</summary>
    public async Task Run()
    {
        await foreach (var entry in db.LedgerEntries.AsNoTracking().OrderBy(e => e.SubjectId).ThenBy(e => e.Number).AsAsyncEnumerable())
        {
            var before = last?.SubjectId == entry.SubjectId ? last : null;
            if (before is null) Chains++;
            if (!entry.Follows(before)) broken.Add(entry.SubjectId);
            Entries++;
            last = entry;
        }
    }

    /// <summary>What is wrong with the chain of a subject, in its order. Takes time by the square of its length if most of it is wrong.</summary>
    public async Task<IReadOnlyList<LedgerBreak>> BreaksOf(Guid subject) =>
        [.. Breaks(await db.LedgerEntries.AsNoTracking().Where(e => e.SubjectId == subject).OrderBy(e => e.Number).ToListAsync())];

    private static IEnumerable<LedgerBreak> Breaks(IReadOnlyList<LedgerEntry> chain)
    {
        var (before, next) = ((LedgerEntry?)null, 1);
        foreach (var entry in chain)
        {
            if (entry.Number < next)
            {
                yield return new(entry.SubjectId, entry.Number, LedgerFault.OutOfOrder);
                continue;
            }
            if (entry.Number > next)
            {
                yield return new(entry.SubjectId, next, LedgerFault.Missing, entry.Number - 1);
                before = entry; // nothing is left by which it could be judged
            }
            else if (entry.FitsAs(next, before))
            {
                before = entry;
            }
            else
            {
                var displaced = chain.FirstOrDefault(other => other.FitsAs(next, before));
                yield return new(entry.SubjectId, next, displaced is null ? LedgerFault.Edited : LedgerFault.OutOfOrder);
                before = displaced ?? entry;
            }
            next = entry.Number + 1;
        }
    }
}
