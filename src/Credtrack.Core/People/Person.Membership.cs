namespace Credtrack.Core.People;

public sealed partial class Person
{
    private const string LastOne = "The last coordinator stays: make somebody else one first, who has chosen a password.";

    public string? WhyNotJoin(Programme programme, MembershipTerms terms) =>
          terms.Faults().Select(f => f.Why).FirstOrDefault()
        ?? (Of(programme, terms.Kind).Any(m => m.Meets(terms.FirstDay, terms.LastDay)) ? $"{Name} is already a {terms.Kind} of {programme.Name}."
        : Of(programme, terms.Kind).Any(m => m.FirstDay == terms.FirstDay) ? $"{Name} began as a {terms.Kind} of {programme.Name} on {terms.FirstDay:O} before; begin on another day."
        : null);

    /// <summary>For whoever sets a programme up. Who is in it already admits others.</summary>
    public void Join(Person by, Programme programme, MembershipTerms terms, DateTime at)
    {
        RuleBroken.If(WhyNotJoin(programme, terms));
        memberships.Add(new Membership(this, programme, terms, at));
        Record(new MembershipBegan(by, at, Name, terms.Kind, programme.Name, Spoken(terms)));
    }

    public void Join(Person by, Programme programme, MembershipKind kind, DateTime at, string? yearGroup = null) =>
        Join(by, programme, new MembershipTerms(kind, DateOnly.FromDateTime(at), YearGroup: yearGroup), at);

    public string? WhyNotAdmit(Person by, Site site, Programme programme, MembershipKind kind) =>
        programme.WhyNotStaff(by, kind, site) ?? (by.Id == Id ? "Nobody changes their own memberships." : null);

    public void Admit(Person by, Site site, Programme programme, MembershipTerms terms, DateTime at)
    {
        RuleBroken.If(WhyNotAdmit(by, site, programme, terms.Kind));
        Join(by, programme, terms, at);
    }

    /// <param name="coordinators">who coordinates the programme today, with no last day, and can sign in</param>
    public string? WhyNotChange(Person by, Site site, Membership membership, MembershipTerms terms, IEnumerable<Person> coordinators, DateOnly today) =>
          WhyNotAdmit(by, site, membership.Programme, membership.Kind)
        ?? terms.Faults().Select(f => f.Why).FirstOrDefault()
        ?? (Of(membership.Programme, membership.Kind).Any(m => m != membership && m.Meets(terms.FirstDay, terms.LastDay)) ? $"{Name} is already a {membership.Kind} of {membership.Programme.Name} on some of these days."
        : Ends(membership, terms, today) && coordinators.All(c => c.Id == Id) ? LastOne
        : null);

    public void Change(Person by, Site site, Membership membership, MembershipTerms terms, IReadOnlyCollection<Person> coordinators, DateOnly today, DateTime at)
    {
        RuleBroken.If(WhyNotChange(by, site, membership, terms, coordinators, today));
        (string Name, string Was, string Is)[] said =
        [
            ("year group", membership.YearGroup ?? "none", terms.YearGroup ?? "none"), ("first day", $"{membership.FirstDay:O}", $"{terms.FirstDay:O}"),
            ("last day", Spoken(membership.LastDay), Spoken(terms.LastDay)),
        ];
        if (Ends(membership, terms, today)) membership.Programme.LetGo(by, this, terms.LastDay ?? today, at);
        membership.Take(terms);
        var what = string.Join("; ", said.Where(s => s.Was != s.Is).Select(s => $"{s.Name} from {s.Was} to {s.Is}"));
        if (what.Length > 0) Record(new MembershipChanged(by, at, Name, membership.Kind, membership.Programme.Name, what));
    }

    public string? WhyNotEnd(Person by, Site site, Membership membership, IEnumerable<Person> coordinators, DateOnly today) =>
          WhyNotAdmit(by, site, membership.Programme, membership.Kind)
        ?? (membership.LastDay < today ? "This membership is over."
        : membership is { Kind: MembershipKind.Coordinator, LastDay: null } && coordinators.All(c => c.Id == Id) ? LastOne
        : null);

    /// <summary>At once: the last day is yesterday, also of a membership that began today and so covers no day at all; the fact says the moment.</summary>
    public void End(Person by, Site site, Membership membership, IReadOnlyCollection<Person> coordinators, DateOnly today, DateTime at)
    {
        RuleBroken.If(WhyNotEnd(by, site, membership, coordinators, today));
        if (membership is { Kind: MembershipKind.Coordinator, LastDay: null }) membership.Programme.LetGo(by, this, today.AddDays(-1), at);
        membership.EndAfter(today.AddDays(-1));
        Record(new MembershipEnded(by, at, Name, membership.Kind, membership.Programme.Name));
    }

    public string? WhyNotLeave(Programme programme, MembershipKind kind) =>
        Open(programme, kind) is null ? $"{Name} is no {kind} of {programme.Name}." : null;

    public void Leave(Person by, Programme programme, MembershipKind kind, DateOnly lastDay, DateTime at)
    {
        RuleBroken.If(WhyNotLeave(programme, kind));
        Open(programme, kind)!.EndAfter(lastDay);
        Record(new MembershipEnds(by, at, Name, kind, programme.Name, lastDay));
    }

    public string? WhyNotBeAway(Programme programme, DateOnly first, DateOnly last) =>
          Of(programme, MembershipKind.Trainee).LastOrDefault() is not { } membership ? $"{Name} is no Trainee of {programme.Name}."
        : first > last ? "A leave ends on or after the day on which it begins."
        : !membership.Meets(first, last) ? "These days lie outside the membership."
        : membership.Leaves.Any(l => l.TakenBackAt is null && l.FirstDay <= last && first <= l.LastDay) ? $"{Name} is already away on some of these days."
        : null;

    public void BeAway(Person by, Programme programme, DateOnly first, DateOnly last, DateTime at)
    {
        RuleBroken.If(WhyNotBeAway(programme, first, last));
        var membership = Of(programme, MembershipKind.Trainee).Last();
        membership.Add(new Leave(membership, first, last, at));
        Record(new LeaveGranted(by, at, Name, programme.Name, first, last));
    }

    /// <summary>As BeAway, for whoever edits the programme's people.</summary>
    public void NoteLeave(Person by, Site site, Programme programme, DateOnly first, DateOnly last, DateTime at)
    {
        RuleBroken.If(WhyNotAdmit(by, site, programme, MembershipKind.Trainee));
        BeAway(by, programme, first, last, at);
    }

    public string? WhyNotTakeBack(Person by, Site site, Leave leave) =>
          WhyNotAdmit(by, site, memberships.Single(m => m.Id == leave.MembershipId).Programme, MembershipKind.Trainee)
        ?? (leave.TakenBackAt is null ? null : "This leave is taken back already.");

    public void TakeBack(Person by, Site site, Leave leave, DateTime at)
    {
        RuleBroken.If(WhyNotTakeBack(by, site, leave));
        leave.TakeBack(at);
        Record(new LeaveTakenBack(by, at, Name, leave.FirstDay, leave.LastDay));
    }

    private IEnumerable<Membership> Of(Programme programme, MembershipKind kind) => memberships.Where(m => m.Kind == kind && m.ProgrammeId == programme.Id).OrderBy(m => m.FirstDay);

    private Membership? Open(Programme programme, MembershipKind kind) => Of(programme, kind).SingleOrDefault(m => m.LastDay is null);

    private static bool Ends(Membership membership, MembershipTerms terms, DateOnly today) =>
        membership is { Kind: MembershipKind.Coordinator, LastDay: null } && (terms.LastDay is not null || (membership.FirstDay <= today && terms.FirstDay > today));

    private static string Spoken(DateOnly? lastDay) => lastDay is { } day ? $"{day:O}" : "none";

    private static string Spoken(MembershipTerms terms) =>
        $"from {terms.FirstDay:O}{(terms.LastDay is { } last ? $" to {last:O}" : "")}{(terms.YearGroup is null ? "" : $", {terms.YearGroup}")}{(terms.StandsInFor is { } absent ? $", standing in for {absent.Name}" : "")}";
}
