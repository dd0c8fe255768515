namespace Credtrack.Web.Features.Documents.Checks;

public sealed record CheckPage(CheckForm Form, CheckAnswer? Answer, string Site, TimeZoneInfo Zone, DateTime Now)
{
    /// <summary>Whom outsiders ask, if the site names somebody.</summary>
    public string? Contact { get; init; }

    public static async Task<CheckPage> Load(CredtrackDb db, CheckForm form, CheckAnswer? answer, DateTime now)
    {
        var site = await db.Sites.AsNoTracking().SingleOrDefaultAsync();
        return new(form, answer, site?.Name ?? "this site", TimeZoneInfo.FindSystemTimeZoneById(site?.TimeZone ?? "UTC"), now) { Contact = site?.Contact };
    }
}
