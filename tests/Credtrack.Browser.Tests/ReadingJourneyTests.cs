using System.Globalization;

namespace Credtrack.Browser.Tests;

public sealed class ReadingJourneyTests(Demonstration site)
{
    private const string Application = "Inferior vena cava";
    private const string Feedback = "Let the patient hold the breath once; the wall is well seen.";

    [Fact]
    public async Task A_scan_logged_and_read_on_the_phone_moves_the_count_by_exactly_one()
    {
        await using var visitor = await site.Visit(Screen.Phone, "Wrenna Ostholm");
        var before = await Count(visitor);

        await visitor.GoesTo("Log a scan");
        await visitor.ChoosesApplication(Application);
        await visitor.Ticks("Long axis with liver");
        await visitor.Chooses("No", "Small and collapsing with breathing?");
        await visitor.Chooses("No", "Wide and hardly moving?");
        await visitor.Attaches(Files.Picture());
        await visitor.Ticks("No name, number or date of a patient can be seen");
        await visitor.Presses("Submit for reading");
        await Expect(visitor.Page.GetByRole(AriaRole.Status)).ToHaveTextAsync("Submitted for reading");
        var scan = new Uri(visitor.Page.Url).AbsolutePath;
        await visitor.SignsOut();

        await visitor.SignsIn("Dr Halvard Quill");
        await visitor.Opens($"{scan}/readings/new");
        await visitor.Chooses("Yes", "Small and collapsing with breathing?");
        await visitor.Chooses("No", "Wide and hardly moving?");
        await visitor.Ticks("Long axis with liver");
        await visitor.Chooses("4 All structures well seen");
        await visitor.Types("Feedback for the trainee", Feedback);
        await visitor.Presses("Give this reading");
        await Expect(visitor.Page.GetByRole(AriaRole.Status)).ToHaveTextAsync("Reading given");
        await visitor.Opens("/");
        await visitor.SignsOut();

        await visitor.SignsIn("Wrenna Ostholm");
        Assert.Equal(before + 1, await Count(visitor));
        await visitor.Opens(scan);
        var main = visitor.Page.GetByRole(AriaRole.Main);
        await Expect(main).ToContainTextAsync("by Dr Halvard Quill: false negative, image quality 4 of 5");
        await Expect(main).ToContainTextAsync("it counts");
        await Expect(main).ToContainTextAsync(Feedback);
        await Expect(Row(visitor, "Small and collapsing with breathing?").GetByRole(AriaRole.Cell)).ToHaveTextAsync(["No", "Yes", "differ, false negative"]);
        await Expect(Row(visitor, "Wide and hardly moving?").GetByRole(AriaRole.Cell)).ToHaveTextAsync(["No", "No", "agree, true negative"]);
    }

    /// <summary>The count of the application on the trainee's own standing.</summary>
    private static async Task<int> Count(Visitor visitor)
    {
        await visitor.GoesTo("Standing");
        var count = Row(visitor, Application).GetByRole(AriaRole.Cell).Nth(1);
        return int.Parse(await count.InnerTextAsync(), CultureInfo.InvariantCulture);
    }

    private static ILocator Row(Visitor visitor, string header) =>
        visitor.Page.GetByRole(AriaRole.Row).Filter(new() { Has = visitor.Page.GetByRole(AriaRole.Rowheader, new() { Name = header, Exact = true }) });
}
