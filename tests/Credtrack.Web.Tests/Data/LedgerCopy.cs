using Credtrack.Migrations.Sqlite;

namespace Credtrack.Web.Tests.Data;

/// <summary>A copy of a site's database in which history can be rewritten: each attack happens with the triggers gone and is taken back.</summary>
internal sealed class LedgerCopy : IAsyncDisposable
{
    private const string WithoutTriggers = "DROP TRIGGER Ledger_no_update; DROP TRIGGER Ledger_no_delete; DROP TRIGGER Ledger_no_replace;";

    private LedgerCopy(CredtrackDb db) => Db = db;

    public CredtrackDb Db { get; }

    public static async Task<LedgerCopy> Of(RunningSite site)
    {
        var file = BlankSite.NewFile();
        await site.Ask(db => db.Database.ExecuteSqlAsync($"VACUUM INTO {file}"));
        return Open(file);
    }

    public static LedgerCopy Open(string file)
    {
        var options = new DbContextOptionsBuilder<CredtrackDb>();
        SqliteStore.Use(options, $"Data Source={file};Pooling=False");
        return new LedgerCopy(new CredtrackDb(options.Options));
    }

    public async Task<T> After<T>(string attack, Func<Task<T>> look)
    {
        await using var transaction = await Db.Database.BeginTransactionAsync();
        await Db.Database.ExecuteSqlRawAsync(WithoutTriggers);
        await Db.Database.ExecuteSqlRawAsync(attack);
        var seen = await look();
        await transaction.RollbackAsync();
        return seen;
    }

    public ValueTask DisposeAsync() => Db.DisposeAsync();
}
