using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Rulebooks.Requirements;
using Credtrack.Web.Features.Shared.Figures;

namespace Credtrack.Web.Features.Standings;

/// <summary>One application of a standing as the pages say it. The depth is that of the plain count; every other condition keeps the notch open.</summary>
public sealed record StandingLine(string Code, string Name, Depth? Depth, ApplicationStanding Standing, int Excluded)
{
    public int OpenConditions => Standing.Requirements.Count(r => !r.Met);
    public int Missing => Depth?.Missing ?? 0;

    /// <summary>"7 missing, 3 wait", "met, 4 beyond", "count reached; 2 positive scans missing".</summary>
    public string Said
    {
        get
        {
            var waiting = Standing.Pending > 0 ? $", {Standing.Pending} {(Standing.Pending == 1 ? "waits" : "wait")}" : "";
            var beyond = Standing.Counted - (Depth?.Required ?? 0);
            if (Standing.Met) return (beyond > 0 && Depth is not null ? $"met, {beyond} beyond" : "met") + waiting;
            var others = Standing.Requirements.Where(r => !r.Met && r.Asked is not Count { Where: null }).Select(Lacking).ToList();
            var first = Missing > 0 ? $"{Missing} missing" : Depth is null ? "not met" : "count reached";
            var cap = Depth?.OverCap > 0 ? $"{Depth.OverCap} over a cap" : null;
            string?[] said = [first + waiting, .. others, cap];
            return string.Join("; ", said.OfType<string>());
        }
    }

    /// <summary>"3 scans"; where the count is reached, the first condition that is open.</summary>
    public string Gap => Missing > 0 ? Missing.Of("scan") : Standing.Requirements.Where(r => !r.Met).Select(r => r.Lacks).FirstOrDefault() ?? "a scan that counts";

    public string NearestGap => $"{Gap} in {Name}";

    /// <summary>What the waiting scans could do. Whether they count, their readings decide.</summary>
    public string Hope => (Missing, Standing.Pending) switch
    {
        (0, _) => "The count is reached; the condition is still open.",
        (_, 0) => "None wait for a reading.",
        var (missing, pending) when pending >= missing && OpenConditions == 1 => $"{pending} wait. If {missing} of them {(missing == 1 ? "counts" : "count")}, the application is met.",
        var (_, pending) => $"{pending} {(pending == 1 ? "waits" : "wait")} for a reading.",
    };

    /// <summary>All that is asked beside the plain count.</summary>
    public IEnumerable<RequirementStanding> Conditions => Standing.Requirements.Where(r => r.Asked is not Count { Where: null });

    public static StandingLine Of(Standing standing, ApplicationStanding application, string name)
    {
        var required = RequiredBy(application.Rules);
        var capped = standing.Findings.Count(f => f.Application == application.Code && f.Cap is not null);
        var depth = required is not { } least ? null : new Depth(application.Code, name, least, application.Counted, application.Pending, capped, application.Met);
        return new(application.Code, name, depth, application, application.Excluded.Values.Sum());
    }

    public static StandingLine? Of(Standing standing, string code, string name) =>
        standing.Applications.FirstOrDefault(a => a.Code == code) is { } application ? Of(standing, application, name) : null;

    /// <summary>The plain count that is asked; null where none is.</summary>
    public static int? RequiredBy(ApplicationRules rules) => rules.Require.OfType<Count>().Where(c => c.Where is null).Max(c => (int?)c.Min);

    private static string Lacking(RequirementStanding requirement) => requirement.Missing is not null ? $"{requirement.Lacks} missing" : requirement.Lacks!;
}
