namespace Credtrack.Browser.Tests;

public sealed class WithoutScriptTests(Demonstration site)
{
    private static readonly Screen Plain = Screen.SmallPhone with { Script = false };

    [Fact]
    public async Task A_scan_is_logged_and_read_without_any_script()
    {
        await using var trainee = await site.Visit(Plain, "Hana Morikawa-Lind");
        await trainee.GoesTo("Log a scan");
        await trainee.ChoosesApplication("Inferior vena cava");
        await trainee.Presses("Show its views and questions");
        await trainee.Ticks("Long axis with liver");
        await trainee.Chooses("Yes", "Small and collapsing with breathing?");
        await trainee.Chooses("No", "Wide and hardly moving?");
        await trainee.Attaches(Files.Picture());
        await trainee.Ticks("No name, number or date of a patient can be seen");
        await trainee.Presses("Submit for reading");
        await Expect(trainee.Page.GetByRole(AriaRole.Status)).ToHaveTextAsync("Submitted for reading");
        var scan = new Uri(trainee.Page.Url).AbsolutePath;

        await using var reader = await site.Visit(Plain, "Dr Ines Calderwood");
        await reader.Opens($"{scan}/readings/new");
        await reader.Chooses("Yes", "Small and collapsing with breathing?");
        await reader.Chooses("No", "Wide and hardly moving?");
        await reader.Ticks("Long axis with liver");
        await reader.Chooses("3 Enough to answer");
        await reader.Presses("Give this reading");
        await Expect(reader.Page.GetByRole(AriaRole.Status)).ToHaveTextAsync("Reading given");

        await trainee.Opens(scan);
        await Expect(trainee.Page.GetByRole(AriaRole.Main)).ToContainTextAsync("by Dr Ines Calderwood: true positive, image quality 3 of 5");
    }
}
