using Credtrack.Core.People;
using Credtrack.Core.Rulebooks;

namespace Credtrack.Core.Tests.Rulebooks;

public sealed class RulebookTests
{
    private const string Why = "Only this programme's director or coordinator publishes its rulebook.";

    private readonly Cast cast = new();

    [Theory]
    [InlineData(MembershipKind.Trainee, Why)]
    [InlineData(MembershipKind.Reader, Why)]
    [InlineData(MembershipKind.Chair, Why)]
    [InlineData(MembershipKind.Director, null)]
    [InlineData(MembershipKind.Coordinator, null)]
    public void Directors_and_coordinators_publish(MembershipKind kind, string? why)
    {
        var person = cast.Enrol("Olu", kind);
        if (why is not null) Refused.With(why, Rulebook.WhyNotPublish(person, cast.Programme), () => Publish(person));
        else Assert.Equal("Olu published Harbour rules, version 3, as the rulebook of Harbour.", Assert.Single(Publish(person).NewFacts).Sentence);
    }

    [Theory]
    [InlineData(MembershipKind.Director)]
    [InlineData(MembershipKind.Coordinator)]
    public void Nobody_publishes_for_another_programme(MembershipKind kind)
    {
        var person = cast.Enrol("Olu", cast.Elsewhere, kind);
        Refused.With(Why, Rulebook.WhyNotPublish(person, cast.Programme), () => Publish(person));
    }

    [Fact]
    public void An_edition_keeps_its_text_as_it_was_published()
    {
        var rulebook = Publish(cast.Director);
        Assert.Equal((cast.Programme.Id, "Harbour rules", 3, Book.Json("\"applications\": []"), Cast.Noon),
            (rulebook.ProgrammeId, rulebook.Name, rulebook.Edition, rulebook.Text, rulebook.PublishedAt));
    }

    private Rulebook Publish(Person by) => Rulebook.Publish(by, cast.Programme, "Harbour rules", 3, Book.Json("\"applications\": []"), Cast.Noon);
}
