namespace Credtrack.Browser.Tests;

public sealed class PictureTests(Demonstration site)
{
    [Fact]
    public async Task A_file_that_is_no_picture_is_refused_plainly_and_nothing_typed_nor_the_good_picture_is_lost()
    {
        await using var visitor = await site.Visit(Screen.Phone, "Tobias Achterkamp");
        await visitor.Opens("/scans/new");
        await visitor.ChoosesApplication("Inferior vena cava");
        await visitor.Chooses("Simulation", "Setting");
        await visitor.Ticks("Long axis with liver");
        await visitor.Chooses("Yes", "Small and collapsing with breathing?");
        await visitor.Chooses("Unclear", "Wide and hardly moving?");
        await visitor.Unfolds("More about this scan");
        await visitor.Types("Depth cm", "12,5");
        await visitor.Types("Note", "Short of breath.");
        await visitor.Attaches(Files.Picture(), Files.TextNamedAsPicture());
        await visitor.Ticks("No name, number or date of a patient can be seen");
        await visitor.Presses("Submit for reading");

        await Expect(visitor.Page.GetByRole(AriaRole.Alert)).ToContainTextAsync("Picture 2: This file is not a PNG or JPEG picture. Export it as one of these and attach it again.");
        await Expect(visitor.Radio("Inferior vena cava")).ToBeCheckedAsync();
        await Expect(visitor.Radio("Simulation", "Setting")).ToBeCheckedAsync();
        await Expect(visitor.Box("Long axis with liver")).ToBeCheckedAsync();
        await Expect(visitor.Radio("Yes", "Small and collapsing with breathing?")).ToBeCheckedAsync();
        await Expect(visitor.Radio("Unclear", "Wide and hardly moving?")).ToBeCheckedAsync();
        await Expect(visitor.Page.GetByLabel("Depth cm", new() { Exact = true })).ToHaveValueAsync("12,5");
        await Expect(visitor.Page.GetByLabel("Note", new() { Exact = true })).ToHaveValueAsync("Short of breath.");
        await Expect(visitor.Box("Picture 1, 320 by 240")).ToBeCheckedAsync();
        await Expect(visitor.Box("No name, number or date of a patient can be seen")).ToBeCheckedAsync();

        await visitor.Presses("Submit for reading");
        await Expect(visitor.Page.GetByRole(AriaRole.Status)).ToHaveTextAsync("Submitted for reading");
        await Expect(visitor.Page.GetByRole(AriaRole.Img, new() { Name = "of the scan" })).ToHaveCountAsync(1);
    }
}
