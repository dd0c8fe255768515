using System.Security.Cryptography;
using System.Text;

namespace Credtrack.Core.Tests;

public sealed class SealedTextTests
{
    [Fact]
    public void The_seal_is_that_of_salt_and_text_as_anybody_computes_it()
    {
        var text = SealedText.New("Left the hospital.");
        Assert.Matches("^[0-9a-f]{32}$", text.Salt);
        Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text.Salt + "\nLeft the hospital."))), text.Seal);
    }

    [Fact]
    public void The_same_words_twice_have_two_seals_so_that_nobody_finds_them_by_trying() =>
        Assert.Equal(100, Enumerable.Range(0, 100).Select(_ => SealedText.New("No.").Seal).Distinct().Count());

    [Theory]
    [InlineData("Left the hospital", "salt")]
    [InlineData("Left the hospital.", "other")]
    [InlineData("t\nLeft the hospital.", "sal")]
    public void Another_text_or_salt_has_another_seal(string text, string salt) => Assert.NotEqual(new SealedText("Left the hospital.", "salt").Seal, new SealedText(text, salt).Seal);
}
