using System.Globalization;
using System.Text.Json;

namespace Credtrack.Core.Measures.Standings;

/// <summary>A standing in the format credtrack-standing/1. A key that does not apply is left out; value never is.</summary>
public static class StandingJson
{
    public static void Write(Utf8JsonWriter json, string person, Standing standing)
    {
        json.WriteStartObject();
        json.WriteString("format", Standing.Format);
        json.WriteString("person", person);
        json.WriteString("asOf", standing.AsOf.ToString("O", CultureInfo.InvariantCulture));
        json.WriteStartObject("rulebook");
        json.WriteString("name", standing.Rules.Name);
        json.WriteNumber("version", standing.Rules.Version);
        json.WriteEndObject();
        json.WriteBoolean("met", standing.Met);
        json.WriteStartArray("applications");
        foreach (var application in standing.Applications) Write(json, application);
        json.WriteEndArray();
        json.WriteStartArray("groups");
        foreach (var group in standing.Groups)
        {
            json.WriteStartObject();
            json.WriteString("name", group.Name);
            WriteEnd(json, group.Met, group.Requirements);
        }
        json.WriteEndArray();
        json.WriteStartObject("overall");
        WriteEnd(json, standing.Overall.Met, standing.Overall.Requirements);
        json.WriteStartObject("items");
        WriteEnd(json, standing.Items.Met, standing.Items.Requirements);
        json.WriteStartArray("scans");
        foreach (var finding in standing.Findings) Write(json, finding);
        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, ApplicationStanding application)
    {
        json.WriteStartObject();
        json.WriteString("code", application.Code);
        json.WriteBoolean("met", application.Met);
        json.WriteNumber("counted", application.Counted);
        json.WriteNumber("pending", application.Pending);
        json.WriteStartObject("excluded");
        foreach (var (reason, number) in application.Excluded) json.WriteNumber(reason, number);
        json.WriteEndObject();
        WriteRequirements(json, application.Requirements);
        json.WriteEndObject();
    }

    private static void WriteEnd(Utf8JsonWriter json, bool met, IReadOnlyList<RequirementStanding> requirements)
    {
        json.WriteBoolean("met", met);
        WriteRequirements(json, requirements);
        json.WriteEndObject();
    }

    private static void WriteRequirements(Utf8JsonWriter json, IReadOnlyList<RequirementStanding> requirements)
    {
        json.WriteStartArray("requirements");
        foreach (var requirement in requirements)
        {
            json.WriteStartObject();
            json.WriteString("kind", requirement.Kind);
            json.WriteBoolean("met", requirement.Met);
            if (requirement.Value is { } value) json.WriteNumber("value", value); else json.WriteNull("value");
            WriteIfGiven(json, "min", requirement.Min);
            WriteIfGiven(json, "max", requirement.Max);
            WriteIfGiven(json, "missing", requirement.Missing);
            WriteIfGiven(json, "pending", requirement.Pending);
            WriteIfGiven(json, "bound", requirement.Bound);
            WriteIfGiven(json, "n", requirement.N);
            if (requirement.Of is { } of) json.WriteString("of", of);
            WriteIfGiven(json, "limit", requirement.Limit);
            json.WriteEndObject();
        }
        json.WriteEndArray();
    }

    private static void WriteIfGiven(Utf8JsonWriter json, string key, double? number)
    {
        if (number is { } given) json.WriteNumber(key, given);
    }

    private static void Write(Utf8JsonWriter json, Finding finding)
    {
        json.WriteStartObject();
        json.WriteString("scan", finding.Scan);
        json.WriteString("application", finding.Application);
        json.WriteString("status", finding.Verdict switch { Verdict.Counts => "counts", Verdict.Pending => "pending", _ => "excluded" });
        if (finding.Reason is { } reason) json.WriteString("reason", reason);
        json.WriteEndObject();
    }
}
