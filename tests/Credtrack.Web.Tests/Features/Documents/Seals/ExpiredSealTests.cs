using Credtrack.Core.Grants;
using Credtrack.Web.Features.Documents;
using Credtrack.Web.Features.Documents.Checks;
using Credtrack.Web.Features.Documents.Seals;
using Credtrack.Web.Plumbing;
using Credtrack.Web.Tests.Features.Grants;
using Microsoft.AspNetCore.Hosting;
using Microsoft.Extensions.DependencyInjection;

namespace Credtrack.Web.Tests.Features.Documents.Seals;

/// <summary>A site that is started after the certificate of its seal has ended.</summary>
public sealed class ExpiredSealSite : RunningSite
{
    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        base.ConfigureWebHost(builder);
        var path = SealPress.NewPath();
        SealPress.Open(path).Dispose();
        builder.UseSetting("Seal:Certificate", path);
        builder.UseSetting("Pictures:Folder", Path.Combine(BlankSite.Folder, $"pictures-{Guid.NewGuid():N}")); // six years on, those of the other sites would be erased as abandoned
        Clock.Now = Clock.Now.AddYears(6);
    }
}

public sealed class ExpiredSealTests(ExpiredSealSite site) : IClassFixture<ExpiredSealSite>
{
    private const string Reason = "No paper can be sealed: the certificate of the seal was good until 2031-02-28. Whoever runs this site has to bring a new one.";

    [Fact]
    public async Task Strangers_check_as_before_and_what_was_sealed_in_time_stands()
    {
        var (world, certificate) = (await site.NewWorld(), site.Services.GetRequiredService<SealingCertificate>());
        var (kept, unknown, code) = (SealPress.Press(certificate: certificate), SealPress.Press(PlainPdf.Make("/Lang(en)"), certificate), DocumentCode.New());
        var id = await world.Proposed();
        await site.Ask(async db =>
        {
            var grant = await db.Grants.SingleAsync(g => g.Id == id);
            var statement = new Statement("Site", "Holder", grant.HolderId, "Programme", "Privilege", "Application", new DateOnly(2026, 3, 1), 1, 1, 1, [], "Rules", 1, "trace");
            grant.Sign(world.Director, statement, Meaning.Granted, null, SealPress.Clock.UtcNow());
            grant.Issue(world.Director, code, kept, CheckAnswer.Digest(kept), SealPress.Clock.UtcNow());
            return await db.SaveChangesAsync();
        });
        using var stranger = site.Visitor();
        Assert.Contains("Ours, unaltered, and it stands today", (await stranger.Opens($"/documents/checks?code={code}")).Text, StringComparison.Ordinal);
        foreach (var (file, words) in new[] { (kept, "Ours, unaltered, and it stands today"), (unknown, "The seal is ours, but these are not the bytes that were issued."), (PlainPdf.Make(), "it carries no seal of ours") })
        {
            await stranger.Opens("/documents/checks");
            await stranger.Attaches("Choose the PDF, or drop it here", file).Presses("Check it");
            Assert.Contains(words, stranger.Text, StringComparison.Ordinal);
        }
        await stranger.Opens("/documents/certificates");
        Assert.True(SealCheck.Of(kept, SealTrust.Of(await stranger.Response.Content.ReadAsStringAsync())!).IsGood);
    }

    [Fact]
    public async Task Nothing_is_signed_and_the_page_says_why_instead_of_the_button()
    {
        var world = await site.NewWorld();
        using var director = await world.AtTheDesk(world.Director, await world.Proposed());
        Assert.Equal(Reason, director.Page.QuerySelector("form.sign .why-not")!.TextContent);
        Assert.Empty(director.Page.QuerySelectorAll("form.sign button"));
    }

    [Fact]
    public async Task If_it_ends_while_the_page_is_open_the_signature_is_refused_with_the_reason()
    {
        using var own = new ExpiredSealSite();
        own.Clock.Now = new DateTimeOffset(2031, 2, 28, 11, 50, 0, TimeSpan.Zero);
        var world = await own.NewWorld();
        var id = await world.Proposed();
        using var director = await world.AtTheDesk(world.Director, id);
        director.Means().Fills("Why you sign although not everything is met", "Trained elsewhere.").Fills("Your password, again", World.Password);
        own.Clock.Now = own.Clock.Now.AddMinutes(20);
        await director.Presses("Sign and seal");
        Assert.Equal(HttpStatusCode.Conflict, director.Status);
        Assert.Equal(Reason, director.Page.QuerySelector("form.sign .why-not")!.TextContent);
        Assert.Equal("Trained elsewhere.", director.Typed("Why you sign although not everything is met"));
        Assert.False(await own.Ask(db => db.Set<Signature>().AnyAsync(s => s.GrantId == id)));
    }
}
