using AngleSharp.Dom;
using AngleSharp.Html.Dom;
using Credtrack.Core.Catalogue;

namespace Credtrack.Web.Tests.Features.Applications;

/// <summary>How a coordinator goes about the catalogue.</summary>
internal static class Cataloguing
{
    public const string Keep = "Keep the changes", Add = "Add it to the catalogue";

    public static async Task<Visitor> AsCoordinator(this World world) => await world.As(await world.Another($"Cora {Guid.NewGuid():N}", MembershipKind.Coordinator));

    public static async Task<Visitor> Edits(this World world, string code) => await (await world.AsCoordinator()).Opens($"/applications/{world.Site.Applications[code].Id}/edit");

    public static Task<Application> Listed(this RunningSite site, string code) => site.Ask(db => db.Applications.AsNoTracking().SingleAsync(a => a.Code == code));

    /// <summary>Changed or retired by somebody else, at once.</summary>
    public static async Task<int> Behind(this World world, string code, Action<Application, Person> act)
    {
        var somebody = await world.Another($"Cem {Guid.NewGuid():N}", MembershipKind.Coordinator);
        return await world.Site.Ask(async db =>
        {
            act(await db.Applications.SingleAsync(a => a.Code == code), somebody);
            return await db.SaveChangesAsync();
        });
    }

    public static ApplicationEntry EntryOf(Application of) => new(
        of.Name, of.Transducer, of.DepthFromMm, of.DepthToMm, of.FrequencyFromKhz, of.FrequencyToKhz, of.Note, of.Views, of.Questions, of.Subtypes);

    /// <summary>A button that no page offers: an empty form with this person's token, sent to an address.</summary>
    public static async Task<Visitor> Posts(this Visitor visitor, string url)
    {
        await visitor.Opens("/applications");
        var form = visitor.Page.QuerySelector<IHtmlFormElement>("form[action='/sign-out']")!;
        form.SetAttribute("action", url);
        return await visitor.Presses(form.QuerySelector<IHtmlButtonElement>("button")!);
    }

    public static Visitor FillsDiaphragm(this Visitor coordinator, string code) => coordinator
        .Fills("Code", code).Fills("Name", $"Diaphragm {code}").Fills("Usual transducer", "linear")
        .Fills("Depth from cm", "2").Fills("Depth to cm", "8,5").Fills("Frequency from MHz", "5").Fills("Frequency to MHz", "12.5")
        .Fills("View 1", "Zone of apposition").Fills("Question 1", "Thickening normal?").Fills("Positive answer 1", "No");
}
