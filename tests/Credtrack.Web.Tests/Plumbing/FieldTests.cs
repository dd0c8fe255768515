using AngleSharp.Dom;
using AngleSharp.Html.Dom;
using Credtrack.Web.Plumbing;

namespace Credtrack.Web.Tests.Plumbing;

public sealed class FieldTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public void A_field_is_of_the_kind_of_what_it_holds()
    {
        var tags = new Tags(site.Services, new Typed { Day = new(2026, 2, 3), PerformedAt = new(2026, 2, 3, 14, 6, 59), Setting = "a", Quality = 4 });
        Assert.Equal(("number", "4"), Kind(new(tags.Html) { For = tags.For(f => f.Quality), View = tags.View }));
        Assert.Equal(("date", "2026-02-03"), Kind(new(tags.Html) { For = tags.For(f => f.Day), View = tags.View }));
        Assert.Equal(("datetime-local", "2026-02-03T14:06"), Kind(new(tags.Html) { For = tags.For(f => f.PerformedAt), View = tags.View }));
        Assert.Equal(("text", "a"), Kind(new(tags.Html) { For = tags.For(f => f.Setting), View = tags.View }));
    }

    [Fact]
    public void A_field_names_its_unit_and_passes_on_what_keyboards_and_browsers_want()
    {
        var tags = new Tags(site.Services, new Typed());
        var field = Tags.Written(new Field(tags.Html) { For = tags.For(f => f.Quality), View = tags.View, Unit = "of 5", InputMode = "numeric", Autocomplete = "off", Kind = "short" });
        Assert.Equal("Image quality of 5", field.QuerySelector("label")!.TextContent);
        Assert.Equal("field short", field.Children.Single().ClassName);
        Assert.Equal(("numeric", "off", null), (Entry(field, "inputmode"), Entry(field, "autocomplete"), Entry(field, "aria-describedby")));
    }

    [Fact]
    public void A_list_sends_values_shows_texts_and_keeps_the_choice()
    {
        var tags = new Tags(site.Services, new Typed { Setting = "sim" });
        var field = Tags.Written(new Field(tags.Html) { For = tags.For(f => f.Setting), View = tags.View, Options = new[] { ("cl", "Clinical"), ("sim", "Simulation") }.AsOptions() });
        var options = field.QuerySelectorAll("select.entry option").OfType<IHtmlOptionElement>().Select(o => (o.Value, o.Text, o.IsSelected));
        Assert.Equal([("", "Choose", false), ("cl", "Clinical", false), ("sim", "Simulation", true)], options);
    }

    [Fact]
    public void A_radio_group_ties_its_error_and_its_first_radio_is_where_the_summary_leads()
    {
        var tags = new Tags(site.Services, new Typed { Setting = "sim" });
        tags.State.AddModelError("Setting", "Choose where the scan was performed.");
        tags.State.AddModelError("", "The form is of yesterday.");
        var pick = Tags.Written(new Pick(tags.Html) { For = tags.For(f => f.Setting), View = tags.View, Legend = "Where?", Hint = "Once.", Options = new[] { ("cl", "Clinical"), ("sim", "Simulation") }.AsOptions() });
        var summary = Tags.Written(new Errors { View = tags.View }).Children.Single();

        Assert.Equal("Where?", pick.QuerySelector("fieldset > legend")!.TextContent);
        Assert.Equal("setting-hint setting-fault", pick.QuerySelector("fieldset")!.GetAttribute("aria-describedby"));
        Assert.Equal("Choose where the scan was performed.", pick.QuerySelector("#setting-fault.wrong")!.TextContent);
        Assert.Equal(["setting", "setting-2"], pick.QuerySelectorAll(".pick input[type=radio][name=Setting]").Select(i => i.Id!));
        Assert.Equal("Simulation", pick.QuerySelector("label:has(:checked)")!.TextContent);
        Assert.Equal("#setting", Assert.Single(summary.QuerySelectorAll("a")).GetAttribute("href"));
        Assert.Equal(["The form is of yesterday.", "Choose where the scan was performed."], summary.QuerySelectorAll("li").Select(l => l.TextContent).OrderDescending());
        Assert.Equal(("notice bad", "alert", "-1"), (summary.ClassName, summary.GetAttribute("role"), summary.GetAttribute("tabindex")));
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void A_tick_shows_what_was_said_and_is_followed_by_its_no(bool said)
    {
        var tags = new Tags(site.Services, new Typed { Indicated = said });
        var tick = Tags.Written(new Tick(tags.Html) { For = tags.For(f => f.Indicated), View = tags.View });
        var inputs = tick.QuerySelectorAll("input[name=Indicated]").OfType<IHtmlInputElement>().ToList();
        Assert.Equal([("checkbox", "true"), ("hidden", "false")], inputs.Select(i => (i.Type, i.Value)));
        Assert.Equal(said, inputs[0].IsChecked);
        Assert.Equal("Clinically indicated", tick.QuerySelector(".tick > label:only-child")!.TextContent);
    }

    private static (string?, string?) Kind(Field field)
    {
        var written = Tags.Written(field);
        return (Entry(written, "type"), Entry(written, "value"));
    }

    private static string? Entry(IElement field, string attribute) => field.QuerySelector(".entry")!.GetAttribute(attribute);
}
