using Credtrack.Web.Commands;
using Credtrack.Web.Features.Documents;
using Credtrack.Web.Plumbing;
using Credtrack.Web.Tests.Features.Grants;

namespace Credtrack.Web.Tests.Features.Documents.Checks;

public sealed class ChecksTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Stands = "Ours, unaltered, and it stands today", Ended = "Ours and unaltered, but it no longer stands", No = "We cannot confirm this document";

    [Fact]
    public async Task A_stranger_checks_the_file_and_the_number_and_learns_only_what_is_on_the_paper()
    {
        var world = await site.NewWorld();
        var (id, document) = await world.Signed();
        using var stranger = site.Visitor();
        await stranger.Opens("/documents/checks");
        await stranger.Attaches("Choose the PDF, or drop it here", document.Bytes).Presses("Check it");
        Assert.Contains(Stands, stranger.Text, StringComparison.Ordinal);
        Assert.Equal(["Person", "Privilege", "Checked"], stranger.Page.QuerySelectorAll(".facts dt").Select(d => d.TextContent));
        Assert.DoesNotContain("Trained elsewhere", stranger.Text, StringComparison.Ordinal);
        await stranger.Opens($"/documents/checks?code={document.Code.ToLowerInvariant().Replace("-", " ", StringComparison.Ordinal)}");
        Assert.Contains(Stands, stranger.Text, StringComparison.Ordinal);
        await world.End(id);
        Assert.Contains(Ended, (await stranger.Opens($"/documents/checks?code={document.Code}")).Text, StringComparison.Ordinal);
        Assert.DoesNotContain("Left the hospital", stranger.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Whatever_is_changed_or_appended_is_not_confirmed()
    {
        var (_, document) = await (await site.NewWorld()).Signed();
        var chance = new Random(20261201);
        byte[][] forged = [[.. document.Bytes, (byte)'\n'], Changed(document.Bytes, chance), Changed(document.Bytes, chance), "no PDF"u8.ToArray()];
        foreach (var file in forged)
        {
            using var stranger = site.Visitor();
            await stranger.Opens("/documents/checks");
            await stranger.Attaches("Choose the PDF, or drop it here", file).Presses("Check it");
            Assert.Contains(No, stranger.Text, StringComparison.Ordinal);
            Assert.DoesNotContain(Stands, stranger.Text, StringComparison.Ordinal);
        }
    }

    [Theory]
    [InlineData("", "Choose the PDF, or enter the number")]
    [InlineData("12", "The number has five groups of four letters and digits, as printed.")]
    [InlineData("0000-0000-0000-0000-0000", No)]
    public async Task What_was_typed_wrong_or_never_issued_is_told_in_words(string code, string words)
    {
        using var stranger = site.Visitor();
        await stranger.Opens("/documents/checks");
        await stranger.Fills("Number under the square code", code).Presses("Check it");
        Assert.Contains(words, stranger.Text, StringComparison.Ordinal);
        Assert.Equal(code, stranger.Typed("Number under the square code"));
    }

    [Fact]
    public async Task Who_guesses_numbers_is_slowed_down()
    {
        using var own = new RunningSite();
        using var stranger = own.Visitor();
        for (var n = 0; n < RateLimits.ChecksAMinute; n++) await stranger.Opens($"/documents/checks?code={DocumentCode.New()}");
        Assert.Equal(HttpStatusCode.OK, stranger.Status);
        Assert.Equal(HttpStatusCode.TooManyRequests, (await stranger.Opens($"/documents/checks?code={DocumentCode.New()}")).Status);
        Assert.Equal(HttpStatusCode.OK, (await stranger.Opens("/documents/checks?code=")).Status);
        Assert.Equal(HttpStatusCode.TooManyRequests, (await stranger.Fills("Number under the square code", DocumentCode.New()).Presses("Check it")).Status);
    }

    [Fact]
    public async Task The_command_says_with_the_database_whether_it_still_stands()
    {
        var world = await site.NewWorld();
        var (id, document) = await world.Signed();
        var file = Path.Combine(BlankSite.Folder, $"{document.Code}.pdf");
        await File.WriteAllBytesAsync(file, document.Bytes);
        Assert.Equal(0, await SiteCommands.Run(["check", file], site.Services));
        await world.End(id);
        Assert.Equal(3, await SiteCommands.Run(["check", file], site.Services));
        await File.WriteAllBytesAsync(file, [.. document.Bytes, 0]);
        Assert.Equal(1, await SiteCommands.Run(["check", file], site.Services));
        Assert.Equal(2, await SiteCommands.Run(["check"], site.Services));
        Assert.Null(await SiteCommands.Run(["serve"], site.Services));
    }

    [Fact]
    public void A_number_is_random_and_read_as_people_type_it()
    {
        var codes = Enumerable.Range(0, 1000).Select(_ => DocumentCode.New()).ToHashSet();
        Assert.Equal(1000, codes.Count);
        Assert.All(codes, c => Assert.Equal(c, DocumentCode.Read(c)));
        Assert.Equal("0011-ABCD-EFGH-JKMN-PQRS", DocumentCode.Read("oOiL abcd-efgh jkmn pqrs"));
        Assert.Null(DocumentCode.Read("0011-ABCD-EFGH-JKMN-PQR"));
        Assert.Null(DocumentCode.Read("UUUU-ABCD-EFGH-JKMN-PQRS"));
    }

    private static byte[] Changed(byte[] bytes, Random chance)
    {
        var copy = (byte[])bytes.Clone();
        copy[chance.Next(copy.Length)] ^= (byte)chance.Next(1, 256);
        return copy;
    }
}
