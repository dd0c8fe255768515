namespace Credtrack.Browser.Tests.Site;

/// <summary>
/// A page as somebody comes to it, and words that only stand on it: before they are there, one would look at the page before.
/// What is done on the way changes nothing that another test looks at.
/// </summary>
public sealed record Place(string Name, string? Who, string Shows, Func<Visitor, Task> Reach)
{
    private const string Trainee = "Wrenna Ostholm", Drafter = "Maren Eskildsen", Reader = "Dr Halvard Quill", Director = "Dr Seraphine Okwuosa-Lund", Administrator = "Ottilie Brandreth-Moss", Coordinator = "Nuala Fitzmaurice-Hart";
    private const string Attention = "This needs your attention";

    private static readonly Place[] All =
    [
        new("sign-in", null, "With your account", v => v.Opens("/sign-in")),
        new("sign-in with errors", null, Attention, async v => { await v.Opens("/sign-in"); await v.Presses("Sign in"); }),
        new("home of a trainee", Trainee, "To be done", v => v.Opens("/")),
        new("home of a reader", Reader, "Open the reading bench", v => v.Opens("/")),
        new("home of a director", Director, "Emergency medicine has", v => v.Opens("/")),
        new("scan log of a trainee", Trainee, "Newest first", v => v.Opens("/scans")),
        new("scan log of a reader", Reader, "Newest first", v => v.Opens("/scans")),
        new("new scan", Trainee, "What did you scan?", v => v.Opens("/scans/new")),
        new("new scan, application chosen", Trainee, "Views you have shown", v => v.Opens("/scans/new?application=cardiac")),
        new("new scan, all unfolded", Trainee, "Mechanical index", async v => { await v.Opens("/scans/new?application=cardiac"); await v.Unfolds("another time"); await v.UnfoldsApplications(); await v.Unfolds("More about this scan"); }),
        new("new scan with errors", Trainee, Attention, async v => { await v.Opens("/scans/new?application=efast"); await v.Presses("Submit for reading"); }),
        new("draft", Drafter, "nobody else sees it", Draft),
        new("edit a draft", Drafter, "Change a scan", async v => { await Draft(v); await v.Follows("Change it"); }),
        new("edit with errors", Drafter, Attention, async v => { await Draft(v); await v.Follows("Change it"); await v.Presses("Submit for reading"); }),
        new("own scan that waits", Trainee, "What the trainee saw", v => FirstScan(v, "Waiting")),
        new("own scan that was read", Trainee, "Both sets of answers", v => FirstScan(v, "Read")),
        new("scan that waits, to a reader", Reader, "stay closed until", v => FirstScan(v, "Waiting")),
        new("scan that waits, to a director", Director, "What the trainee saw", v => FirstScan(v, "Waiting")),
        new("own standing", Trainee, "Nearest gaps", v => v.Opens("/standings")),
        new("standings", Director, "What each trainee has", v => v.Opens("/standings")),
        new("cohort sheet", Director, "every notch stands at the same depth", v => v.Opens("/cohorts")),
        new("cohort sheet of a reader, later", Reader, "as known today", v => v.Opens("/cohorts?year=year%202&asOf=2199-01-01&days=14&order=Missing&former=true")),
        new("home of a coordinator", Coordinator, "What changed", v => v.Opens("/")),
        new("standing of a trainee", Director, "Nearest gaps", async v => { await v.Opens("/standings"); await v.Follows(Trainee); }),
        new("rulebook", Trainee, "Which scans count", async v => { await v.Opens("/standings"); await v.Follows("“Brindlemoor emergency”, version 4"); }),
        new("rulebooks", Director, "A published version stays", v => v.Opens("/rulebooks")),
        new("next rulebook", Coordinator, "Where it comes from", NextRulebook),
        new("next rulebook with errors", Coordinator, Attention, async v => { await NextRulebook(v); await v.Presses("Look at what it says"); }),
        new("next rulebook in words", Coordinator, "No longer there", async v => { await NextRulebook(v); await v.Page.GetByLabel("Template").SelectOptionAsync("acep-2016"); await v.Presses("Take the template"); }),
        new("catalogue", Trainee, "What can be scanned here", v => v.Opens("/applications")),
        new("catalogue of a coordinator", Coordinator, "Add a procedure", v => v.Opens("/applications")),
        new("application", Trainee, "Usual values are hints", async v => { await v.Opens("/applications"); await v.Follows("Lung"); }),
        new("application of a coordinator", Coordinator, "Retire it", async v => { await v.Opens("/applications"); await v.Follows("Lung"); }),
        new("new application with errors", Coordinator, Attention, async v => { await v.Opens("/applications/new"); await v.Presses("Add it to the catalogue"); }),
        new("new procedure", Coordinator, "whether its target was reached", v => v.Opens("/applications/new?kind=Procedure")),
        new("edit an application", Coordinator, "Add another question", async v => { await v.Opens("/applications"); await v.Follows("Extended trauma (eFAST)"); await v.Follows("Change it"); }),
        new("desk", Director, "Signed and standing", v => v.Opens("/grants")),
        new("grants of a trainee", Trainee, "Signed and standing", v => v.Opens("/grants")),
        new("evidence and signature", Director, "What exactly you sign", Evidence),
        new("signature with errors", Director, Attention, async v => { await Evidence(v); await v.Presses("Sign and seal"); }),
        new("signed grant", Trainee, "What was signed", async v => { await v.Opens("/grants"); await v.Follows(v.Page.Locator("section:has(#h-Active) .who").First); }),
        new("decline", Director, "the trainee is told", async v => { await Evidence(v); await v.Follows("Decline it, with a reason"); }),
        new("check a document", null, "Choose the PDF", v => v.Opens("/documents/checks")),
        new("check a number never issued", null, "We cannot confirm this document", v => v.Opens("/documents/checks?code=0000-0000-0000-0000-0000")),
        new("bench", Reader, "Image quality", v => v.Opens("/readings")),
        new("bench with errors", Reader, Attention, async v => { await v.Opens("/readings"); await v.Presses("Give this reading"); }),
        new("bench, all unfolded", Reader, "To the first question that is open", async v => { await v.Opens("/readings"); await v.Unfolds("Confirm or correct what was entered"); await v.Page.Keyboard.PressAsync("?"); }),
        new("return", Reader, "What is missing?", async v => { await v.Opens("/readings"); await v.Follows("Return it"); }),
        new("return with errors", Reader, Attention, async v => { await v.Opens("/readings"); await v.Follows("Return it"); await v.Presses("Return it to the trainee"); }),
        new("own scan that was withdrawn", Trainee, "it counts on no day", v => FirstScan(v, "Withdrawn")),
        new("withdraw a scan", Trainee, "A withdrawn scan counts on no day", async v => { await FirstScan(v, "Read"); await v.Follows("Withdraw it"); }),
        new("withdraw with errors", Trainee, Attention, async v => { await FirstScan(v, "Read"); await v.Follows("Withdraw it"); await v.Presses("Withdraw this scan"); }),
        new("remove a picture", Coordinator, "The picture is erased", async v => { await FirstScan(v, "Read"); await v.Follows("Remove picture 1"); }),
        new("remove with errors", Coordinator, Attention, async v => { await FirstScan(v, "Read"); await v.Follows("Remove picture 1"); await v.Presses("Remove this picture"); }),
        new("follow-ups", Director, "Discrepancies that touch", v => v.Opens("/follow-ups")),
        new("follow-up that is open", Director, "What it is about", OpenFollowUp),
        new("follow-up that is closed", Director, "They had seen it too.", async v => { await v.Opens("/follow-ups"); await v.Follows("Look at it"); }),
        new("close a follow-up", Director, "This closes the follow-up", async v => { await OpenFollowUp(v); await v.Follows("Write who was told"); }),
        new("close with errors", Director, Attention, async v => { await OpenFollowUp(v); await v.Follows("Write who was told"); await v.Presses("Close this follow-up"); }),
        new("scan that touches care, to its reader", Reader, "Correct your reading", OwnReading),
        new("correct a reading", Reader, "Why do you correct it?", async v => { await OwnReading(v); await v.Follows("Correct your reading"); }),
        new("correct with errors", Reader, Attention, async v => { await OwnReading(v); await v.Follows("Correct your reading"); await v.Presses("Correct this reading"); }),
        new("programmes", Administrator, "Found a programme", v => v.Opens("/programmes")),
        new("found a programme with errors", Administrator, Attention, async v => { await v.Opens("/programmes/new"); await v.Presses("Found it"); }),
        new("rename a programme", Administrator, "keep the name they were issued with", async v => { await v.Opens("/programmes"); await v.Follows(v.Page.GetByRole(AriaRole.Link, new() { Name = "Rename" }).First); }),
        new("administrators", Administrator, "They see no scans by it", v => v.Opens("/administrators")),
        new("appoint an administrator", Administrator, "its name stays", v => v.Opens("/administrators/new")),
        new("site", Administrator, "What holds for every programme here", v => v.GoesTo("Site")),
        new("people", Coordinator, "People of Emergency medicine", People),
        new("invite a person with errors", Coordinator, Attention, async v => { await People(v); await v.Follows("Invite a person"); await v.Presses("Save and invite"); }),
        new("invite a list, shown first", Coordinator, "What this list will do", async v => { await People(v); await v.Follows("Invite a list"); await v.Types("The list", "Tess, tess@demo.example, trainee, year 1"); await v.Presses("Show what it will do"); }),
        new("invite a list with faults", Coordinator, Attention, async v => { await People(v); await v.Follows("Invite a list"); await v.Types("The list", "Tess"); await v.Presses("Show what it will do"); }),
        new("a membership", Coordinator, "Weeks in which nothing is expected", async v => { await People(v); await v.Follows(Trainee); }),
        new("edit a membership", Coordinator, "opens nothing any more", async v => { await People(v); await v.Follows(Trainee); await v.Follows("Edit"); }),
        new("note a leave", Coordinator, "No reason is asked for", async v => { await People(v); await v.Follows(Trainee); await v.Follows("Note a leave"); }),
        new("link for a new password", Coordinator, "whoever is signed in with the old one", async v => { await People(v); await v.Follows(Trainee); await v.Follows("Make a link for a new password"); }),
        new("your account", Trainee, "Where you are signed in", v => v.Opens("/sessions")),
        new("change the password with errors", Trainee, Attention, async v => { await v.Opens("/sessions"); await v.Follows("Change your password"); await v.Presses("Change the password"); }),
        new("what does not exist", Trainee, "There is nothing here", v => v.Opens("/scans/none")),
    ];

    public static TheoryData<string> Names => [.. All.Select(p => p.Name)];

    public static async Task<Visitor> Reached(Demonstration site, string name)
    {
        var place = All.Single(p => p.Name == name);
        var visitor = await site.Visit(Screen.Desk, place.Who);
        await place.Reach(visitor);
        await Expect(visitor.Page.GetByRole(AriaRole.Main).GetByText(place.Shows).Filter(new() { Visible = true })).ToBeVisibleAsync();
        await visitor.Page.WaitForLoadStateAsync();
        return visitor;
    }

    private static async Task FirstScan(Visitor visitor, string state)
    {
        await visitor.Opens($"/scans?state={state}");
        await visitor.Follows(visitor.Page.GetByRole(AriaRole.Region, new() { Name = "Newest first" }).GetByRole(AriaRole.List).GetByRole(AriaRole.Link).First);
    }

    private static async Task OpenFollowUp(Visitor visitor)
    {
        await visitor.Opens("/follow-ups");
        await visitor.Follows("Open it");
    }

    private static async Task OwnReading(Visitor visitor)
    {
        await OpenFollowUp(visitor);
        await visitor.Follows("Open the scan");
    }

    private static async Task Evidence(Visitor visitor)
    {
        await visitor.Opens("/grants");
        await visitor.Follows(visitor.Page.GetByRole(AriaRole.Link, new() { Name = "Look at the evidence" }).First);
    }

    private static async Task People(Visitor visitor)
    {
        await visitor.GoesTo("People");
        await visitor.Follows(visitor.Page.GetByRole(AriaRole.Link, new() { Name = "Its people" }).First);
    }

    private static async Task NextRulebook(Visitor visitor)
    {
        await visitor.Opens("/rulebooks");
        await visitor.Follows("Write the next version");
    }

    private static async Task Draft(Visitor visitor)
    {
        await visitor.Opens("/scans/new");
        await visitor.ChoosesApplication("Abdominal aorta");
        await visitor.Attaches(Files.Picture());
        await visitor.Ticks("No name, number or date of a patient can be seen");
        await visitor.Presses("Keep as draft");
        await Expect(visitor.Page.GetByRole(AriaRole.Status)).ToHaveTextAsync("Kept as a draft");
    }
}
