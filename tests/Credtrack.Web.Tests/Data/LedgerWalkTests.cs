using Credtrack.Core.Scans;
using Microsoft.Data.Sqlite;

namespace Credtrack.Web.Tests.Data;

public sealed class LedgerWalkTests
{
    private const int Subjects = 1000;
    private const int Each = 100;

    [Fact]
    public async Task A_hundred_thousand_entries_are_walked_and_none_is_kept()
    {
        var file = BlankSite.NewCopy();
        await Fill(file);
        await using var copy = LedgerCopy.Open(file);
        var walk = new LedgerWalk(copy.Db);
        await walk.Run();
        Assert.Empty(walk.Broken);
        Assert.InRange(walk.Entries, Subjects * Each, Subjects * Each + 100);
        Assert.Empty(copy.Db.ChangeTracker.Entries());
    }

    // Past the program, row by row: saving so many with their nouns would take minutes.
    private static async Task Fill(string file)
    {
        await using var connection = new SqliteConnection($"Data Source={file};Pooling=False");
        await connection.OpenAsync();
        await using var transaction = (SqliteTransaction)await connection.BeginTransactionAsync();
        await using var command = new SqliteCommand("", connection, transaction);
        command.CommandText = "INSERT INTO Ledger (SubjectId, Number, Kind, Sentence, Detail, ById, At, Seal) VALUES ($1, $2, $3, $4, $5, $6, $7, $8)";
        for (var place = 1; place <= 8; place++) command.Parameters.Add(new SqliteParameter($"${place}", null));
        var at = new DateTime(2026, 3, 1, 12, 0, 0, DateTimeKind.Utc);
        var fact = new ScanSubmitted(Person.Enrol("Somebody", null, at), at);
        foreach (var subject in Enumerable.Range(0, Subjects).Select(_ => Guid.CreateVersion7(at)))
        {
            LedgerEntry? last = null;
            for (var number = 1; number <= Each; number++)
            {
                var entry = last = LedgerEntry.After(last, subject, fact);
                object[] values = [entry.SubjectId, entry.Number, entry.Kind, entry.Sentence, entry.Detail, entry.ById, entry.At, entry.Seal];
                foreach (var (place, value) in values.Index()) command.Parameters[place].Value = value;
                await command.ExecuteNonQueryAsync();
            }
        }
        await transaction.CommitAsync();
    }
}
