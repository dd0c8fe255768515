using System.Globalization;
using Credtrack.Web.Commands;
using Credtrack.Web.Tests.Data;
using Credtrack.Web.Tests.Features.Grants;

namespace Credtrack.Web.Tests.Commands;

/// <summary>The chains stay whole here: it is the rows beside them that somebody changes by raw SQL.</summary>
public sealed class VerifyRowsTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Signed = "subject {0}, entry 2: its row is not what this entry, GrantSigned, says", Issued = "subject {0}, entry 3: its row is not what this entry, DocumentIssued, says";
    private const string Ended = "subject {0}, entry 4: its row is not what this entry, GrantEnded, says", Declined = "subject {1}, entry 2: its row is not what this entry, GrantDeclined, says";

    [Theory] // {0} a grant that was signed over a gap and ended, {1} one that was declined, {2} one that stands, {3} a reader
    [InlineData("UPDATE Signatures SET GapReason = 'Nothing was missing.' WHERE GrantId = '{0}'", Signed)]
    [InlineData("UPDATE Signatures SET GapReason = NULL, GapSalt = NULL WHERE GrantId = '{0}'", Signed)]
    [InlineData("UPDATE Signatures SET Text = replace(Text, 'not met', 'met') WHERE GrantId = '{0}'", Signed)]
    [InlineData("UPDATE Signatures SET Digest = replace(Digest, substr(Digest, 1, 1), 'x') WHERE GrantId = '{0}'", Signed)]
    [InlineData("UPDATE Signatures SET SignerId = '{3}' WHERE GrantId = '{0}'", Signed)]
    [InlineData("UPDATE Signatures SET At = '2026-02-01 12:00:00' WHERE GrantId = '{0}'", Signed)]
    [InlineData("DELETE FROM Signatures WHERE GrantId = '{0}'", Signed)]
    [InlineData("UPDATE Documents SET Bytes = x'255044462D' WHERE GrantId = '{0}'", Issued)]
    [InlineData("UPDATE Endings SET Reason = 'By mistake.' WHERE GrantId = '{0}'", Ended)]
    [InlineData("UPDATE Endings SET ReasonSalt = upper(ReasonSalt) || 'A' WHERE GrantId = '{0}'", Ended)]
    [InlineData("DELETE FROM Endings WHERE GrantId = '{0}'", Ended)]
    [InlineData("UPDATE Declines SET Reason = Reason || ' ' WHERE GrantId = '{1}'", Declined)]
    [InlineData("INSERT INTO Endings (GrantId, ById, Reason, ReasonSalt, At) SELECT '{2}', ById, Reason, ReasonSalt, At FROM Endings WHERE GrantId = '{0}'", "subject {2}: a row of which no entry GrantEnded speaks")]
    [InlineData("UPDATE Endings SET At = 'yesterday' WHERE GrantId = '{0}'", "A grant, or what the ledger says of it, cannot be read.")]
    public async Task A_row_changed_past_the_program_is_named(string attack, string named)
    {
        var world = await site.NewWorld();
        var declined = await world.Declined();
        var (ended, _) = await world.Signed();
        await world.End(ended);
        var (stands, _) = await world.Signed();
        await using var copy = await LedgerCopy.Of(site);
        var (code, lines) = await copy.After(With($"{ended}".ToUpperInvariant(), $"{declined}".ToUpperInvariant(), $"{stands}".ToUpperInvariant(), $"{world.Reader.Id}".ToUpperInvariant(), attack), () => Run(copy.Db));
        Assert.Equal(1, code);
        Assert.Contains(With($"{ended}", $"{declined}", $"{stands}", "", named), lines);
        Assert.EndsWith(": whole.", lines[^2], StringComparison.Ordinal);
        Assert.Equal(3, lines.Length);
        Assert.Equal(0, (await Run(copy.Db)).Code);
    }

    [Fact]
    public async Task What_an_older_fact_did_not_hold_is_not_judged()
    {
        var (id, _) = await (await site.NewWorld()).Signed();
        await using var copy = await LedgerCopy.Of(site);
        var (_, lines) = await copy.After($"UPDATE Ledger SET Detail = json_remove(Detail, '$.GapSeal') WHERE Kind = 'GrantSigned'; UPDATE Signatures SET GapSalt = NULL WHERE GrantId = '{id.ToString().ToUpperInvariant()}'", () => Run(copy.Db));
        Assert.DoesNotContain(lines, l => l.Contains("its row", StringComparison.Ordinal));
    }

    [Fact]
    public async Task The_ledger_holds_the_salted_seal_of_a_reason_and_never_its_words()
    {
        var world = await site.NewWorld();
        var (id, _) = await world.Signed();
        await world.End(id);
        var grant = await site.Ask(db => db.Grants.AsNoTracking().SingleAsync(g => g.Id == id));
        var entries = await site.Ask(db => db.LedgerEntries.AsNoTracking().Where(e => e.SubjectId == id).OrderBy(e => e.Number).ToListAsync());
        Assert.Contains(grant.Signature!.Gap!.Seal, entries[1].Sentence, StringComparison.Ordinal);
        Assert.Contains(new Credtrack.Core.SealedText(grant.Ending!.Reason, grant.Ending.ReasonSalt).Seal, entries[3].Sentence, StringComparison.Ordinal);
        Assert.Equal((32, 32), (grant.Signature.GapSalt!.Length, grant.Ending.ReasonSalt.Length));
        Assert.All(entries, e => Assert.DoesNotContain("Left the hospital", e.Sentence + e.Detail, StringComparison.Ordinal));
        Assert.All(entries, e => Assert.DoesNotContain("Trained elsewhere", e.Sentence + e.Detail, StringComparison.Ordinal));
    }

    private static string With(string ended, string declined, string stands, string reader, string text) => string.Format(CultureInfo.InvariantCulture, text, ended, declined, stands, reader);

    private static async Task<(int Code, string[] Lines)> Run(CredtrackDb db)
    {
        using var output = new StringWriter { NewLine = "\n" };
        return (await Verify.Run([], output, TextWriter.Null, db), output.ToString().TrimEnd('\n').Split('\n'));
    }
}
