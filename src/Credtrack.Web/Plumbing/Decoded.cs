using System.Formats.Asn1;
using System.Security.Cryptography;

namespace Credtrack.Web.Plumbing;

/// <summary>Signatures and certificates that strangers bring: that one cannot be read is an answer, not a fault of ours.</summary>
public static class Decoded
{
    public static T? OrNull<T>(Func<T?> read) where T : class
    {
        try
        {
            return read();
        }
        catch (Exception unreadable) when (unreadable is CryptographicException or AsnContentException)
        {
            return null;
        }
    }
}
