using Credtrack.Core.Catalogue;
using Credtrack.Core.Grants;
using Credtrack.Web.Features.Documents.Seals;
using Microsoft.Extensions.DependencyInjection;

namespace Credtrack.Web.Tests.Features.Grants.Signatures;

public sealed class SignaturesTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task What_is_met_is_signed_and_a_sealed_paper_comes_out()
    {
        var world = await site.NewWorld();
        for (var n = 0; n < 3; n++) await world.Read();
        var id = await world.Proposed();
        using var director = await world.AtTheDesk(world.Director, id);
        Assert.Empty(director.Page.QuerySelectorAll("[name='Form.GapReason']"));
        var digest = director.Page.QuerySelector("[name='Form.Digest']")!.GetAttribute("value");
        await director.Means().Fills("Your password, again", World.Password).Presses("Sign and seal");
        Assert.Contains("Signed and sealed", director.Text, StringComparison.Ordinal);

        var grant = await site.Ask(db => db.Grants.AsNoTracking().Include(g => g.Documents).SingleAsync(g => g.Id == id));
        Assert.Equal((GrantState.Active, digest), (grant.State, grant.Signature!.Digest));
        var document = Assert.Single(grant.Documents);
        Assert.True(SealCheck.Of(document.Bytes, site.Services.GetRequiredService<SealingCertificate>().Trust).IsGood);
        await director.Opens($"/documents/{document.Id}");
        Assert.Equal(document.Bytes, await director.Response.Content.ReadAsByteArrayAsync());
    }

    [Fact]
    public async Task Every_value_opens_into_as_many_scans()
    {
        var world = await World.Build(site, Conditions);
        foreach (var answer in new[] { Answer.Yes, Answer.No, Answer.No }) await world.Read(4, answer);
        await world.Read(2);
        await world.Waiting();
        await world.Read(4, Answer.Yes, "lung");
        using var director = await world.AtTheDesk(world.Director, await world.Proposed());
        var links = director.Page.QuerySelectorAll("tbody td a").Select(a => (Value: a.TextContent, Url: a.GetAttribute("href")!)).ToList();
        // Of the application 3 scans, 1 of them positive, which is 33 % of 3; of the group 4; all together 2 positive ones; then performed, read, that count.
        (string Value, int Scans)[] expected = [("3", 3), ("1", 1), ("33.33 %", 1), ("3", 3), ("4", 4), ("2", 2), ("5", 5), ("4", 4), ("3", 3)];
        Assert.Equal(expected.Select(e => e.Value), links.Select(l => l.Value));
        foreach (var ((_, scans), (_, url)) in expected.Zip(links))
        {
            await director.Opens(url);
            Assert.Equal(scans, director.Page.QuerySelectorAll(".scans li").Length);
            Assert.Contains($"Every number above opens into these. {scans} scan", director.Text, StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task Behind_a_value_above_fifty_all_scans_are_found_page_by_page_and_no_other()
    {
        var world = await World.Build(site, Conditions);
        for (var n = 0; n < 53; n++) await world.Read(4, Answer.Yes);
        await world.Read(4, Answer.No);
        using var director = await world.AtTheDesk(world.Director, await world.Proposed());
        await director.Opens(director.Page.QuerySelectorAll("tbody td a").First(a => a.TextContent == "53").GetAttribute("href")!);
        Assert.Contains("53 scans, 50 a page.", director.Text, StringComparison.Ordinal);
        var found = director.Page.QuerySelectorAll(".scans a").Select(a => a.GetAttribute("href")).ToList();
        await director.Opens(director.Page.QuerySelectorAll("a").Single(a => a.TextContent == "Older ones").GetAttribute("href")!);
        found.AddRange(director.Page.QuerySelectorAll(".scans a").Select(a => a.GetAttribute("href")));
        Assert.Equal((53, 53), (found.Count, found.Distinct().Count()));
        Assert.Contains("Newer ones", director.Text, StringComparison.Ordinal);
        Assert.DoesNotContain("Older ones", director.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_gap_a_wrong_password_and_a_missing_meaning_are_each_told_and_nothing_is_signed()
    {
        var world = await site.NewWorld();
        var id = await world.Proposed();
        using var director = await world.AtTheDesk(world.Director, id);
        await director.Presses("Sign and seal");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, director.Status);
        Assert.Equal(["#form_meaning", "#form_gapreason", "#form_password"], director.Page.QuerySelectorAll(".notice.bad a").Select(a => a.GetAttribute("href")));
        await director.Means().Fills("Why you sign although not everything is met", "Trained elsewhere.").Fills("Your password, again", "wrong").Presses("Sign and seal");
        Assert.Contains("This is not your password. Nothing was signed.", director.Text, StringComparison.Ordinal);
        Assert.Equal("Trained elsewhere.", director.Typed("Why you sign although not everything is met"));
        Assert.Empty(director.Typed("Your password, again"));
        Assert.False(await site.Ask(db => db.Documents.AnyAsync(d => d.GrantId == id)));
        await director.Fills("Your password, again", World.Password).Presses("Sign and seal");
        Assert.Contains("Signed over a gap", director.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_letter_that_the_paper_cannot_print_is_named_before_anything_is_signed()
    {
        var world = await site.NewWorld();
        var id = await world.Proposed();
        using var director = await world.AtTheDesk(world.Director, id);
        await director.Means().Fills("Why you sign although not everything is met", "訓練").Fills("Your password, again", World.Password).Presses("Sign and seal");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, director.Status);
        Assert.Contains("訓", director.Page.QuerySelector(".notice.bad")!.TextContent, StringComparison.Ordinal);
        Assert.False(await site.Ask(db => db.Documents.AnyAsync(d => d.GrantId == id)));
    }

    [Fact]
    public async Task If_anything_moved_meanwhile_nothing_is_signed_and_the_difference_is_shown()
    {
        var world = await site.NewWorld();
        var id = await world.Proposed();
        using var director = await world.AtTheDesk(world.Director, id);
        await world.Read();
        await director.Means().Fills("Why you sign although not everything is met", "Trained elsewhere.").Fills("Your password, again", World.Password).Presses("Sign and seal");
        Assert.Equal(HttpStatusCode.Conflict, director.Status);
        Assert.Contains("scans that count: 0 is now scans that count: 1", director.Text, StringComparison.Ordinal);
        Assert.Equal("Trained elsewhere.", director.Typed("Why you sign although not everything is met"));
        await director.Fills("Your password, again", World.Password).Presses("Sign and seal");
        Assert.Contains("Signed and sealed", director.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Who_guesses_the_password_at_an_open_screen_soon_has_to_wait()
    {
        var world = await site.NewWorld();
        var id = await world.Proposed();
        for (var wrong = 0; wrong < 10; wrong++) Assert.Contains("This is not your password. Nothing was signed.", await Guess($"wrong {wrong}"), StringComparison.Ordinal);
        Assert.Contains("Too many wrong passwords were tried. Wait 2 seconds, then try again. Nothing was signed.", await Guess(World.Password), StringComparison.Ordinal);
        Assert.False(await site.Ask(db => db.Set<Signature>().AnyAsync(s => s.GrantId == id)));

        async Task<string> Guess(string password)
        {
            using var director = await world.AtTheDesk(world.Director, id);
            return (await director.Means().Fills("Why you sign although not everything is met", "Trained elsewhere.").Fills("Your password, again", password).Presses("Sign and seal")).Text;
        }
    }

    [Fact]
    public async Task A_forged_digest_signs_nothing()
    {
        var world = await site.NewWorld();
        using var director = await world.AtTheDesk(world.Director, await world.Proposed());
        director.Page.QuerySelector("[name='Form.Digest']")!.SetAttribute("value", new string('0', 64));
        await director.Means().Fills("Why you sign although not everything is met", "x").Fills("Your password, again", World.Password).Presses("Sign and seal");
        Assert.Equal(HttpStatusCode.Conflict, director.Status);
        Assert.False(await site.Ask(db => db.Set<Signature>().AnyAsync(s => s.SignerId == world.Director.Id)));
    }

    [Theory]
    [InlineData("INSERT INTO Signatures (GrantId, Place, HolderId, SignerId, At, Meaning, Text, Digest) SELECT GrantId, Place, HolderId, SignerId, At, Meaning, Text, Digest FROM Signatures WHERE GrantId = {0}", "UNIQUE")]
    [InlineData("INSERT INTO Signatures (GrantId, Place, HolderId, SignerId, At, Meaning, Text, Digest) SELECT GrantId, 2, HolderId, HolderId, At, Meaning, Text, Digest FROM Signatures WHERE GrantId = {0}", "CK_Signatures_not_ones_own")]
    public async Task The_database_itself_refuses_a_second_signature_at_a_place_and_ones_own(string sql, string why)
    {
        var (id, _) = await (await site.NewWorld()).Signed();
        var refused = await Assert.ThrowsAnyAsync<Exception>(() => site.Ask(db => db.Database.ExecuteSqlRawAsync(sql, id)));
        Assert.Contains(why, refused.Message, StringComparison.Ordinal);
    }

    private const string Conditions = """
        {
          "format": "credtrack-rulebook/1", "name": "Conditions", "version": 1, "effective": "2026-01-01", "timeZone": "Europe/Dublin", "counting": { "quality": { "min": 3 } },
          "applications": [
            { "code": "cardiac", "require": [{ "kind": "count", "min": 1 }, { "kind": "count", "min": 1, "where": { "positive": true } }, { "kind": "share", "where": { "positive": true }, "min": 0.5 }] },
            { "code": "lung", "require": [] }
          ],
          "groups": [{ "name": "chest", "applications": ["cardiac", "lung"], "require": [{ "kind": "count", "min": 9 }] }],
          "overall": [{ "kind": "count", "min": 1, "where": { "positive": true } }]
        }
        """;
}
