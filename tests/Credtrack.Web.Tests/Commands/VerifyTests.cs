using System.Globalization;
using Credtrack.Web.Commands;
using Credtrack.Web.Tests.Data;

namespace Credtrack.Web.Tests.Commands;

public sealed class VerifyTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const int Seeds = 100;
    private const string Edited = "entry {1}: edited, or brought here from elsewhere";

    // {0} a subject with four entries or more; {1} an entry in its middle, {2} the one behind that; {3} another subject, {4} the number
    // behind its last; {5}, {6}, {7} one, eight and nine behind the last of the first.
    public static TheoryData<string, string> Attacks => new()
    {
        { "UPDATE Ledger SET Kind = 'ScanReads' WHERE SubjectId = '{0}' AND Number = {1}", Edited },
        { "UPDATE Ledger SET Sentence = Sentence || ' ' WHERE SubjectId = '{0}' AND Number = {1}", Edited },
        { "UPDATE Ledger SET Detail = '[]' WHERE SubjectId = '{0}' AND Number = {1}", Edited },
        { "UPDATE Ledger SET ById = '019CA945-0000-7000-8000-000000000000' WHERE SubjectId = '{0}' AND Number = {1}", Edited },
        { "UPDATE Ledger SET At = '2026-02-28 12:00:00.123' WHERE SubjectId = '{0}' AND Number = {1}", Edited },
        { "UPDATE Ledger SET Seal = replace(replace(Seal, '0', '1'), 'A', 'B') WHERE SubjectId = '{0}' AND Number = {1}", Edited },
        { "DELETE FROM Ledger WHERE SubjectId = '{0}' AND Number = {1}", "entry {1}: missing" },
        { "DELETE FROM Ledger WHERE SubjectId = '{0}' AND Number = 1", "entry 1: missing" },
        { "DELETE FROM Ledger WHERE SubjectId = '{0}' AND Number = {1}; UPDATE Ledger SET Number = {1} WHERE SubjectId = '{0}' AND Number = {2}", Edited },
        { "UPDATE Ledger SET Number = -Number WHERE SubjectId = '{0}' AND Number = {1}", "entry -{1}: out of order" },
        {
            "UPDATE Ledger SET Number = 0 WHERE SubjectId = '{0}' AND Number = {1}; UPDATE Ledger SET Number = {1} WHERE SubjectId = '{0}' AND Number = {2}; "
            + "UPDATE Ledger SET Number = {2} WHERE SubjectId = '{0}' AND Number = 0", "entry {1}: out of order"
        },
        { "UPDATE Ledger SET SubjectId = '{3}', Number = {4} WHERE SubjectId = '{0}' AND Number = {1}", "entry {1}: missing" },
        { "INSERT INTO Ledger SELECT SubjectId, {5}, Kind, Sentence, Detail, ById, At, Seal FROM Ledger WHERE SubjectId = '{0}' AND Number = {1}", "entry {5}: edited, or brought here from elsewhere" },
        { "INSERT INTO Ledger SELECT SubjectId, {7}, Kind, Sentence, Detail, ById, At, Seal FROM Ledger WHERE SubjectId = '{0}' AND Number = {1}", "entries {5} to {6}: missing" },
    };

    [Theory, MemberData(nameof(Attacks))]
    public async Task A_rewritten_history_is_found_and_the_bad_entry_is_named(string attack, string named)
    {
        await using var copy = await Copy();
        var chains = await copy.Db.LedgerEntries.GroupBy(e => e.SubjectId).Select(g => new { Subject = g.Key, Last = g.Max(e => e.Number) }).ToListAsync();
        var chance = new Random(19);
        for (var seed = 0; seed < Seeds; seed++)
        {
            var chain = chance.GetItems(chains.Where(c => c.Last >= 4).ToArray(), 1)[0];
            var other = chance.GetItems(chains.Where(c => c != chain).ToArray(), 1)[0];
            var middle = chance.Next(2, chain.Last);
            var (code, lines) = await copy.After(Filled(attack), () => Run(copy.Db));
            Assert.True(code == 1, Filled(attack));
            Assert.Contains($"subject {chain.Subject}, {Filled(named)}", lines);
            Assert.StartsWith("subject ", lines[0], StringComparison.Ordinal);
            Assert.Equal(Verify.NotSeen, lines[^1]);

            string Filled(string text) => string.Format(CultureInfo.InvariantCulture, text, $"{chain.Subject}".ToUpperInvariant(), middle, middle + 1,
                $"{other.Subject}".ToUpperInvariant(), other.Last + 1, chain.Last + 1, chain.Last + 8, chain.Last + 9);
        }
        Assert.Equal(0, (await Run(copy.Db)).Code);
    }

    [Fact]
    public async Task A_whole_ledger_is_called_whole_with_its_numbers()
    {
        await using var copy = await Copy();
        var (chains, entries) = (await copy.Db.LedgerEntries.Select(e => e.SubjectId).Distinct().CountAsync(), await copy.Db.LedgerEntries.CountAsync());
        Assert.InRange(chains, 10, entries);
        var (code, lines) = await Run(copy.Db);
        Assert.Equal((0, $"{chains} chains, {entries} entries: whole.", Verify.NotSeen), (code, lines[0], lines[1]));
    }

    [Fact]
    public async Task Each_broken_chain_is_told_with_its_first_bad_entry_first()
    {
        await using var copy = await Copy();
        var subjects = await copy.Db.LedgerEntries.Where(e => e.Number == 4).OrderBy(e => e.SubjectId).Select(e => e.SubjectId).Take(2).ToListAsync();
        var (code, lines) = await copy.After("UPDATE Ledger SET Detail = '' WHERE Number IN (2, 4)", () => Run(copy.Db));
        Assert.Equal(1, code);
        Assert.Equal([.. subjects.SelectMany(s => Enumerable.Range(1, 2).Select(half => $"subject {s}, entry {2 * half}: edited, or brought here from elsewhere"))],
            lines.Where(line => subjects.Any(s => line.Contains($"{s}", StringComparison.Ordinal))));
        Assert.EndsWith(" broken.", lines[^2], StringComparison.Ordinal);
    }

    [Fact]
    public async Task Entries_that_were_exchanged_are_both_named_and_none_else()
    {
        await using var copy = await Copy();
        var subject = await copy.Db.LedgerEntries.Where(e => e.Number == 4).Select(e => e.SubjectId).FirstAsync();
        var (_, lines) = await copy.After($"UPDATE Ledger SET Number = -Number WHERE SubjectId = '{subject.ToString().ToUpperInvariant()}' AND Number IN (1, 3); "
            + "UPDATE Ledger SET Number = CASE Number WHEN -1 THEN 3 ELSE 1 END WHERE Number < 0", () => Run(copy.Db));
        Assert.Equal([$"subject {subject}, entry 1: out of order", $"subject {subject}, entry 3: out of order"], lines[..^2]);
    }

    [Theory]
    [InlineData("At", "yesterday")]
    [InlineData("ById", "somebody")]
    [InlineData("SubjectId", "nobody")]
    public async Task A_value_that_no_column_can_hold_ends_the_walk_with_its_place(string column, string value)
    {
        await using var copy = await Copy();
        var (code, lines) = await copy.After($"UPDATE Ledger SET {column} = '{value}' WHERE rowid = (SELECT min(rowid) FROM Ledger WHERE Number = 4)", () => Run(copy.Db));
        Assert.Equal(1, code);
        Assert.Matches("^subject [-0-9a-f]{36}: what stands behind entry [0-9]+ cannot be read$", Assert.Single(lines, line => line.EndsWith("cannot be read", StringComparison.Ordinal)));
        Assert.Matches("^The walk ended after [0-9]+ entries.$", lines[^2]);
    }

    [Fact]
    public async Task It_takes_no_options()
    {
        await using var copy = await Copy();
        using var error = new StringWriter { NewLine = "\n" };
        Assert.Equal((2, $"--fast is no option of verify.\n{Verify.Usage}\n"), (await Verify.Run(["--fast"], TextWriter.Null, error, copy.Db), error.ToString()));
    }

    private async Task<LedgerCopy> Copy()
    {
        var world = await site.NewWorld();
        await world.Read();
        await world.Returned();
        return await LedgerCopy.Of(site);
    }

    private static async Task<(int Code, string[] Lines)> Run(CredtrackDb db)
    {
        using var output = new StringWriter { NewLine = "\n" };
        return (await Verify.Run([], output, TextWriter.Null, db), output.ToString().TrimEnd('\n').Split('\n'));
    }
}
