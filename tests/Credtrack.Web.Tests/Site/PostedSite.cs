using Microsoft.AspNetCore.Hosting;

namespace Credtrack.Web.Tests.Site;

/// <summary>A site whose letters go to a mail server.</summary>
public class PostedSite : RunningSite
{
    public PostOffice Office { get; } = new();

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        base.ConfigureWebHost(builder);
        builder.UseSetting("Mail:Host", "127.0.0.1").UseSetting("Mail:Port", $"{Office.Port}").UseSetting("PublicAddress", "https://credtrack.example");
    }

    protected override void Dispose(bool disposing)
    {
        base.Dispose(disposing);
        if (disposing) Office.Dispose();
    }
}
