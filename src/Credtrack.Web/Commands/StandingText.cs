using System.Globalization;
using Credtrack.Core.Measures.Standings;

namespace Credtrack.Web.Commands;

/// <summary>Standings for people to read; the form may change at any time.</summary>
internal static class StandingText
{
    public static void Write(TextWriter output, IEnumerable<(string Person, Standing Standing)> standings)
    {
        foreach (var (person, standing) in standings)
        {
            output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{person} on {standing.AsOf:O} by {standing.Rules.Name}, version {standing.Rules.Version}: {Word(standing.Met)}"));
            foreach (var application in standing.Applications)
            {
                var excluded = string.Concat(application.Excluded.Select(pair => $", {pair.Value} excluded ({pair.Key})"));
                output.WriteLine($"  {application.Code}: {Word(application.Met)}; {application.Counted} count, {application.Pending} pending{excluded}");
                Write(output, application.Requirements);
            }
            foreach (var group in standing.Groups) Write(output, group.Name, group.Met, group.Requirements);
            Write(output, "overall", standing.Overall.Met, standing.Overall.Requirements);
            Write(output, "items", standing.Items.Met, standing.Items.Requirements);
            foreach (var finding in standing.Findings)
                output.WriteLine($"  {finding.Scan} ({finding.Application}) {(finding.Words() is { } reason ? $"{Word(finding.Verdict)}: {reason}" : Word(finding.Verdict))}");
        }
    }

    private static void Write(TextWriter output, string name, bool met, IReadOnlyList<RequirementStanding> requirements)
    {
        if (requirements.Count == 0) return;
        output.WriteLine($"  {name}: {Word(met)}");
        Write(output, requirements);
    }

    private static void Write(TextWriter output, IReadOnlyList<RequirementStanding> requirements)
    {
        foreach (var requirement in requirements)
            output.WriteLine($"    {requirement.Asks}: {(requirement.Lacks is { } lacks ? $"missing {lacks}" : "met")}{(requirement.Pending > 0 ? $" ({requirement.Pending} pending)" : "")}");
    }

    private static string Word(bool met) => met ? "met" : "not met";

    private static string Word(Verdict verdict) => verdict switch { Verdict.Counts => "counts", Verdict.Pending => "is pending", _ => "does not count" };
}
