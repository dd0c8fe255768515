using Credtrack.Core.Grants;
using Credtrack.Web.Features.Documents.Seals;

namespace Credtrack.Web.Features.Documents.Checks;

public enum Standing { Stands, Ended, Unconfirmed }

/// <summary>The answer in one sentence, and what the paper says itself; nothing more.</summary>
public sealed record CheckAnswer(Standing Standing, string Sentence, string? Code, string? Holder, string? Privilege, DateTime? SealedAt, DateTime? EndedAt)
{
    public static CheckAnswer Unconfirmed(string sentence) => new(Standing.Unconfirmed, sentence, null, null, null, null, null);

    public static async Task<CheckAnswer> OfCode(CredtrackDb db, string code) =>
        await Find(db, d => d.Code == code) ?? Unconfirmed("No document with this number was issued here. Look at each letter again; if it stays so, do not rely on the paper.");

    /// <summary>The bytes must be those that were issued; a seal that verifies on other bytes is not enough where the stored digest is at hand.</summary>
    public static async Task<CheckAnswer> OfFile(CredtrackDb db, byte[] file, SealingCertificate certificate)
    {
        var sha256 = Digest(file);
        if (await Find(db, d => d.Sha256 == sha256) is { } ours) return ours;
        return Unconfirmed(SealCheck.Of(file, certificate.Root).Sentence);
    }

    public static string Digest(byte[] file) => Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(file));

    private static async Task<CheckAnswer?> Find(CredtrackDb db, System.Linq.Expressions.Expression<Func<Document, bool>> which)
    {
        var row = await db.Documents.Where(which).Join(db.Grants, d => d.GrantId, g => g.Id, (d, g) => new
        {
            d.Code,
            d.At,
            g.Privilege,
            Holder = g.Holder.Name,
            Ended = g.Ending == null ? (DateTime?)null : g.Ending.At,
        }).SingleOrDefaultAsync();
        if (row is null) return null;
        return row.Ended is null
            ? new(Standing.Stands, "Ours, unaltered, and it stands today", row.Code, row.Holder, row.Privilege, row.At, null)
            : new(Standing.Ended, "Ours and unaltered, but it no longer stands", row.Code, row.Holder, row.Privilege, row.At, row.Ended);
    }
}
