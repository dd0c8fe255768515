using System.Buffers.Text;
using System.Security.Cryptography;
using System.Text;

namespace Credtrack.Web.Plumbing;

/// <summary>The secret in a link: 256 bits of chance. It is shown once; what is kept is its digest, from which nobody gets it back.</summary>
public sealed record SecretKey(string Text, string Digest)
{
    public static SecretKey New()
    {
        var text = Base64Url.EncodeToString(RandomNumberGenerator.GetBytes(32));
        return new(text, DigestOf(text));
    }

    public static string DigestOf(string text) => Convert.ToHexString(SHA256.HashData(Encoding.UTF8.GetBytes(text)));
}
