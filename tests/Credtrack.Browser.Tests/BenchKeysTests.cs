using System.Text.RegularExpressions;

namespace Credtrack.Browser.Tests;

/// <summary>The bench without a mouse. Medicine's queue belongs to these tests alone.</summary>
public sealed class BenchKeysTests(Demonstration site)
{
    [Fact]
    public async Task A_reading_is_given_with_keys_alone()
    {
        await using var visitor = await site.Visit(Screen.Desk, "Dr Ines Calderwood");
        await visitor.Opens("/readings");
        var keys = visitor.Page.Keyboard;

        foreach (var quality in new[] { "1", "2", "3", "4", "5" })
        {
            await keys.PressAsync(quality);
            await Expect(visitor.Radio($"{quality} ", "Image quality")).ToBeCheckedAsync();
        }
        var boxes = visitor.Page.GetByRole(AriaRole.Group, new() { Name = "Views that are adequate" }).GetByRole(AriaRole.Checkbox);
        await keys.PressAsync("v");
        foreach (var box in await boxes.AllAsync()) await Expect(box).ToBeCheckedAsync();
        await keys.PressAsync("v");
        foreach (var box in await boxes.AllAsync()) await Expect(box).Not.ToBeCheckedAsync();
        await keys.PressAsync("v");

        var questions = await visitor.Page.GetByRole(AriaRole.Radiogroup).AllAsync();
        Assert.NotEmpty(questions);
        foreach (var question in questions)
        {
            await keys.PressAsync("q");
            await Expect(question.GetByRole(AriaRole.Radio).First).ToBeFocusedAsync();
            await keys.PressAsync("ArrowDown");
            await Expect(question.GetByRole(AriaRole.Radio).Nth(1)).ToBeCheckedAsync();
        }
        await keys.PressAsync("t");
        await Expect(Feedback(visitor)).ToBeFocusedAsync();
        await keys.TypeAsync("Well seen.");
        await keys.PressAsync("Control+Enter");
        await Expect(visitor.Page.GetByRole(AriaRole.Status)).ToHaveTextAsync("Reading given");
    }

    [Fact]
    public async Task L_leads_to_the_next_scan_and_the_question_mark_to_the_list_of_keys()
    {
        await using var visitor = await site.Visit(Screen.Desk, "Dr Matthias Vollenweyer");
        await visitor.Opens("/readings");
        var first = visitor.Page.Url;
        await visitor.Page.Keyboard.PressAsync("?");
        await Expect(visitor.Page.GetByText("To the first question that is open")).ToBeVisibleAsync();
        await Expect(visitor.Page.GetByText("All keys", new() { Exact = true })).ToBeFocusedAsync();
        await visitor.Page.Keyboard.PressAsync("l");
        await Expect(visitor.Page).Not.ToHaveURLAsync(first);
        await Expect(visitor.Page).ToHaveURLAsync(new Regex("/readings/new$"));
    }

    [Fact]
    public async Task Single_keys_are_silent_in_the_text_field_and_when_switched_off()
    {
        await using var visitor = await site.Visit(Screen.Desk, "Dr Rosalind Tremayne-Okafor");
        await visitor.Opens("/readings");
        var (keys, first) = (visitor.Page.Keyboard, visitor.Page.Url);
        await keys.PressAsync("t");
        await keys.TypeAsync("2vqtl?");
        await Expect(Feedback(visitor)).ToHaveValueAsync("2vqtl?");
        await NothingIsChosen(visitor);

        await SwitchesKeys(visitor);
        await keys.TypeAsync("2vqtl?");
        await NothingIsChosen(visitor);
        await visitor.Page.ReloadAsync();
        await keys.TypeAsync("2vqtl?");
        await NothingIsChosen(visitor);
        await Expect(visitor.Page).ToHaveURLAsync(new Regex($"^{Regex.Escape(first)}(#|$)"));

        await SwitchesKeys(visitor);
        await keys.PressAsync("2");
        await Expect(visitor.Radio("2 ", "Image quality")).ToBeCheckedAsync();
    }

    private static ILocator Feedback(Visitor visitor) => visitor.Page.GetByLabel("Feedback for the trainee");

    private static async Task NothingIsChosen(Visitor visitor)
    {
        await Expect(visitor.Page.GetByRole(AriaRole.Group, new() { Name = "Image quality" }).GetByRole(AriaRole.Radio, new() { Checked = true })).ToHaveCountAsync(0);
        await Expect(visitor.Page.GetByRole(AriaRole.Group, new() { Name = "Views that are adequate" }).GetByRole(AriaRole.Checkbox, new() { Checked = true })).ToHaveCountAsync(0);
    }

    /// <summary>By the link at the top, which leads to the switch, and the space bar.</summary>
    private static async Task SwitchesKeys(Visitor visitor)
    {
        await visitor.Page.GetByRole(AriaRole.Link, new() { Name = "All keys" }).PressAsync("Enter");
        await Expect(visitor.Box("Single keys work")).ToBeFocusedAsync();
        await visitor.Page.Keyboard.PressAsync("Space");
    }
}
