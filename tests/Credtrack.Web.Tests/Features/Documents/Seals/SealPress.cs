using Credtrack.Web.Features.Documents.Seals;
using Microsoft.Extensions.Logging;
using Microsoft.Extensions.Logging.Abstractions;

namespace Credtrack.Web.Tests.Features.Documents.Seals;

/// <summary>Certificates of invented sites, each in a folder of its own that goes away with the tests.</summary>
internal static class SealPress
{
    public const string SiteName = "Hospital of Saint Bríd";
    public const string Reason = "Summary of a portfolio, as recorded on the day of sealing";

    private static readonly Lazy<SealingCertificate> Shared = new(() => Open(NewPath()));

    public static SiteClock Clock { get; } = new();
    public static DateTime Now => Clock.Now.UtcDateTime;

    /// <summary>One for all tests that only need some certificate: its keys take a second.</summary>
    public static SealingCertificate Certificate => Shared.Value;

    public static string NewPath() => Path.Combine(BlankSite.Folder, $"seal-{Guid.NewGuid():N}", "seal.pfx");

    public static SealingCertificate Open(string path, string? password = null, string? former = null, TimeProvider? clock = null, ILogger? log = null) =>
        SealingCertificate.LoadOrMake(path, password, former, SiteName, clock ?? Clock, log ?? NullLogger.Instance);

    public static byte[] Press(byte[]? pdf = null, SealingCertificate? certificate = null, DateTime? at = null) =>
        Seal.Apply(pdf ?? PlainPdf.Make(), certificate ?? Certificate, at ?? Now, SiteName, Reason);

    public static SealFinding Check(byte[] file, SealingCertificate? certificate = null) => SealCheck.Of(file, (certificate ?? Certificate).Trust);
}
