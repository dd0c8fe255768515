namespace Credtrack.Browser.Tests;

/// <summary>From an unpacked program to the first scan that counts, by the pages alone, with no demonstration data.</summary>
public sealed class FirstStartJourneyTests(Demonstration browser)
{
    private const string Password = "three green herons wade";
    private static readonly string[] Listed = ["tom@tests.example", "rita@tests.example", "dora@tests.example"];

    [Fact]
    public async Task An_empty_installation_becomes_a_programme_at_work()
    {
        await using var site = new Opening();
        await SetUp(site);
        var cora = await Founded(site);
        await Chooses(site, cora, "cora@tests.example");
        var links = await Invited(site);
        foreach (var (address, link) in links) await Chooses(site, link, address);
        await Published(site);
        var scan = await Logged(site);
        await Read(site, scan);
        await using var tom = await SignedIn(site, "tom@tests.example");
        await tom.GoesTo("Standing");
        var row = tom.Page.GetByRole(AriaRole.Row).Filter(new() { Has = tom.Page.GetByRole(AriaRole.Rowheader, new() { Name = "Inferior vena cava", Exact = true }) });
        await Expect(row.GetByRole(AriaRole.Cell).Nth(1)).ToHaveTextAsync("1");
        await tom.Opens(scan);
        await Expect(tom.Page.GetByRole(AriaRole.Main)).ToContainTextAsync("it counts");
    }

    private async Task SetUp(Opening site)
    {
        await using var ada = await browser.Visit(Screen.Desk, site.Address);
        await ada.Opens(await site.FirstLink());
        await ada.Types("Name of the institution", "Harbour Hospital");
        await ada.Page.GetByLabel("Time zone").SelectOptionAsync("Europe/Dublin");
        await ada.Types("Your name", "Ada Administrator");
        await ada.Types("Your e-mail address", "ada@tests.example");
        await Chooses(ada, "Set up");
    }

    private async Task<string> Founded(Opening site)
    {
        await using var ada = await SignedIn(site, "ada@tests.example");
        await ada.GoesTo("Programmes");
        await ada.Follows("Found a programme");
        await ada.Types("Name of the programme", "Emergency medicine");
        await ada.Types("Name of its coordinator", "Cora Coordinator");
        await ada.Types("E-mail address of the coordinator", "cora@tests.example");
        await ada.Chooses("Shown to me once, to hand over");
        await ada.Presses("Found it");
        return site.Here(await ada.Page.Locator("code.key").InnerTextAsync());
    }

    private async Task<IReadOnlyList<(string Address, string Link)>> Invited(Opening site)
    {
        await using var cora = await SignedIn(site, "cora@tests.example", Screen.Phone);
        await cora.GoesTo("People");
        await cora.Follows("Its people");
        await cora.Follows("Invite a list");
        await cora.Types("The list", "Tom Trainee, tom@tests.example, trainee, year 1\nRita Reader, rita@tests.example, reader\nDora Director, dora@tests.example, director");
        await cora.Chooses("Shown to me once, to hand over");
        await cora.Presses("Show what it will do");
        await cora.Presses("Admit 3 lines now");
        await Expect(cora.Page.Locator("code.key")).ToHaveCountAsync(Listed.Length);
        var links = await cora.Page.Locator("code.key").AllInnerTextsAsync();
        return [.. Listed.Zip(links, (address, link) => (address, site.Here(link)))];
    }

    private async Task Published(Opening site)
    {
        await using var dora = await SignedIn(site, "dora@tests.example");
        await dora.GoesTo("Rulebooks");
        await dora.Follows(dora.Page.Locator("a[href^='/rulebooks/new']").First);
        await dora.Types("Rulebook as JSON", """
            {
              "format": "credtrack-rulebook/1", "name": "Harbour rules", "version": 1, "effective": "2026-01-01", "timeZone": "Europe/Dublin", "counting": { "quality": { "min": 3 } },
              "applications": [{ "code": "ivc", "require": [{ "kind": "count", "min": 25 }] }]
            }
            """);
        await dora.Presses("Look at what it says");
        await dora.Presses("Publish version 1");
        await Expect(dora.Page.GetByRole(AriaRole.Status)).ToHaveTextAsync("Version 1 is published and in force");
    }

    private async Task<string> Logged(Opening site)
    {
        await using var tom = await SignedIn(site, "tom@tests.example", Screen.Phone);
        await tom.GoesTo("Log a scan");
        await tom.ChoosesApplication("Inferior vena cava");
        await tom.Ticks("Long axis with liver");
        await tom.Chooses("No", "Small and collapsing with breathing?");
        await tom.Chooses("No", "Wide and hardly moving?");
        await tom.Attaches(Files.Picture());
        await tom.Ticks("No name, number or date of a patient can be seen");
        await tom.Presses("Submit for reading");
        await Expect(tom.Page.GetByRole(AriaRole.Status)).ToHaveTextAsync("Submitted for reading");
        return new Uri(tom.Page.Url).AbsolutePath;
    }

    private async Task Read(Opening site, string scan)
    {
        await using var rita = await SignedIn(site, "rita@tests.example");
        await rita.Opens($"{scan}/readings/new");
        await rita.Chooses("No", "Small and collapsing with breathing?");
        await rita.Chooses("No", "Wide and hardly moving?");
        await rita.Ticks("Long axis with liver");
        await rita.Chooses("4 All structures well seen");
        await rita.Presses("Give this reading");
        await Expect(rita.Page.GetByRole(AriaRole.Status)).ToHaveTextAsync("Reading given");
    }

    private async Task Chooses(Opening site, string link, string address)
    {
        await using var person = await browser.Visit(Screen.Phone, site.Address);
        await person.Opens(link);
        await Expect(person.Page.GetByRole(AriaRole.Main)).ToContainTextAsync(address);
        await Chooses(person, "Save the password");
    }

    private static async Task Chooses(Visitor person, string button)
    {
        await person.Types("Password", Password);
        await person.Types("The same password again", Password);
        await person.Presses(button);
        await Expect(person.Page.GetByRole(AriaRole.Status)).ToContainTextAsync("Your password is saved");
    }

    private async Task<Visitor> SignedIn(Opening site, string address, Screen? screen = null)
    {
        var visitor = await browser.Visit(screen ?? Screen.Desk, site.Address);
        await visitor.Opens("/sign-in");
        await visitor.Types("E-mail address", address);
        await visitor.Types("Password", Password);
        await visitor.Presses("Sign in");
        await Expect(visitor.Page.GetByRole(AriaRole.Button, new() { Name = "Sign out" })).ToBeVisibleAsync();
        return visitor;
    }
}
