using Credtrack.Core.Rulebooks;

namespace Credtrack.Core.Measures.Standings;

/// <summary>What one person has and still needs on a day, by a rulebook, with the trace that explains every scan. No random numbers, no clock.</summary>
public sealed record Standing(
    Rules Rules, DateOnly AsOf, IReadOnlyList<ApplicationStanding> Applications, IReadOnlyList<GroupStanding> Groups,
    SectionStanding Overall, SectionStanding Items, IReadOnlyList<Finding> Findings)
{
    public const string Format = "credtrack-standing/1";

    public bool Met => Applications.All(a => a.Met) && Groups.All(g => g.Met) && Overall.Met && Items.Met;

    /// <summary>All that is asked, whatever of.</summary>
    public IEnumerable<RequirementStanding> Requirements =>
        [.. Applications.SelectMany(a => a.Requirements), .. Groups.SelectMany(g => g.Requirements), .. Overall.Requirements, .. Items.Requirements];

    /// <summary>Evaluates one person's evidence, whose scan ids are unique, in any order. Days are calendar days in the rulebook's zone.</summary>
    public static Standing Of(Rules rules, IEnumerable<ScanEvidence> scans, IEnumerable<ItemEvidence> items, DateOnly asOf)
    {
        var findings = Trace.Of(rules, scans, asOf);
        var byApplication = findings.ToLookup(f => f.Application, StringComparer.Ordinal);
        var applications = rules.Applications.Select(a => ApplicationStanding.Of(a, new Basis(asOf, [.. byApplication[a.Code]]))).ToList();
        var groups = rules.Groups.Select((g, at) => GroupStanding.Of(g, at + 1, new Basis(asOf, Within(findings, g.Applications))));
        var all = new Basis(asOf, Within(findings, rules.Applications.Select(a => a.Code))) { Applications = applications };
        var done = new Basis(asOf, []) { Items = [.. items.Where(item => LocalTimes.DayOf(item.At, rules.Zone) <= asOf)] };
        return new(rules, asOf, applications, [.. groups], new(all.Measure("overall", rules.Overall)), new(done.Measure("items", rules.Items)), findings);
    }

    private static List<Finding> Within(IReadOnlyList<Finding> findings, IEnumerable<string> codes)
    {
        var wanted = codes.ToHashSet(StringComparer.Ordinal);
        return [.. findings.Where(f => wanted.Contains(f.Application))];
    }
}

/// <summary>One application: its scans by verdict, the excluded ones by reason, and its requirements in the rulebook's order.</summary>
public sealed record ApplicationStanding(
    ApplicationRules Rules, int Counted, int Pending, IReadOnlyDictionary<string, int> Excluded, IReadOnlyList<RequirementStanding> Requirements)
{
    public string Code => Rules.Code;

    /// <summary>Without requirements it takes at least one scan that counts.</summary>
    public bool Met => Requirements.Count > 0 ? Requirements.All(r => r.Met) : Counted > 0;

    internal static ApplicationStanding Of(ApplicationRules rules, Basis basis)
    {
        var excluded = basis.Findings.Where(f => f.Reason is not null).GroupBy(f => f.Reason!, StringComparer.Ordinal).ToDictionary(g => g.Key, g => g.Count(), StringComparer.Ordinal);
        return new(rules, basis.Counting.Count(), basis.Pending.Count(), excluded, basis.Measure($"application:{rules.Code}", rules.Require));
    }
}

/// <summary>What is asked of several applications together.</summary>
public sealed record GroupStanding(GroupRules Rules, IReadOnlyList<RequirementStanding> Requirements)
{
    public string Name => Rules.Name;
    public bool Met => Requirements.All(r => r.Met);

    internal static GroupStanding Of(GroupRules rules, int number, Basis basis) => new(rules, basis.Measure($"group:{number}", rules.Require));
}

/// <summary>The overall requirements, or the items. With none, it is met.</summary>
public sealed record SectionStanding(IReadOnlyList<RequirementStanding> Requirements)
{
    public bool Met => Requirements.All(r => r.Met);
}
