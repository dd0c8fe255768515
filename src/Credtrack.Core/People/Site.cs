namespace Credtrack.Core.People;

/// <summary>One installation is one site: its name, and the zone in which its people read the clock.</summary>
public sealed class Site : Recorded
{
    public string Name { get; private init; } = "";
    public string TimeZone { get; private init; } = "";

    private Site() { }

    public static string? WhyNotFound(string timeZone) =>
        TimeZoneInfo.TryFindSystemTimeZoneById(timeZone, out _) ? null : $"There is no time zone {timeZone}; take an IANA name such as Europe/Dublin.";

    public static Site Found(Person by, string name, string timeZone, DateTime at)
    {
        RuleBroken.If(WhyNotFound(timeZone));
        var site = new Site { Id = Guid.CreateVersion7(at), Name = name, TimeZone = timeZone };
        site.Record(new SiteFounded(by, at, name, timeZone));
        return site;
    }
}
