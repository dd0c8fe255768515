using Credtrack.Core.Catalogue;
using Credtrack.Core.People;

namespace Credtrack.Core.Tests.Catalogue;

public sealed class ApplicationEntryTests
{
    private readonly Cast cast = new();
    private ApplicationEntry Lung => Editing.EntryOf(cast["lung"]);
    private ApplicationEntry Line => Editing.EntryOf(cast["cvc"]);

    public static TheoryData<string> Codes => [.. CatalogueEntry.Shipped.Select(e => e.Code)];

    [Theory, MemberData(nameof(Codes))]
    public void What_is_shipped_could_have_been_typed(string code) => Assert.Empty(Editing.EntryOf(cast[code]).Faults(cast[code].Kind, []));

    [Theory]
    [InlineData("Name", "Give the application a name.")]
    [InlineData("Transducer", "Name the usual transducer, such as: curved or linear.")]
    [InlineData("DepthFromMm", "Give the depth in cm, from 0.5 to 40.")]
    [InlineData("DepthToMm", "Give a depth greater than the one it starts from.")]
    [InlineData("FrequencyToKhz", "Give the frequency in MHz, from 0.5 to 60.")]
    [InlineData("Note", "Write it in one line, without control characters.")]
    [InlineData("Views[0].Name", "Name at least one view that is required, or a group of which one suffices.")]
    [InlineData("Views[1].Name", "This view is already there; name each view once.")]
    [InlineData("Views[0].Group", "A group has two views or more: name another view of this group, or make this one required.")]
    [InlineData("Views[2].Group", "Only one of a group has a group: choose that, or empty this.")]
    [InlineData("Views[3].Group", "Name the group of which one view suffices, such as heart.")]
    [InlineData("Views[20].Name", "An application has 20 views at most; empty the ones beyond.")]
    [InlineData("Questions[0].Text", "Ask at least one question that has a positive answer: it gives a scan its result.")]
    [InlineData("Questions[1].Text", "This question is already there; ask each one once.")]
    [InlineData("Questions[2].Text", "Keep it within 120 characters.")]
    [InlineData("Questions[3].Text", "Say what is asked; this question cannot go.")]
    [InlineData("Questions[1].Positive", "Choose yes, no or neither as the positive answer.")]
    [InlineData("Subtypes[1]", "This part is already there; name each one once.")]
    [InlineData("Subtypes[0]", "Write the part in small letters, digits and single hyphens, such as long-bone, within 40 characters.")]
    public void What_cannot_be_is_named_with_its_place_and_its_remedy(string about, string why) =>
        Assert.Contains((about, why), Wrong(about, why).Faults(ApplicationKind.Diagnostic, []));

    [Fact]
    public void A_name_is_borne_once_among_those_that_are_not_retired()
    {
        Assert.Equal([("Name", "Another application of the catalogue bears this name; choose another one.")], (Lung with { Name = "focused CARDIAC" }).Faults(ApplicationKind.Diagnostic, [cast["cardiac"]]));
        cast["cardiac"].Retire(cast.Enrol("Cora", MembershipKind.Coordinator), Cast.Noon);
        Assert.Empty((Lung with { Name = "Focused cardiac" }).Faults(ApplicationKind.Diagnostic, [cast["cardiac"]]));
    }

    [Fact]
    public void A_procedure_asks_for_its_target_and_its_other_questions_are_notes()
    {
        Assert.Contains(("Questions[0].Text", "A procedure always asks whether the target was reached."), (Line with { Questions = [Line.Questions[1]] }).Faults(ApplicationKind.Procedure, []));
        Assert.Contains(("Questions[1].Text", "A question of a procedure has no positive answer."), (Line with { Questions = [Line.Questions[0], Line.Questions[1] with { Positive = Answer.Yes }] }).Faults(ApplicationKind.Procedure, []));
        Assert.Empty((Line with { Questions = [Line.Questions[0] with { Text = "Is the line in?" }] }).Faults(ApplicationKind.Procedure, []));
    }

    private ApplicationEntry Wrong(string about, string why) => about switch
    {
        "Name" => Lung with { Name = "" },
        "Transducer" => Lung with { Transducer = "" },
        "DepthFromMm" => Lung with { DepthFromMm = 4 },
        "DepthToMm" => Lung with { DepthToMm = Lung.DepthFromMm },
        "FrequencyToKhz" => Lung with { FrequencyToKhz = 60_001 },
        "Note" => Lung with { Note = "two\nlines" },
        "Views[0].Name" => Lung with { Views = [Lung.Views[0] with { Need = ViewNeed.Optional }] },
        "Views[1].Name" => Lung with { Views = [Lung.Views[0], Lung.Views[1] with { Name = Lung.Views[0].Name.ToUpperInvariant() }] },
        "Views[0].Group" => Lung with { Views = [Lung.Views[0] with { Need = ViewNeed.OneOf, Group = "one" }, Lung.Views[1]] },
        "Views[2].Group" => Lung with { Views = [Lung.Views[0], Lung.Views[1], Lung.Views[2] with { Group = "one" }] },
        "Views[3].Group" => Lung with { Views = [.. Lung.Views.Take(3), Lung.Views[3] with { Need = ViewNeed.OneOf }] },
        "Views[20].Name" => Lung with { Views = [.. Enumerable.Range(0, 21).Select(n => new View($"v{n}", $"View {n}", ViewNeed.Required))] },
        "Questions[0].Text" => Lung with { Questions = [Lung.Questions[0] with { Positive = null }] },
        "Questions[1].Text" => Lung with { Questions = [Lung.Questions[0], new("another", Lung.Questions[0].Text.TrimEnd('?'), Answer.Yes)] },
        "Questions[2].Text" => Lung with { Questions = [Lung.Questions[0], Lung.Questions[1], new("long", new string('x', 121), null)] },
        "Questions[3].Text" => Lung with { Questions = [.. Lung.Questions.Take(3), new("none", "", null)] },
        "Questions[1].Positive" => Lung with { Questions = [Lung.Questions[0], Lung.Questions[1] with { Positive = Answer.Unclear }] },
        "Subtypes[1]" => Lung with { Subtypes = ["left", "left"] },
        "Subtypes[0]" => Lung with { Subtypes = ["Left side"] },
        _ => throw new ArgumentException(why, nameof(about)),
    };
}
