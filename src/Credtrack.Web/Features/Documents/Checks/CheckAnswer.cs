using Credtrack.Core.Grants;
using Credtrack.Web.Features.Documents.Seals;

namespace Credtrack.Web.Features.Documents.Checks;

public enum Holding { Stands, Ended, Unconfirmed }

/// <summary>The answer in one sentence, and what the paper says itself; nothing more.</summary>
public sealed record CheckAnswer(Holding Holding, string Sentence, string? Code, string? Holder, string? Privilege, DateTime? SealedAt, DateTime? EndedAt)
{
    public static CheckAnswer Unconfirmed(string sentence) => new(Holding.Unconfirmed, sentence, null, null, null, null, null);

    public static async Task<CheckAnswer> OfCode(CredtrackDb db, string code) =>
        await Find(db, d => d.Code == code) ?? Unconfirmed("No document with this number was issued here. Look at each letter again; if it stays so, do not rely on the paper.");

    /// <summary>The bytes must be those that were issued; a seal that verifies on other bytes is not enough where the stored digest is at hand.</summary>
    public static async Task<CheckAnswer> OfFile(CredtrackDb db, byte[] file, SealTrust trust)
    {
        if (await OfDigest(db, Digest(file)) is { } ours) return ours;
        var finding = SealCheck.Of(file, trust);
        return Unconfirmed(finding.IsGood ? "The seal is ours, but these are not the bytes that were issued." : finding.Sentence);
    }

    /// <summary>By the SHA-256 of the bytes; null if they were never issued here.</summary>
    public static Task<CheckAnswer?> OfDigest(CredtrackDb db, string sha256) => Find(db, d => d.Sha256 == sha256);

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
            ? new(Holding.Stands, "Ours, unaltered, and it stands today", row.Code, row.Holder, row.Privilege, row.At, null)
            : new(Holding.Ended, "Ours and unaltered, but it no longer stands", row.Code, row.Holder, row.Privilege, row.At, row.Ended);
    }
}
