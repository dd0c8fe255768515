using Credtrack.Core.Catalogue;

namespace Credtrack.Core.Tests.Catalogue;

public sealed class CodesTests
{
    [Theory]
    [InlineData("Anterior chest, left", "anterior-chest-left")]
    [InlineData("  Lung sliding seen on both sides? ", "lung-sliding-seen-on-both-sides")]
    [InlineData("Œdème: Côlon ≥ 3 cm", "deme-colon-3-cm")]
    [InlineData("Вид", "view")]
    [InlineData("???", "view")]
    [InlineData("\ud800 half", "half")]
    [InlineData("A view with a name that is longer than any code may be", "a-view-with-a-name-that-is-longer-th")]
    public void A_code_is_made_of_what_letters_there_are(string text, string code) => Assert.Equal(code, Codes.Of(text, "view", []));

    [Fact]
    public void A_code_that_is_taken_gets_a_number() => Assert.Equal("left-3", Codes.Of("Left", "view", ["left", "left-2", "right"]));

    [Fact]
    public void The_longest_code_with_a_number_is_still_a_code()
    {
        var taken = new List<string>();
        while (taken.Count < 100) taken.Add(Codes.Of(new string('a', 200), "view", taken));
        Assert.Equal(100, taken.Distinct().Count());
        Assert.All(taken, code => Assert.True(Codes.IsCode(code), code));
    }

    [Theory]
    [InlineData("arrest-echo", true)]
    [InlineData("4d", true)]
    [InlineData("", false)]
    [InlineData("Cardiac", false)]
    [InlineData("two--hyphens", false)]
    [InlineData("-front", false)]
    [InlineData("back-", false)]
    [InlineData("a line\n", false)]
    [InlineData("line\n", false)]
    [InlineData("herz-über", false)]
    [InlineData("a-code-of-forty-one-letters-is-too-long-x", false)]
    public void A_code_is_small_letters_digits_and_single_hyphens(string text, bool isCode) => Assert.Equal(isCode, Codes.IsCode(text));
}
