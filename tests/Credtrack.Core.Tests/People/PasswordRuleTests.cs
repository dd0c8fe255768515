using Credtrack.Core.People;

namespace Credtrack.Core.Tests.People;

// NIST SP 800-63B-4, 3.1.1.2 (from memory): at least 15 characters where a password stands alone, at least 64 allowed, spaces and any character
// allowed, no rules of composition, and a list of common, expected or context-specific ones that are refused.
public sealed class PasswordRuleTests
{
    [Theory]
    [InlineData("three green herons wade")]
    [InlineData("correct horse battery staple")]
    [InlineData("ünïcödé and spaces ✓")]
    [InlineData("               x kettle y")]
    [InlineData("kettlekettlesteam")] // no rule of composition
    [InlineData("730295184662019")]
    [InlineData("ada lovelace rows upstream")] // a name with words of one's own
    public void Words_of_any_kind_will_do(string password) => Assert.Null(PasswordRule.WhyNot(password, "Ada Lovelace", "ada@example.org", "Harbour Hospital"));

    [Fact]
    public void A_long_one_is_accepted_up_to_two_hundred_characters()
    {
        var words = string.Concat(Enumerable.Range(0, 60).Select(n => $"{n * 7919 % 1000} w"));
        Assert.Null(PasswordRule.WhyNot(words[..64]));
        Assert.Null(PasswordRule.WhyNot(words[..200]));
        Assert.Equal("Use at most 200 characters.", PasswordRule.WhyNot(words[..201]));
    }

    [Theory]
    [InlineData("fourteen chars", "Use at least 15 characters; a few words with spaces between them are fine.")]
    [InlineData("", "Use at least 15 characters; a few words with spaces between them are fine.")]
    [InlineData("passwordpassword", "This password repeats itself. Choose one that does not.")]
    [InlineData("aaaaaaaaaaaaaaaa", "This password repeats itself. Choose one that does not.")]
    [InlineData("abcabcabcabcabcab", "This password repeats itself. Choose one that does not.")]
    [InlineData("123456789012345", "These are keys or figures in a row. Choose something less regular.")]
    [InlineData("abcdefghijklmnop", "These are keys or figures in a row. Choose something less regular.")]
    [InlineData("QWERTYUIOPasdfgh", "These are keys or figures in a row. Choose something less regular.")]
    [InlineData("Password12345678!", "This is one well-known word or name with figures around it. Add words of your own.")]
    [InlineData("2026!!!!!!Credtrack", "This is one well-known word or name with figures around it. Add words of your own.")]
    [InlineData("Lovelace2026202!7", "This is one well-known word or name with figures around it. Add words of your own.")]
    [InlineData("harbour-000000-1", "This is one well-known word or name with figures around it. Add words of your own.")]
    [InlineData("1qaz2WSX3edc4rfv", "This password is among those that are tried first. Choose another one.")]
    public void What_is_tried_first_is_refused(string password, string why) =>
        Assert.Equal(why, PasswordRule.WhyNot(password, "Ada Lovelace", "ada@example.org", "Harbour Hospital"));
}
