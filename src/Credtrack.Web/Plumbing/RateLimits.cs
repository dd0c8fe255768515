using System.Threading.RateLimiting;
using Microsoft.AspNetCore.RateLimiting;

namespace Credtrack.Web.Plumbing;

/// <summary>How often one address may ask in public, with a number or a file. A person checking papers never meets it; a program guessing numbers does.</summary>
public static class RateLimits
{
    public const string Checks = "checks";
    public const int ChecksAMinute = 30;

    public static void Configure(RateLimiterOptions options)
    {
        options.RejectionStatusCode = StatusCodes.Status429TooManyRequests;
        options.AddPolicy(Checks, context => !Asks(context.Request) ? RateLimitPartition.GetNoLimiter("") : RateLimitPartition.GetFixedWindowLimiter(context.Connection.RemoteIpAddress?.ToString() ?? "",
            _ => new FixedWindowRateLimiterOptions { PermitLimit = ChecksAMinute, Window = TimeSpan.FromMinutes(1) }));
    }

    // Opening the empty page tries nothing.
    private static bool Asks(HttpRequest request) => !HttpMethods.IsGet(request.Method) || request.Query["code"].Any(code => !string.IsNullOrEmpty(code));
}
