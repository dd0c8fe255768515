using System.Text;
using Credtrack.Web.Tests.Laws;

namespace Credtrack.Web.Tests.Features.Imports;

/// <summary>How a coordinator goes about an import.</summary>
internal static class Importing
{
    public const string Header = "scan,person,application,performed_at,role,setting,indicated,supervision,assisted,read_at,quality,views,result";
    public const string GoOn = "Go on: see what will happen";

    public static string Log { get; } = File.ReadAllText(Path.Combine(Sources.Root, "tests/data/scan-log.csv"));

    /// <summary>A row of the format that counts by the rules of the tests, performed the day before.</summary>
    public static string Row(this World world, string id, string person, string application = "cardiac", string rest = "performed,clinical,yes,direct,no", string reading = "{0},4,yes,TN") =>
        $"{id},{person},{application},{world.Now.AddDays(-1):yyyy-MM-dd},{rest},{string.Format(System.Globalization.CultureInfo.InvariantCulture, reading, $"{world.Now.AddDays(-1):yyyy-MM-dd}")}";

    public static string Table(params IEnumerable<string> rows) => string.Join('\n', rows.Prepend(Header));

    public static async Task<Visitor> Uploads(this Visitor visitor, string csv) => await visitor.Uploads(Encoding.UTF8.GetBytes(csv));

    public static async Task<Visitor> Uploads(this Visitor visitor, byte[] file)
    {
        await visitor.Opens("/imports/new");
        return await visitor.Attaches("CSV file", file).Presses("Upload the file");
    }

    /// <summary>Up to the page that shows what will happen.</summary>
    public static async Task<Visitor> Maps(this Visitor visitor, string csv) => await (await visitor.Uploads(csv)).Presses(GoOn);

    public static async Task<Visitor> Imports(this Visitor visitor, string csv)
    {
        await visitor.Maps(csv);
        var button = visitor.Page.QuerySelectorAll("button").Single(b => b.TextContent.StartsWith("Import ", StringComparison.Ordinal));
        return await visitor.Presses((AngleSharp.Html.Dom.IHtmlButtonElement)button);
    }

    public static Guid Id(this Visitor visitor) => Guid.Parse(visitor.Url.Split('/', '?', '#')[2]);

    public static IReadOnlyList<string> Told(this Visitor visitor) => [.. visitor.Page.QuerySelectorAll(".notice.bad li").Select(l => string.Join(' ', l.TextContent.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries)))];

    /// <summary>Presses a button that the page does not show.</summary>
    public static Task<Visitor> Posts(this Visitor visitor, string url) =>
        visitor.Sends(url, new FormUrlEncodedContent([new("__RequestVerificationToken", visitor.Page.QuerySelector("[name=__RequestVerificationToken]")!.GetAttribute("value")!)]));

    /// <summary>How many scans are evidence, of one person or of the whole programme.</summary>
    public static Task<int> Evidence(this World world, Person? person = null) => world.Site.Ask(async db =>
    {
        var people = person is null ? await db.Scans.Where(s => s.ProgrammeId == world.Programme.Id).Select(s => s.TraineeId).Distinct().ToListAsync() : [person.Id];
        return (await db.EvidenceOf(people)).Sum(p => p.Count());
    });
}
