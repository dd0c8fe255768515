using Credtrack.Web.Commands;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.Extensions.Logging;

namespace Credtrack.Browser.Tests.Site;

/// <summary>An installation in production on an empty database: nobody can sign in yet, and there is no demonstration.</summary>
public sealed class Opening : WebApplicationFactory<Program>
{
    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("credtrack-opening-");

    public Opening()
    {
        UseKestrel(0);
        StartServer();
    }

    public Uri Address => ClientOptions.BaseAddress;

    /// <summary>What the command line prints for whoever runs the server.</summary>
    public async Task<string> FirstLink()
    {
        var printed = new StringWriter();
        await Invite.Run(["--administrator"], printed, TextWriter.Null, Services);
        return Here(printed.ToString().Split('\n').Single(line => line.Contains("http", StringComparison.Ordinal)));
    }

    /// <summary>A link names the public address, which in a test is not where the program listens.</summary>
    public string Here(string link) => new Uri(Address, new Uri(link.Trim()).PathAndQuery).ToString();

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseEnvironment("Production").UseSetting("Demo:On", "false");
        builder.UseSetting("ConnectionStrings:Credtrack", $"Data Source={Path.Combine(folder.FullName, "credtrack.db")};Pooling=False");
        foreach (var place in new[] { "Pictures:Folder", "Mail:Folder", "Keys:Folder" }) builder.UseSetting(place, Path.Combine(folder.FullName, place[..4]));
        builder.UseSetting("Jobs:On", "false");
        builder.UseSetting("Seal:Certificate", Path.Combine(folder.FullName, "seal", "seal.pfx"));
        builder.ConfigureLogging(log => log.ClearProviders());
    }

    public override async ValueTask DisposeAsync()
    {
        await base.DisposeAsync();
        folder.Delete(recursive: true);
    }
}
