using Credtrack.Web.Features.Documents.Checks;
using Credtrack.Web.Features.Documents.Seals;

namespace Credtrack.Web.Commands;

/// <summary>The commands that ask the site's own database. They change nothing and serve nothing.</summary>
public static class SiteCommands
{
    /// <summary>The exit status of the command, or null if the arguments are none.</summary>
    public static async Task<int?> Run(string[] args, IServiceProvider services)
    {
        if (args is not [("check" or "verify" or "invite") and var command, .. var rest]) return null;
        if (command == "invite") return await Invite.Run(rest, Console.Out, Console.Error, services);
        if (command == "check" && rest.Length == 0) return await Check.Run(rest, Console.Out, Console.Error);
        await using var scope = services.CreateAsyncScope();
        var db = scope.ServiceProvider.GetRequiredService<CredtrackDb>();
        if (command == "verify") return await Verify.Run(rest, Console.Out, Console.Error, db);
        return await Check.Run(rest, Console.Out, Console.Error, services.GetRequiredService<SealingCertificate>().Trust, sha256 => Find(db, sha256));
    }

    private static async Task<StoredDocument?> Find(CredtrackDb db, string sha256) => await CheckAnswer.OfDigest(db, sha256) is { } answer
        ? new(answer.Holding == Holding.Stands, answer.Holding == Holding.Stands ? "It stands today." : $"It no longer stands: the grant ended on {answer.EndedAt:yyyy-MM-dd}.")
        : null;
}
