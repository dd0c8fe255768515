using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;

namespace Credtrack.Web.Tests.Features.Documents.Seals;

/// <summary>A sealed file cut into what the seal covers and its signature, by the numbers in the file alone and by none of our code.</summary>
internal sealed partial record SealParts(byte[] Covered, byte[] Signature, int Open, int Close)
{
    public static SealParts Of(byte[] file)
    {
        var range = Assert.Single(Range().Matches(Encoding.Latin1.GetString(file)));
        var (at, length, from, rest) = (Value(1), Value(2), Value(3), Value(4));
        Assert.Equal((0, file.Length), (at, from + rest));
        var bytes = Convert.FromHexString(Encoding.ASCII.GetString(file, length + 1, from - length - 2));
        Assert.Equal((0x30, 0x82), (bytes[0], bytes[1])); // a DER sequence whose length takes two bytes
        return new([.. file[..length], .. file[from..]], bytes[..(4 + bytes[2] * 256 + bytes[3])], length, from - 1);

        int Value(int group) => int.Parse(range.Groups[group].ValueSpan, CultureInfo.InvariantCulture);
    }

    /// <summary>The file with another signature in the place of its own.</summary>
    public static byte[] Exchange(byte[] file, Func<byte[], byte[]> sign)
    {
        var parts = Of(file);
        var digits = Convert.ToHexString(sign(parts.Covered)).PadRight(parts.Close - parts.Open - 1, '0');
        return [.. file[..(parts.Open + 1)], .. Encoding.ASCII.GetBytes(digits), .. file[parts.Close..]];
    }

    [GeneratedRegex(@"/ByteRange\s*\[\s*(\d+) (\d+) (\d+) (\d+)\s*\]")]
    private static partial Regex Range();
}
