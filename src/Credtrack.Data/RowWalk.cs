using System.Text.Json;
using Credtrack.Core.Grants;

namespace Credtrack.Data;

/// <summary>A row that does not say what the ledger says of it: the entry, or null where no entry speaks of such a row.</summary>
public sealed record RowBreak(Guid SubjectId, int? Number, string Fact);

/// <summary>
/// Compares rows that hold signed texts, reasons and papers with the facts of their nouns, and so finds what was changed, put in or taken away
/// past the program. A value that an older fact did not hold yet is not judged.
/// </summary>
public static class RowWalk
{
    /// <summary>One after the other, without holding more than one noun in memory.</summary>
    public static async IAsyncEnumerable<RowBreak> Of(CredtrackDb db)
    {
        var grants = db.Grants.AsNoTracking().Include(g => g.Documents).OrderBy(g => g.Id)
            .Select(g => new { Grant = g, Entries = db.LedgerEntries.Where(e => e.SubjectId == g.Id && Grant.ClaimedBy.Contains(e.Kind)).ToList() });
        await foreach (var row in grants.AsAsyncEnumerable())
            foreach (var found in Breaks(row.Grant, Grant.ClaimedBy, row.Entries)) yield return found;
    }

    private static IEnumerable<RowBreak> Breaks(Recorded noun, IEnumerable<string> kinds, IReadOnlyList<LedgerEntry> entries)
    {
        var claims = noun.Claims().ToLookup(c => c.Fact);
        foreach (var kind in kinds)
        {
            var (told, found) = (entries.Where(e => e.Kind == kind).OrderBy(e => e.Number).ToList(), claims[kind].OrderBy(c => c.At).ToList());
            for (var n = 0; n < Math.Max(told.Count, found.Count); n++)
                if (n >= told.Count || n >= found.Count || !Agrees(told[n], found[n])) yield return new(noun.Id, n < told.Count ? told[n].Number : null, kind);
        }
    }

    private static bool Agrees(LedgerEntry entry, RowClaim claim)
    {
        using var fact = JsonDocument.Parse(entry.Detail);
        return (claim.By ?? entry.ById) == entry.ById && claim.At == entry.At && claim.Says.All(s => !fact.RootElement.TryGetProperty(s.Key, out var value) || value.GetString() == s.Value);
    }
}
