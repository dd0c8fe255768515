using Credtrack.Web.Features.Documents;
using Credtrack.Web.Plumbing;
using Microsoft.AspNetCore.Hosting;

namespace Credtrack.Web.Tests.Plumbing;

public sealed class ForwardedTests
{
    private class SiteBehindProxy : RunningSite
    {
        protected virtual string Proxy => "127.0.0.1";

        protected override void ConfigureWebHost(IWebHostBuilder builder)
        {
            base.ConfigureWebHost(builder);
            builder.UseSetting("Proxies:0", Proxy);
            builder.UseSetting("Proxies:1", "::1");
        }
    }

    private sealed class SiteBehindTheFrontDoor : SiteBehindProxy
    {
        protected override string Proxy => "the front door";
    }

    [Fact]
    public async Task Behind_a_named_proxy_each_stranger_has_a_limit_of_their_own()
    {
        await using var site = new SiteBehindProxy();
        await Uses(site, RateLimits.ChecksAMinute, _ => "203.0.113.1");
        Assert.Equal(HttpStatusCode.TooManyRequests, await Checks(site, "203.0.113.1"));
        Assert.Equal(HttpStatusCode.TooManyRequests, await Checks(site, "198.51.100.7, 203.0.113.1")); // what the stranger wrote stands before what the proxy wrote
        Assert.Equal(HttpStatusCode.OK, await Checks(site, "203.0.113.2"));
    }

    [Fact]
    public async Task Nobody_else_is_believed()
    {
        await using var site = new RunningSite();
        await Uses(site, RateLimits.ChecksAMinute, n => $"203.0.113.{n}");
        Assert.Equal(HttpStatusCode.TooManyRequests, await Checks(site, "203.0.113.200"));
    }

    [Fact]
    public void A_proxy_that_is_no_address_stops_the_start_with_a_sentence()
    {
        var wrong = Assert.ThrowsAny<Exception>(() => new SiteBehindTheFrontDoor());
        Assert.Contains("Proxies holds addresses such as 10.0.0.5, not the front door.", wrong.ToString(), StringComparison.Ordinal);
    }

    private static async Task Uses(RunningSite site, int times, Func<int, string> from)
    {
        for (var n = 0; n < times; n++) Assert.Equal(HttpStatusCode.OK, await Checks(site, from(n)));
    }

    private static async Task<HttpStatusCode> Checks(RunningSite site, string from)
    {
        using var http = new HttpClient { BaseAddress = site.ClientOptions.BaseAddress };
        using var request = new HttpRequestMessage(HttpMethod.Get, new Uri($"/documents/checks?code={DocumentCode.New()}", UriKind.Relative));
        request.Headers.Add("X-Forwarded-For", from);
        using var response = await http.SendAsync(request);
        return response.StatusCode;
    }
}
