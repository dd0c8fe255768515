using Credtrack.Web.Features.Documents.Checks;
using Credtrack.Web.Features.Documents.Seals;

namespace Credtrack.Web.Commands;

/// <summary>The commands that use the site's own database and serve nothing. Check and verify change nothing.</summary>
public static class SiteCommands
{
    public static bool Are(string[] args) => args is ["check" or "verify" or "invite" or "migrate" or "demo" or "import", ..];

    /// <summary>The exit status of the command, or null if the arguments are none.</summary>
    public static async Task<int?> Run(string[] args, IServiceProvider services)
    {
        if (!Are(args) || args is not [var command, .. var rest]) return null;
        if (command == "invite") return await Invite.Run(rest, Console.Out, Console.Error, services);
        if (command == "migrate") return await Fill.Migrate(rest, services);
        if (command == "demo") return await Fill.Demonstrate(rest, services);
        if (command == "check" && rest.Length == 0) return await Check.Run(rest, Console.Out, Console.Error);
        await using var scope = services.CreateAsyncScope();
        var (db, settings) = (scope.ServiceProvider.GetRequiredService<CredtrackDb>(), services.GetRequiredService<Settings>());
        if (await WhyNotAsk(db) is { } why) return await Refused(why);
        if (command == "import") return await ImportFile.Run(rest, Console.Out, Console.Error, scope.ServiceProvider);
        if (command == "verify") return await Verify.Run(rest, Console.Out, Console.Error, db);
        if (!File.Exists(settings.Seal.Certificate)) return await Refused($"There is no certificate of the seal, {settings.Seal.Certificate}: this site has sealed nothing yet.");
        return await Check.Run(rest, Console.Out, Console.Error, services.GetRequiredService<SealTrust>(), sha256 => Find(db, sha256));
    }

    // Asked before anything else, because looking for a table, or for the key of the seal, would make what is not there.
    private static async Task<string?> WhyNotAsk(CredtrackDb db) =>
          !await db.Database.CanConnectAsync()                   ? "There is no database here: see ConnectionStrings:Credtrack, or start the program once, which makes it."
        : (await db.Database.GetPendingMigrationsAsync()).Any()  ? "The database is not that of this version: start the program once, which brings it up to date."
        : null;

    private static async Task<int> Refused(string why)
    {
        await Console.Error.WriteLineAsync(why);
        return 2;
    }

    private static async Task<StoredDocument?> Find(CredtrackDb db, string sha256) => await CheckAnswer.OfDigest(db, sha256) is { } answer
        ? new(answer.Holding == Holding.Stands, answer.Holding == Holding.Stands ? "It stands today." : $"It no longer stands: the grant ended on {answer.EndedAt:yyyy-MM-dd}.")
        : null;
}
