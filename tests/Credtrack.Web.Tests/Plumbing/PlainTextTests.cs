using Credtrack.Web.Plumbing;

namespace Credtrack.Web.Tests.Plumbing;

public sealed class PlainTextTests(RunningSite site) : IClassFixture<RunningSite>
{
    // Unicode 16.0, chapter 23.1 (control codes) and UAX #9 table 1 (explicit directional characters), from memory.
    [Theory]
    [InlineData("a\0b", 0x00)]
    [InlineData("a\u001Bb", 0x1B)]
    [InlineData("a\u0085b", 0x85)]
    [InlineData("abc\u202Etxt.exe", 0x202E)]
    [InlineData("\u2066a", 0x2066)]
    [InlineData("a\u200Fb", 0x200F)]
    [InlineData("\u061Ca", 0x61C)]
    [InlineData("a\u2028b", 0x2028)]
    [InlineData("\uFEFFa", 0xFEFF)]
    [InlineData("two\r\nlines\tand a tab", null)]
    [InlineData("Ó Dálaigh, 王小明, فاطمة, ✓ and a woman 👩‍⚕️", null)]
    public void What_cannot_be_seen_is_found(string text, int? hidden) => Assert.Equal((char?)hidden, PlainText.Hidden(text));

    [Fact]
    public async Task A_form_says_which_character_it_is_and_saves_nothing()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Opens($"{await world.MembershipOf(world.Trainee)}/edit");
        await cora.Fills("Name", "Tar\u202Eqi").Presses("Save");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, cora.Status);
        Assert.Equal(["This text holds a character that cannot be seen (U+202E). Type it anew here instead of pasting it."], cora.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));
    }
}
