using System.Net;
using Microsoft.AspNetCore.HttpOverrides;

namespace Credtrack.Web.Plumbing;

/// <summary>Behind a proxy all requests come from its address; who asks stands in a header, which is believed from the proxies that are named and from nobody else.</summary>
public static class Forwarded
{
    public static void UseForwarded(this IApplicationBuilder app, IReadOnlyList<IPAddress> proxies)
    {
        if (proxies.Count == 0) return;
        var options = new ForwardedHeadersOptions { ForwardedHeaders = ForwardedHeaders.XForwardedFor | ForwardedHeaders.XForwardedProto, ForwardLimit = null };
        options.KnownIPNetworks.Clear(); // else this machine itself is believed
        options.KnownProxies.Clear();
        foreach (var proxy in proxies) options.KnownProxies.Add(proxy);
        app.UseForwardedHeaders(options);
    }
}
