using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using Credtrack.Core.Measures;
using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Rulebooks;

namespace Credtrack.Web.Commands;

/// <summary>Evaluates files without a site: a rulebook and the evidence in, standings out. Exit status 0, or 2 where anything is at fault.</summary>
public static class Evaluate
{
    /// <param name="args">What follows the word evaluate.</param>
    /// <param name="output">The standings and nothing else; stays empty where anything is at fault.</param>
    /// <param name="error">Every fault, one a line.</param>
    /// <param name="clock">Asked for today where no day is given.</param>
    public static int Run(string[] args, TextWriter output, TextWriter error, TimeProvider clock)
    {
        if (EvaluateOptions.Read(args, out var wrong) is not { } options)
        {
            error.WriteLine(wrong);
            error.WriteLine(EvaluateOptions.Usage);
            return 2;
        }
        var files = EvidenceFiles.Read(options);
        foreach (var fault in files.Faults) error.WriteLine(fault);
        if (files.Rules is not { } rules || files.Faults.Count > 0) return 2;

        var asOf = options.AsOf ?? LocalTimes.DayOf(clock.GetUtcNow().UtcDateTime, rules.Zone);
        var standings = files.People(options.Person).Select(person => (person, Standing.Of(rules, files.ScansOf(person), files.ItemsOf(person), asOf)));
        if (options.AsText) StandingText.Write(output, standings);
        else output.WriteLine(Json(standings, asList: options.Person is null));
        return 0;
    }

    private static string Json(IEnumerable<(string Person, Standing Standing)> standings, bool asList)
    {
        using var bytes = new MemoryStream();
        // Read by programs and people, never put into a page: letters of all languages stay as they are.
        using (var json = new Utf8JsonWriter(bytes, new JsonWriterOptions { Indented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping }))
        {
            if (asList) json.WriteStartArray();
            foreach (var (person, standing) in standings) StandingJson.Write(json, person, standing);
            if (asList) json.WriteEndArray();
        }
        return Encoding.UTF8.GetString(bytes.ToArray());
    }
}
