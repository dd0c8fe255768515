using System.Threading.RateLimiting;
using Microsoft.AspNetCore.RateLimiting;

namespace Credtrack.Web.Plumbing;

/// <summary>How often one address may ask in public. A person checking papers never meets it; a program guessing numbers does.</summary>
public static class RateLimits
{
    public const string Checks = "checks";
    public const int ChecksAMinute = 30;

    public static void Configure(RateLimiterOptions options)
    {
        options.RejectionStatusCode = StatusCodes.Status429TooManyRequests;
        options.AddPolicy(Checks, context => RateLimitPartition.GetFixedWindowLimiter(context.Connection.RemoteIpAddress?.ToString() ?? "",
            _ => new FixedWindowRateLimiterOptions { PermitLimit = ChecksAMinute, Window = TimeSpan.FromMinutes(1) }));
    }
}
