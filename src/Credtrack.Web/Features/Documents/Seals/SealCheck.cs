using System.Globalization;
using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;

namespace Credtrack.Web.Features.Documents.Seals;

/// <summary>
/// Judges a file by the certificates alone, without a database: sealed by this site and unaltered, altered, not ours, or no PDF.
/// Stricter than readers of PDF: one seal, over the whole file, with nothing behind it, and the signature byte for byte as we write it.
/// </summary>
public static class SealCheck
{
    /// <param name="trust">The certificates that seal or sealed for this site, with all above them.</param>
    public static SealFinding Of(byte[] file, SealTrust trust)
    {
        var (opened, wrong) = SealedFile.Open(file);
        return opened is null ? wrong! : Judged(opened, trust);
    }

    private static SealFinding Judged(SealedFile file, SealTrust trust)
    {
        if (trust.Signers.FirstOrDefault(s => file.Signature.AsSpan().IndexOf(s.RawDataMemory.Span) >= 0) is not { } signer)
            return SealFinding.NotOurs("the certificate in the seal is not one of this site", file.Place);

        using var key = signer.GetRSAPublicKey();
        if (key is null || Claimed(file, signer, trust, key.KeySize / 8) is not var (digest, signature)) return SealFinding.Altered("the signature is not made as we make it", file.Place);
        if (!key.VerifyData(SealCms.Attributes(digest, signer), signature, HashAlgorithmName.SHA256, RSASignaturePadding.Pkcs1)) return SealFinding.Altered("the signature does not hold", file.Place);
        if (!digest.AsSpan().SequenceEqual(SHA256.HashData(file.Covered))) return SealFinding.Altered("its bytes are not those that were sealed", "outside the seal, in any of its bytes");
        if (trust.WhyNot(signer, file.SealedAt) is { } whyNot) return SealFinding.NotOurs($"the certificate in the seal was not good at the time of sealing ({whyNot})", file.Place);
        return new(SealVerdict.OursAndUnaltered, string.Create(CultureInfo.InvariantCulture, $"Sealed by {signer.GetNameInfo(X509NameType.SimpleName, false)} of this site at {file.SealedAt:yyyy-MM-dd HH:mm:ss} UTC, and not altered since."), file.Place, file.SealedAt);
    }

    // The two parts that differ from seal to seal; null if anything around them is not as we write it. The signature's bytes come last.
    private static (byte[] Digest, byte[] Signature)? Claimed(SealedFile file, X509Certificate2 signer, SealTrust trust, int length)
    {
        var (chain, mark) = (trust.ChainOf(signer), SHA256.HashData(signer.RawDataMemory.Span[1..]));
        var pattern = SealCms.Written(mark, signer, chain, new byte[length]);
        if (pattern.Length != file.Signature.Length) return null;
        var (digest, signature) = (file.Signature.AsSpan(pattern.AsSpan().IndexOf(mark), mark.Length).ToArray(), file.Signature[^length..]);
        return SealCms.Written(digest, signer, chain, signature).AsSpan().SequenceEqual(file.Signature) ? (digest, signature) : null;
    }
}
