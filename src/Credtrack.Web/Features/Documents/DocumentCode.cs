using System.Security.Cryptography;

namespace Credtrack.Web.Features.Documents;

/// <summary>Five groups of four from an alphabet without look-alikes (no I, L, O, U): 100 random bits that nobody guesses.</summary>
public static class DocumentCode
{
    private const string Alphabet = "0123456789ABCDEFGHJKMNPQRSTVWXYZ";

    public static string New() => string.Join('-', Enumerable.Range(0, 5).Select(_ => RandomNumberGenerator.GetString(Alphabet, 4)));

    /// <summary>As people type it: any case, spaces or none, O for 0, I and L for 1. Null if it cannot be a code.</summary>
    public static string? Read(string? typed)
    {
        var letters = new string([.. (typed ?? "").ToUpperInvariant().Where(char.IsAsciiLetterOrDigit)]).Replace('O', '0').Replace('I', '1').Replace('L', '1');
        return letters.Length == 20 && letters.All(Alphabet.Contains) ? string.Join('-', letters.Chunk(4).Select(group => new string(group))) : null;
    }
}
