using Credtrack.Core.Plumbing;

namespace Credtrack.Core.People;

/// <summary>What a site says of itself.</summary>
/// <param name="Contact">where strangers ask; null if nowhere</param>
/// <param name="LateAfterDays">days after which a scan that waits for its reading is late</param>
public sealed record SiteEntry(string Name, string TimeZone, string? Contact, int LateAfterDays)
{
    public const int LongestName = 120;
    public const int LongestContact = 200;

    /// <summary>What cannot be so, each with the name of the value it is about.</summary>
    public IEnumerable<(string About, string Why)> Faults()
    {
        if (string.IsNullOrWhiteSpace(Name)) yield return (nameof(Name), "Give the site a name.");
        else if (TextLine.WhyNot(Name, LongestName) is { } line) yield return (nameof(Name), line);
        if (Contact is not null && TextLine.WhyNot(Contact, LongestContact) is { } odd) yield return (nameof(Contact), odd);
        if (Site.WhyNotFound(TimeZone) is { } why) yield return (nameof(TimeZone), why);
        if (LateAfterDays is < 1 or > 90) yield return (nameof(LateAfterDays), "Give a number of days from 1 to 90.");
    }
}

/// <summary>One installation is one site: its name, the zone in which its people read the clock, and who looks after it.</summary>
public sealed class Site : Recorded
{
    public const int UsualLateAfterDays = 7;

    private readonly List<Administrator> administrators = [];

    public string Name { get; private set; } = "";
    public string TimeZone { get; private set; } = "";
    public string? Contact { get; private set; }
    public int LateAfterDays { get; private set; } = UsualLateAfterDays;
    public IReadOnlyList<Administrator> Administrators => administrators;

    private Site() { }

    public static string? WhyNotFound(string timeZone) =>
        TimeZoneInfo.TryFindSystemTimeZoneById(timeZone, out _) ? null : $"There is no time zone {timeZone}; take an IANA name such as Europe/Dublin.";

    /// <summary>Who sets a site up is its first administrator.</summary>
    public static Site Found(Person by, string name, string timeZone, DateTime at)
    {
        RuleBroken.If(WhyNotFound(timeZone));
        var site = new Site { Id = Guid.CreateVersion7(at), Name = name, TimeZone = timeZone };
        site.Record(new SiteFounded(by, at, name, timeZone));
        site.administrators.Add(new Administrator(site, by, at));
        return site;
    }

    public bool IsAdministeredBy(Person person) => administrators.Any(a => a.PersonId == person.Id && a.EndedAt is null);

    public string? WhyNotChange(Person by) => IsAdministeredBy(by) ? null : "Only an administrator changes the site.";

    public void Change(Person by, SiteEntry entry, DateTime at)
    {
        RuleBroken.If(WhyNotChange(by) ?? entry.Faults().Select(f => f.Why).FirstOrDefault());
        (string Name, string Was, string Is)[] said =
        [
            ("name", Name, entry.Name), ("time zone", TimeZone, entry.TimeZone), ("contact", Contact ?? "none", entry.Contact ?? "none"),
            ("days until a reading is late", $"{LateAfterDays}", $"{entry.LateAfterDays}"),
        ];
        (Name, TimeZone, Contact, LateAfterDays) = (entry.Name, entry.TimeZone, entry.Contact, entry.LateAfterDays);
        var what = string.Join("; ", said.Where(s => s.Was != s.Is).Select(s => $"{s.Name} from {s.Was} to {s.Is}"));
        if (what.Length > 0) Record(new SiteChanged(by, at, what));
    }

    public string? WhyNotAppoint(Person by, Person person) =>
        WhyNotChange(by) ?? (IsAdministeredBy(person) ? $"{person.Name} is an administrator already." : null);

    public void Appoint(Person by, Person person, DateTime at)
    {
        RuleBroken.If(WhyNotAppoint(by, person));
        Add(by, person, at);
    }

    /// <summary>For whom the server's own command line has invited: whoever can run it needs no other leave.</summary>
    public void AppointInvited(Person person, Invitation invitation, DateTime at)
    {
        RuleBroken.If(invitation.PersonId == person.Id && invitation.Kind == InvitationKind.Administrator ? null : "This invitation is none for an administrator.");
        if (!IsAdministeredBy(person)) Add(person, person, at);
    }

    /// <param name="signingIn">the administrators who have chosen a password</param>
    public string? WhyNotDismiss(Person by, Person person, IEnumerable<Guid> signingIn) =>
          WhyNotChange(by)
        ?? (!IsAdministeredBy(person) ? $"{person.Name} is no administrator."
        : !administrators.Any(a => a.EndedAt is null && a.PersonId != person.Id && signingIn.Contains(a.PersonId)) ? "The last administrator stays: appoint another one first, who has chosen a password."
        : null);

    public void Dismiss(Person by, Person person, IReadOnlyCollection<Guid> signingIn, DateTime at)
    {
        RuleBroken.If(WhyNotDismiss(by, person, signingIn));
        administrators.Single(a => a.PersonId == person.Id && a.EndedAt is null).End(at);
        Record(new AdministratorDismissed(by, at, person.Name));
    }

    private void Add(Person by, Person person, DateTime at)
    {
        administrators.Add(new Administrator(this, person, at));
        Record(new AdministratorAppointed(by, at, person.Name));
    }
}
