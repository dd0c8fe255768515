using System.Text.RegularExpressions;

namespace Credtrack.Browser.Tests.Site;

/// <summary>A person before a screen: finds things by their words, presses, chooses and types. With touch, pressing is tapping.</summary>
public sealed partial class Visitor : IAsyncDisposable
{
    /// <summary>How long to wait for what must come, in milliseconds; long, because a busy machine is slow and not wrong.</summary>
    public const float Patience = 20_000;

    private readonly Screen screen;
    private readonly List<string> complaints = [];

    public Visitor(IPage page, Screen screen)
    {
        (Page, this.screen) = (page, screen);
        page.Context.SetDefaultTimeout(Patience);
        page.Console += (_, said) => Note(said);
        page.PageError += (_, error) => complaints.Add(error);
        page.Response += (_, answer) => Note(answer);
    }

    public IPage Page { get; }

    /// <summary>What the browser complained about: script errors, broken policy, parts of a page that did not come.</summary>
    public IReadOnlyList<string> Complaints => complaints;

    public async Task SignsIn(string name)
    {
        await Opens("/sign-in");
        await Presses(name);
        await Expect(Page.GetByRole(AriaRole.Button, new() { Name = "Sign out" })).ToBeVisibleAsync();
    }

    public async Task SignsOut()
    {
        await Presses("Sign out");
        await Expect(Heading("Sign in")).ToBeVisibleAsync();
    }

    public Task Opens(string url) => Page.GotoAsync(url);

    public Task Presses(string button) => Press(Page.GetByRole(AriaRole.Button, new() { Name = button }));

    /// <summary>By the navigation at the top.</summary>
    public Task GoesTo(string place) => Press(Page.GetByRole(AriaRole.Navigation, new() { Name = "Main" }).GetByRole(AriaRole.Link, new() { Name = place, Exact = true }));

    public Task Follows(string link) => Press(Page.GetByRole(AriaRole.Link, new() { Name = link, Exact = true }));

    public Task Follows(ILocator link) => Press(link);

    /// <summary>Opens what is folded away behind these words.</summary>
    public Task Unfolds(string words) => Press(Page.GetByText(words));

    public Task UnfoldsApplications() => Press(Page.GetByText(AllApplications()));

    /// <summary>From the tiles of recent ones or from the list of all, which is unfolded for it and folds up afterwards.</summary>
    public async Task ChoosesApplication(string name)
    {
        await UnfoldsApplications();
        await Press(Radio(name));
        await Expect(Page.GetByRole(AriaRole.Radio, new() { Name = name, IncludeHidden = true })).ToBeCheckedAsync();
    }

    public Task Chooses(string radio, string? within = null) => Check(AriaRole.Radio, radio, within);

    public Task Ticks(string box) => Check(AriaRole.Checkbox, box, null);

    public Task Types(string label, string text) => Page.GetByLabel(label, new() { Exact = true }).FillAsync(text);

    public Task Attaches(params FilePayload[] files) => Page.GetByLabel("Attach images").SetInputFilesAsync(files);

    public ILocator Heading(string words) => Page.GetByRole(AriaRole.Heading, new() { Name = words });

    public ILocator Radio(string name, string? within = null) => Found(AriaRole.Radio, name, within);

    public ILocator Box(string name) => Found(AriaRole.Checkbox, name, null);

    public ValueTask DisposeAsync() => Page.Context.DisposeAsync();

    private async Task Check(AriaRole role, string name, string? within)
    {
        var control = Found(role, name, within);
        if (!await control.IsCheckedAsync()) await Press(control);
        await Expect(control).ToBeCheckedAsync();
    }

    private ILocator Found(AriaRole role, string name, string? within)
    {
        var group = within is null ? null : Page.GetByRole(AriaRole.Group, new() { Name = within }).Or(Page.GetByRole(AriaRole.Radiogroup, new() { Name = within }));
        return group is null ? Page.GetByRole(role, new() { Name = name }) : group.GetByRole(role, new() { Name = name });
    }

    private Task Press(ILocator thing) => screen.Touch ? thing.TapAsync() : thing.ClickAsync();

    // That a page itself answers 404 or 422 is no fault of it, and a part that fails is noted with its answer.
    private void Note(IConsoleMessage said)
    {
        if (said.Type is "error" or "warning" && !said.Text.StartsWith("Failed to load resource: the server responded", StringComparison.Ordinal)) complaints.Add(said.Text);
    }

    private void Note(IResponse answer)
    {
        if (answer.Status >= 400 && !answer.Request.IsNavigationRequest) complaints.Add($"{answer.Status} {answer.Url}");
    }

    [GeneratedRegex(@"^All \d+ applications$")]
    private static partial Regex AllApplications();
}
