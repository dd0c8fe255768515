namespace Credtrack.Browser.Tests;

public sealed class LogFormTests(Demonstration site)
{
    [Fact]
    public async Task The_list_of_all_applications_stays_open_under_arrow_keys_and_folds_up_after_a_pointer()
    {
        await using var visitor = await site.Visit(Screen.Desk, "Ngozi Adelambo");
        await visitor.Opens("/scans/new");
        await visitor.UnfoldsApplications();
        var list = visitor.Page.Locator("details.all-apps");
        var radios = list.GetByRole(AriaRole.Radio);
        await radios.First.FocusAsync();
        foreach (var n in new[] { 1, 2, 3 })
        {
            await visitor.Page.Keyboard.PressAsync("ArrowDown");
            await Expect(radios.Nth(n)).ToBeCheckedAsync();
            await Expect(radios.Nth(n)).ToBeFocusedAsync();
        }
        await radios.Nth(5).ClickAsync();
        await Expect(radios).ToHaveCountAsync(0);
        await Expect(list).ToContainTextAsync("chosen; all applications");
    }
}
