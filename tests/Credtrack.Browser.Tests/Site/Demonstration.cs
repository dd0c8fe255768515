using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.Extensions.Logging;

[assembly: AssemblyFixture(typeof(Credtrack.Browser.Tests.Site.Demonstration))]

namespace Credtrack.Browser.Tests.Site;

/// <summary>The whole program with its demonstration data on a real port, and one browser, once for all tests: building the data takes longer than most of them.</summary>
public sealed class Demonstration : WebApplicationFactory<Program>, IAsyncLifetime
{
    private static readonly string[] Flags =
        ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"];

    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("credtrack-");
    private IPlaywright playwright = null!;
    private IBrowser browser = null!;

    public async ValueTask InitializeAsync()
    {
        UseKestrel(0);
        StartServer();
        SetDefaultExpectTimeout(Visitor.Patience);
        playwright = await Playwright.CreateAsync();
        browser = await playwright.Chromium.LaunchAsync(new() { ExecutablePath = "/usr/bin/chromium", Args = Flags });
    }

    /// <summary>The same browser before another site.</summary>
    public async Task<Visitor> Visit(Screen screen, Uri site) => new(await (await browser.NewContextAsync(screen.With(site))).NewPageAsync(), screen);

    public async Task<Visitor> Visit(Screen screen, string? name = null)
    {
        var visitor = await Visit(screen, ClientOptions.BaseAddress);
        if (name is not null) await visitor.SignsIn(name);
        return visitor;
    }

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseSetting("ConnectionStrings:Credtrack", $"Data Source={Path.Combine(folder.FullName, "credtrack.db")};Pooling=False");
        builder.UseSetting("Pictures:Folder", Path.Combine(folder.FullName, "pictures"));
        builder.UseSetting("Seal:Certificate", Path.Combine(folder.FullName, "seal", "seal.pfx"));
        builder.UseSetting("Jobs:On", "false");
        builder.UseSetting("Keys:Folder", Path.Combine(folder.FullName, "keys")).UseSetting("Mail:Folder", Path.Combine(folder.FullName, "mail"));
        builder.ConfigureLogging(log => log.ClearProviders());
    }

    public override async ValueTask DisposeAsync()
    {
        await browser.DisposeAsync();
        playwright.Dispose();
        await base.DisposeAsync();
        folder.Delete(recursive: true);
    }
}
