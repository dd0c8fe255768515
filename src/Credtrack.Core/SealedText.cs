using System.Security.Cryptography;
using System.Text;

namespace Credtrack.Core;

/// <summary>
/// A free text with the salt that lies beside it in its row. A fact holds the seal alone: by it the text is shown to be the one that was written,
/// and once text and salt are erased, nothing can be guessed from it.
/// </summary>
public sealed record SealedText(string Text, string Salt)
{
    public const int SaltLength = 32;

    public static SealedText New(string text) => new(text, RandomNumberGenerator.GetHexString(SaltLength, lowercase: true));

    /// <summary>SHA-256 of the salt, a line break and the text in UTF-8, in lower-case hexadecimal digits.</summary>
    public string Seal => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes($"{Salt}\n{Text}")));
}
