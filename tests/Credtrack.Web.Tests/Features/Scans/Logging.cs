using AngleSharp.Dom;
using AngleSharp.Html.Dom;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Scans;

/// <summary>How a trainee goes about the form of a scan.</summary>
internal static class Logging
{
    public const string Attach = "Attach images", Confirm = "No name, number or date of a patient can be seen";
    public const string Submit = "Submit for reading", KeepDraft = "Keep as draft", Questions = "Show its views and questions";

    public static readonly string[] OfCardiac =
        ["Pericardial effusion?", "Signs of tamponade?", "Left ventricular function clearly reduced?", "Right ventricle enlarged?"];

    /// <summary>The form, open at one application.</summary>
    public static async Task<Visitor> Starts(this World world, string application = "cardiac") =>
        await (await world.As(world.Trainee)).Opens($"/scans/new?application={application}");

    /// <summary>The form with all that a reader of a cardiac scan needs.</summary>
    public static async Task<Visitor> Completes(this World world) => (await world.Starts()).Answers("No", OfCardiac).Attaches(Attach, Stills.Png(shade: 60)).Ticks(Confirm);

    public static Visitor Answers(this Visitor visitor, string answer, params string[] questions)
    {
        foreach (var question in questions) visitor.Chooses(question, answer);
        return visitor;
    }

    /// <summary>Chooses the application by its name alone; its tile says more.</summary>
    public static Visitor Scanned(this Visitor visitor, string application)
    {
        var radios = visitor.Page.QuerySelectorAll<IHtmlInputElement>("[name='Form.Application']").ToList();
        foreach (var radio in radios) radio.IsChecked = (radio.Closest("label")!.QuerySelector(".name") ?? radio.Closest("label")!).TextContent.Trim() == application;
        Assert.Single(radios, r => r.IsChecked);
        return visitor;
    }

    /// <summary>Every choice that can be sent and is on, in the order of the page.</summary>
    public static IReadOnlyList<string> Chosen(this Visitor visitor) =>
        [.. visitor.Page.QuerySelectorAll<IHtmlInputElement>("input").Where(i => i.Type is "radio" or "checkbox" && i.IsChecked && i.Closest("[disabled]") is null).Select(i => $"{i.Name}={i.Value}")];

    /// <summary>What the summary says. Each line leads to a field of the page, and the field says the same.</summary>
    public static IReadOnlyList<string> Faults(this Visitor visitor)
    {
        var lines = visitor.Page.QuerySelectorAll(".notice.bad li").ToList();
        Assert.All(lines, line =>
        {
            var target = visitor.Page.QuerySelector(line.QuerySelector("a")!.GetAttribute("href")!);
            Assert.True(target is not null && target.Closest("[hidden], [disabled]") is null, $"'{line.TextContent}' leads nowhere");
            Assert.True(target!.Ancestors<IHtmlDetailsElement>().All(d => d.IsOpen), $"'{line.TextContent}' lies behind a closed lid");
            Assert.Contains(visitor.Page.QuerySelectorAll(".wrong"), wrong => wrong.TextContent == line.TextContent);
        });
        return [.. lines.Select(l => l.TextContent)];
    }

    /// <summary>What a person would send who writes the request by hand.</summary>
    public static Visitor Forges(this Visitor visitor, string name, string value)
    {
        var form = visitor.Page.QuerySelector("form#log")!;
        var input = (IHtmlInputElement)visitor.Page.CreateElement("input");
        (input.Type, input.Name, input.Value) = ("hidden", name, value);
        form.Prepend(input);
        return visitor;
    }

    /// <summary>The form of a scan, sent to another address.</summary>
    public static Task<Visitor> Sends(this Visitor visitor, string url)
    {
        visitor.Page.QuerySelector("form#log")!.SetAttribute("action", url);
        return visitor.Presses(Logging.Submit);
    }

    public static Guid Id(this Visitor visitor) => Guid.Parse(visitor.Page.QuerySelector<IHtmlInputElement>("[name='Form.Id']")!.Value);

    public static Task<Scan?> Kept(this RunningSite site, Guid id) => site.Ask(db => db.Scans.AsNoTracking().SingleOrDefaultAsync(s => s.Id == id));

    public static Task<Scan[]> ScansOf(this RunningSite site, Person person) =>
        site.Ask(db => db.Scans.AsNoTracking().Where(s => s.TraineeId == person.Id).OrderBy(s => s.LoggedAt).ToArrayAsync());
}
