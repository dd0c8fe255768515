using Microsoft.AspNetCore.Mvc.Rendering;

namespace Credtrack.Web.Plumbing;

/// <summary>The zones of the world as this machine knows them, under the names that every machine knows.</summary>
public static class TimeZones
{
    public static IReadOnlyList<SelectListItem> All { get; } =
        [.. TimeZoneInfo.GetSystemTimeZones().Where(z => z.HasIanaId && (z.Id.Contains('/', StringComparison.Ordinal) || z.Id == "UTC")).Select(z => z.Id).Distinct().Order(StringComparer.Ordinal).AsOptions()];
}
