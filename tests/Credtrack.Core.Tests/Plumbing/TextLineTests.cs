using Credtrack.Core.Plumbing;

namespace Credtrack.Core.Tests.Plumbing;

public sealed class TextLineTests
{
    [Theory]
    [InlineData("", true)]
    [InlineData("Lung sliding seen on both sides?", true)]
    [InlineData("<b>&amp; “markup” \\ ' \"", true)]
    [InlineData("شريان ‍ 🫀", true)]
    [InlineData("two\nlines", false)]
    [InlineData("tab\there", false)]
    [InlineData("nul\0", false)]
    [InlineData("next\u0085line", false)]
    [InlineData("line\u2028separator", false)]
    [InlineData("turned \u202egnor saw", false)]
    [InlineData("isolate \u2067x", false)]
    [InlineData("half \ud83e of a pair", false)]
    public void A_text_of_one_line_breaks_nowhere(string text, bool fits) =>
        Assert.Equal(fits ? null : "Write it in one line, without control characters.", TextLine.WhyNot(text, 80));

    [Fact]
    public void A_text_that_is_too_long_is_told_the_limit()
    {
        Assert.Null(TextLine.WhyNot("12345", 5));
        Assert.Equal("Keep it within 5 characters.", TextLine.WhyNot("123456", 5));
        Assert.Null(TextLine.WhyNot("1🫀2", 14));
        Assert.Equal("Keep it within 13 characters; an emoji counts as 12.", TextLine.WhyNot("1🫀2", 13));
    }

    [Fact]
    public void What_makes_a_list_too_long_is_counted()
    {
        Assert.Equal("", TextLine.Listed([]));
        Assert.Equal("one; two", TextLine.Listed(["one", "two"]));
        var many = TextLine.Listed(Enumerable.Repeat(new string('x', 498), 10));
        Assert.EndsWith("x; and 3 more", many, StringComparison.Ordinal);
        Assert.True(many.Length < TextLine.LongestList + 20);
        Assert.Equal("2 in all", TextLine.Listed([new string('x', 4000), "y"]));
    }
}
