using System.Text.Json;
using Credtrack.Core.Catalogue;
using Credtrack.Core.People;

namespace Credtrack.Core.Tests.Catalogue;

public sealed class ApplicationChangeTests
{
    private const string Why = "Only a coordinator edits the catalogue.";

    private readonly Cast cast = new();
    private readonly Person coordinator;
    private readonly Application lung;
    private readonly ApplicationEntry entry;

    public ApplicationChangeTests()
    {
        (coordinator, lung) = (cast.Enrol("Cora", cast.Elsewhere, MembershipKind.Coordinator), cast["lung"]);
        lung.TakeFacts();
        entry = Editing.EntryOf(lung);
    }

    [Theory]
    [InlineData(MembershipKind.Trainee)]
    [InlineData(MembershipKind.Reader)]
    [InlineData(MembershipKind.Director)]
    [InlineData(MembershipKind.Chair)]
    public void Nobody_but_a_coordinator_edits_the_catalogue(MembershipKind kind)
    {
        var person = cast.Enrol("Olu", kind);
        Refused.With(Why, lung.WhyNotChange(person), () => lung.Change(person, entry, [], Cast.Noon));
        Refused.With(Why, lung.WhyNotRetire(person), () => lung.Retire(person, Cast.Noon));
        Refused.With(Why, lung.WhyNotBringBack(person, []), () => lung.BringBack(person, [], Cast.Noon));
        Refused.With(Why, Application.WhyNotAdd(person, []), () => Application.Add(person, "new", ApplicationKind.Diagnostic, entry, [], Cast.Noon));
    }

    [Fact]
    public void A_change_says_what_became_of_what()
    {
        lung.Change(coordinator, entry with
        {
            Name = "Lung and pleura",
            Transducer = "linear",
            DepthToMm = 120,
            FrequencyFromKhz = 2500,
            Note = "Ask Mrs Quillfeather.",
            Views = [entry.Views[0] with { Name = "Right, upper" }, entry.Views[1] with { Need = ViewNeed.Optional }, .. entry.Views.Skip(3), new("pleura", "Pleural line", ViewNeed.Required)],
            Questions = [entry.Questions[0] with { Positive = null }, entry.Questions[1] with { Text = "Three B-lines?" }, entry.Questions[3], new("point", "Lung point?", Answer.Yes)],
            Subtypes = ["base"],
        }, [lung], Cast.Noon);
        Assert.Equal("Cora changed the application: name from Lung to Lung and pleura; transducer from “curved or phased, or linear for the pleura” to “linear”; depth in mm from 30 to 160, now 30 to 120; "
            + "frequency in kHz from 2000 to 12000, now 2500 to 12000; another note; view “Right, base” removed; view “Right, anterior” now “Right, upper”, required; view “Right, lateral” from required to optional; "
            + "view “Pleural line” added, required; question “Consolidation?” removed; question “Lung sliding seen on both sides?” from positive with no to no positive answer; "
            + "question “Three or more B-lines in one space?” now “Three B-lines?”, positive with yes; question “Lung point?” added, positive with yes; part base added.", Assert.Single(lung.NewFacts).Sentence);
        Assert.Equal(("Lung and pleura", 120, "Three B-lines?"), (lung.Name, lung.DepthToMm, lung.Questions[1].Text));
    }

    [Fact]
    public void An_order_alone_is_a_change_too()
    {
        lung.Change(coordinator, entry with { Questions = [.. entry.Questions.Reverse()], Views = [.. entry.Views.Reverse()] }, [], Cast.Noon);
        Assert.Equal("Cora changed the application: views in another order; questions in another order.", Assert.Single(lung.NewFacts).Sentence);
    }

    [Fact]
    public void What_stays_as_it_is_leaves_no_fact()
    {
        lung.Change(coordinator, entry, [lung], Cast.Noon);
        Assert.Empty(lung.NewFacts);
    }

    [Fact]
    public void What_cannot_be_is_refused_whole()
    {
        Refused.With("Give the application a name.", () => lung.Change(coordinator, entry with { Name = "", DepthToMm = 100 }, [], Cast.Noon));
        Refused.With("Another application of the catalogue bears this name; choose another one.", () => lung.Change(coordinator, entry with { Name = "Focused cardiac" }, [lung, cast["cardiac"]], Cast.Noon));
        Assert.Equal(("Lung", 160), (lung.Name, lung.DepthToMm));
        Assert.Empty(lung.NewFacts);
    }

    [Fact]
    public void An_application_is_added_with_a_code_of_its_own()
    {
        var added = Application.Add(coordinator, "diaphragm", ApplicationKind.Diagnostic, entry with { Name = "Diaphragm" }, [lung], Cast.Noon);
        Assert.Equal(("diaphragm", "Diaphragm", ApplicationKind.Diagnostic, 160), (added.Code, added.Name, added.Kind, added.DepthToMm));
        Assert.Equal("Cora listed Diaphragm (diaphragm) in the catalogue.", Assert.Single(added.NewFacts).Sentence);
        lung.Retire(coordinator, Cast.Noon);
        foreach (var (code, why) in new[] { ("lung", "Another application has this code; a retired one keeps its own too."), ("Lung 2", "Write the code in small letters, digits and single hyphens, such as arrest-echo, within 40 characters.") })
            Refused.With(why, Application.WhyNotCode(code, [lung]), () => Application.Add(coordinator, code, ApplicationKind.Diagnostic, entry with { Name = "Diaphragm" }, [lung], Cast.Noon));
        var full = Enumerable.Repeat(lung, Application.MostApplications).ToList();
        Refused.With("A catalogue holds 200 applications at most.", Application.WhyNotAdd(coordinator, full), () => Application.Add(coordinator, "full", ApplicationKind.Diagnostic, entry with { Name = "Full" }, full, Cast.Noon));
    }

    [Fact]
    public void A_retired_application_is_changed_only_after_it_was_brought_back()
    {
        lung.Retire(coordinator, Cast.Noon);
        Assert.Equal((Cast.Noon, coordinator.Id, true), (lung.RetiredAt!.Value, lung.RetiredById!.Value, lung.IsRetired));
        Refused.With("Lung is retired; bring it back before you change it.", lung.WhyNotChange(coordinator), () => lung.Change(coordinator, entry, [], Cast.Noon));
        Refused.With("Lung is already retired.", lung.WhyNotRetire(coordinator), () => lung.Retire(coordinator, Cast.Noon));
        lung.BringBack(coordinator, [lung, cast["cardiac"]], Cast.Noon);
        Assert.False(lung.IsRetired);
        Refused.With("Lung is not retired.", lung.WhyNotBringBack(coordinator, []), () => lung.BringBack(coordinator, [], Cast.Noon));
        Assert.Equal(["Cora retired Lung: it is no longer offered for new scans.", "Cora brought Lung back into the catalogue."], lung.NewFacts.Select(f => f.Sentence));
    }

    [Fact]
    public void A_name_that_was_taken_meanwhile_keeps_the_retired_one_away()
    {
        lung.Retire(coordinator, Cast.Noon);
        cast["cardiac"].Change(coordinator, Editing.EntryOf(cast["cardiac"]) with { Name = "LUNG" }, [lung], Cast.Noon);
        Refused.With("Another application bears the name Lung now; give that one another name first.", lung.WhyNotBringBack(coordinator, [cast["cardiac"]]), () => lung.BringBack(coordinator, [cast["cardiac"]], Cast.Noon));
    }

    [Theory]
    [InlineData("x")]
    [InlineData("“")]
    [InlineData("Ж")]
    [InlineData("🫀")]
    public void The_largest_change_fits_into_the_ledger(string letter)
    {
        lung.Change(coordinator, Editing.Largest(letter, "old"), [], Cast.Noon);
        lung.Change(coordinator, Editing.Largest(letter, "new"), [], Cast.Noon);
        var scan = cast.Draft(Cast.Entry(lung));
        scan.Change(cast.Trainee, Cast.Entry(lung) with { ViewsShown = [], Answers = new Dictionary<string, Answer>() }, [], [], Cast.Noon);
        Assert.All(lung.NewFacts.Concat(scan.NewFacts), fact =>
        {
            Assert.InRange(fact.Sentence.Length, 1, 4000); // the columns of the ledger
            Assert.InRange(JsonSerializer.Serialize(fact, fact.GetType()).Length, 1, 8000);
        });
    }
}
