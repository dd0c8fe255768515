namespace Credtrack.Browser.Tests;

public sealed class LayoutTests(Demonstration site)
{
    // Source of 44: WCAG 2.1, 2.5.5 Target size (enhanced), 44 by 44 CSS pixels. Half a pixel is left to rounding.
    private const double Target = 43.5;

    [Theory, MemberData(nameof(Place.Names), MemberType = typeof(Place))]
    public async Task Nothing_hangs_over_the_side_and_the_browser_complains_of_nothing(string place)
    {
        await using var visitor = await Place.Reached(site, place);
        foreach (var width in new[] { 320, 390, 1280 })
        {
            await visitor.Page.SetViewportSizeAsync(width, 900);
            var over = await visitor.Page.EvaluateAsync<int>("document.scrollingElement.scrollWidth - innerWidth");
            Assert.True(over <= 0, $"{over} px too wide at {width}");
        }
        Assert.True(visitor.Complaints.Count == 0, string.Join('\n', visitor.Complaints));
    }

    [Fact]
    public async Task On_a_small_phone_each_control_of_the_log_form_is_high_enough_for_a_thumb()
    {
        await using var visitor = await site.Visit(Screen.SmallPhone, "Wrenna Ostholm");
        await visitor.Opens("/scans/new?application=efast");
        await visitor.Unfolds("another time");
        await visitor.Unfolds("More about this scan");
        await visitor.UnfoldsApplications();
        var form = visitor.Page.Locator("form.log, .reach");
        var low = new List<string>();
        var seen = 0;
        foreach (var role in new[] { AriaRole.Radio, AriaRole.Checkbox, AriaRole.Textbox, AriaRole.Combobox, AriaRole.Button })
        {
            foreach (var control in await form.GetByRole(role).AllAsync())
            {
                seen++;
                var box = await control.BoundingBoxAsync();
                if (box!.Height < Target) low.Add($"{role} {await control.GetAttributeAsync("name")}: {box.Height} px");
            }
        }
        Assert.True(seen > 50, $"only {seen} controls were seen");
        Assert.True(low.Count == 0, string.Join('\n', low));
    }
}
