using System.Diagnostics;
using Credtrack.Web.Commands;
using Credtrack.Web.Tests.Laws;
using Microsoft.AspNetCore.Hosting;

namespace Credtrack.Web.Tests.Commands;

public sealed class InviteTests
{
    [Fact]
    public async Task A_first_start_in_production_prints_one_link_with_which_the_site_is_set_up()
    {
        using var empty = new Empty();
        var (links, again) = (new StringWriter(), new StringWriter());
        await Invite.OfferFirstLink(empty.Services, links);
        using var ada = empty.Visitor();
        await ada.Opens(LinkIn(links));
        Assert.Equal("Set up Credtrack", ada.Page.QuerySelector("h1")!.TextContent);
        await ada.Presses("Set up");
        Assert.Equal(
        [
            "Choose a password.", "Give the name of the institution; it stands on every paper.", "Give your e-mail address; you sign in with it.", "Give your name, as it is to stand on pages and papers.",
            "There is no time zone ; take an IANA name such as Europe/Dublin.",
        ], ada.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent).Order());
        await SetsUp(ada);
        Assert.Equal("/sign-in", ada.Url);
        await ada.SignsInWith("ada@tests.example", Staffing.NewPassword);
        Assert.Contains("You look after this site", ada.Text, StringComparison.Ordinal);
        Assert.Equal(Credtrack.Core.Catalogue.CatalogueEntry.Shipped.Count, await empty.Ask(db => db.Applications.CountAsync()));
        Assert.Equal(HttpStatusCode.Gone, (await ada.Opens(LinkIn(links))).Status);
        await Invite.OfferFirstLink(empty.Services, again);
        Assert.Empty(again.ToString()); // somebody can sign in now
    }

    [Fact]
    public async Task A_link_is_good_for_a_day_and_a_newer_one_ends_it()
    {
        using var empty = new Empty();
        var (first, second) = (new StringWriter(), new StringWriter());
        Assert.Equal(0, await Invite.Run(["--administrator"], first, TextWriter.Null, empty.Services));
        Assert.Equal(0, await Invite.Run(["--administrator"], second, TextWriter.Null, empty.Services));
        using var ada = empty.Visitor();
        Assert.Equal(HttpStatusCode.Gone, (await ada.Opens(LinkIn(first))).Status);
        Assert.Contains("Ask whoever runs the server for a new one.", ada.Text, StringComparison.Ordinal);
        await ada.Opens(LinkIn(second));
        empty.Clock.Now += TimeSpan.FromDays(1);
        await SetsUp(ada);
        Assert.Equal(HttpStatusCode.Gone, ada.Status);
        Assert.False(await empty.Ask(db => db.Sites.AnyAsync()));
        Assert.Equal(1, await empty.Ask(db => db.People.CountAsync())); // one link after the other is for one person
        Assert.Equal(0, await empty.Ask(db => db.Users.CountAsync()));
    }

    [Fact]
    public async Task Where_a_site_is_set_up_it_brings_one_more_administrator()
    {
        using var site = new RunningSite();
        var links = new StringWriter();
        await Invite.Run(["--administrator"], links, TextWriter.Null, site.Services);
        using var bea = site.Visitor();
        await bea.Opens(LinkIn(links));
        await bea.Fills("Your name", "Bea").Fills("Your e-mail address", "bea@tests.example").Chooses(Staffing.NewPassword);
        await bea.SignsInWith("bea@tests.example", Staffing.NewPassword);
        await bea.Opens("/administrators");
        Assert.Contains("Bea", bea.Text, StringComparison.Ordinal);
        Assert.Contains("Bea made Bea an administrator of the site.", await site.Ask(db => db.LedgerEntries.Select(l => l.Sentence).ToListAsync()), StringComparer.Ordinal);
    }

    [Fact]
    public async Task Wrong_use_is_told()
    {
        var error = new StringWriter();
        Assert.Equal(2, await Invite.Run([], TextWriter.Null, error, null!));
        Assert.Equal(2, await Invite.Run(["--administrator", "now"], TextWriter.Null, error, null!));
        Assert.Equal($"{Invite.Usage}\n{Invite.Usage}\n", error.ToString().ReplaceLineEndings("\n"));
    }

    [Fact]
    public async Task The_built_program_prints_the_link_at_its_first_start_and_invite_prints_another()
    {
        var folder = Directory.CreateTempSubdirectory("credtrack-first-");
        File.Copy(Path.Combine(Sources.Root, "src/Credtrack.Web/appsettings.json"), Path.Combine(folder.FullName, "appsettings.json"));
        using var program = Start("--urls", "http://127.0.0.1:0");
        var (printed, line) = (new StringWriter(), "");
        while (line is not null && !line.Contains("Application started", StringComparison.Ordinal)) await printed.WriteLineAsync(line = await program.StandardOutput.ReadLineAsync());
        program.Kill(entireProcessTree: true);
        await program.WaitForExitAsync();
        Assert.Matches("passwords/new\\?key=[A-Za-z0-9_-]{43}\n", printed.ToString().ReplaceLineEndings("\n"));
        using var invite = Start("invite", "--administrator");
        var output = await invite.StandardOutput.ReadToEndAsync();
        await invite.WaitForExitAsync();
        folder.Delete(recursive: true);
        Assert.Equal(0, invite.ExitCode);
        Assert.Matches("passwords/new\\?key=[A-Za-z0-9_-]{43}\n", output.ReplaceLineEndings("\n"));

        // In a folder of its own, as on a server: there its settings, its database and its keys lie.
        Process Start(params string[] args)
        {
            var start = new ProcessStartInfo("dotnet", [typeof(Program).Assembly.Location, .. args]) { RedirectStandardOutput = true, WorkingDirectory = folder.FullName };
            start.Environment["ASPNETCORE_ENVIRONMENT"] = start.Environment["DOTNET_ENVIRONMENT"] = "Production";
            return Process.Start(start)!;
        }
    }

    private static string LinkIn(StringWriter printed) => new Uri(printed.ToString().Split('\n').Single(line => line.Contains("http", StringComparison.Ordinal)).Trim()).PathAndQuery;

    private static Task<Visitor> SetsUp(Visitor ada) => ada.Fills("Name of the institution", "Harbour Hospital").Fills("Time zone", "Europe/Dublin").Fills("Your name", "Ada").Fills("Your e-mail address", "ada@tests.example")
        .Fills("Password", Staffing.NewPassword).Fills("The same password again", Staffing.NewPassword).Presses("Set up");

    /// <summary>As it is unpacked on a server.</summary>
    internal sealed class Empty() : RunningSite(BlankSite.NewFile())
    {
        protected override void ConfigureWebHost(IWebHostBuilder builder)
        {
            base.ConfigureWebHost(builder);
            builder.UseEnvironment("Production").UseSetting("Demo:On", "false");
        }
    }
}
