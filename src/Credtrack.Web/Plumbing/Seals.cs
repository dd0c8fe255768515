using System.Security.Cryptography;
using Microsoft.AspNetCore.DataProtection;

namespace Credtrack.Web.Plumbing;

public static class Seals
{
    /// <summary>What was sealed, or null: forged, sealed for somebody else, or with a key that is gone.</summary>
    public static string? Opened(this IDataProtector seal, string? note)
    {
        if (string.IsNullOrEmpty(note)) return null;
        try
        {
            return seal.Unprotect(note);
        }
        catch (CryptographicException)
        {
            return null;
        }
    }
}
