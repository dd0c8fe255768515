namespace Credtrack.Web.Commands;

/// <summary>Checks that no entry of the ledger was changed, removed or moved, and that what was signed, declined, ended and issued is still what the ledger says. Exit status 0 if all is whole, 1 if not, 2 for wrong use.</summary>
public static class Verify
{
    public const string Usage = "usage: verify";
    public const string NotSeen = "Not seen by this check: an end cut off a chain, a whole chain taken away, and a chain sealed anew after a change. "
        + "They show only against a root of all chains kept outside this machine, which this version does not write yet. "
        + "Rows beside the ledger are compared for what was signed, declined, ended and issued; of scans, readings, follow-ups and people the ledger alone is checked.";

    /// <param name="args">What follows the word verify: nothing.</param>
    /// <param name="output">One line for each bad place, the first one first, and for each row that the ledger speaks of otherwise; then how many chains are whole and what is not seen.</param>
    public static async Task<int> Run(string[] args, TextWriter output, TextWriter error, CredtrackDb db)
    {
        if (args.Length > 0)
        {
            await error.WriteLineAsync($"{args[0]} is no option of verify.");
            await error.WriteLineAsync(Usage);
            return 2;
        }
        var walk = new LedgerWalk(db);
        var isReadable = await Rows.CanBeRead(walk.Run);
        foreach (var subject in walk.Broken)
        {
            if (!await Rows.CanBeRead(async () => Write(output, await walk.BreaksOf(subject)))) Write(output, [new(subject, 1, LedgerFault.Unreadable)]);
        }
        if (!isReadable) await output.WriteLineAsync(walk.At is { } at ? $"subject {at.SubjectId}: what stands behind entry {at.Number} cannot be read" : "the first entry of all cannot be read");
        var areRowsAsTold = await AreRowsAsTold(output, db);
        await output.WriteLineAsync(!isReadable ? $"The walk ended after {walk.Entries} entries."
            : walk.Broken.Count > 0 ? $"{walk.Chains} chains, {walk.Entries} entries: {walk.Broken.Count} broken."
            : $"{walk.Chains} chains, {walk.Entries} entries: whole.");
        await output.WriteLineAsync(NotSeen);
        return isReadable && walk.Broken.Count == 0 && areRowsAsTold ? 0 : 1;
    }

    private static async Task<bool> AreRowsAsTold(TextWriter output, CredtrackDb db)
    {
        var altered = 0;
        var areReadable = await Rows.CanBeRead(async () =>
        {
            await foreach (var row in RowWalk.Of(db))
            {
                altered++;
                await output.WriteLineAsync($"subject {row.SubjectId}{(row.Number is { } number ? $", entry {number}: its row is not what this entry, {row.Fact}, says" : $": a row of which no entry {row.Fact} speaks")}");
            }
        });
        if (!areReadable) await output.WriteLineAsync("A grant, or what the ledger says of it, cannot be read.");
        return areReadable && altered == 0;
    }

    private static void Write(TextWriter output, IEnumerable<LedgerBreak> breaks)
    {
        foreach (var found in breaks)
            output.WriteLine($"subject {found.SubjectId}, {(found.To > found.Number ? $"entries {found.Number} to {found.To}" : $"entry {found.Number}")}: {Word(found.Fault)}");
    }

    private static string Word(LedgerFault fault) => fault switch
    {
        LedgerFault.Missing => "missing",
        LedgerFault.OutOfOrder => "out of order",
        LedgerFault.Unreadable => "or one behind it cannot be read",
        _ => "edited, or brought here from elsewhere",
    };
}
