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

    [Fact]
    public void The_next_edition_follows_the_one_in_force()
    {
        var third = Publish(cast.Director);
        Assert.Null(Rulebook.WhyNotPublishNext(cast.Director, cast.Programme, null, 1));
        Assert.Equal(4, Rulebook.PublishNext(cast.Director, cast.Programme, third, 4, "Harbour rules", third.Text, Cast.Noon).Edition);
        foreach (var edition in new[] { 3, 5 })
        {
            Refused.With($"Version {edition} cannot be published: version 3 is in force by now. Look at what differs from it.", Rulebook.WhyNotPublishNext(cast.Director, cast.Programme, third, edition),
                () => Rulebook.PublishNext(cast.Director, cast.Programme, third, edition, "Harbour rules", third.Text, Cast.Noon));
        }
        Refused.With(Why, Rulebook.WhyNotPublishNext(cast.Trainee, cast.Programme, third, 4), () => Rulebook.PublishNext(cast.Trainee, cast.Programme, third, 4, "Harbour rules", third.Text, Cast.Noon));
    }

    [Theory]
    [InlineData("\"name\": \"two\\nlines\",", "$.name: expected a text in one line, without control characters and marks that turn its direction")]
    [InlineData("\"name\": \"\",", "$.name: expected a text that is not empty")]
    public void An_edition_has_a_name_of_one_line(string name, string fault) =>
        Assert.Equal(fault, Assert.Single(Rulebook.Read(Book.Json("\"applications\": []").Replace("\"name\": \"Harbour\",", name, StringComparison.Ordinal), "UTC").Faults).ToString());

    [Fact]
    public void A_text_that_is_too_long_is_not_even_read()
    {
        var read = Rulebook.Read(new string('[', Rulebook.LongestText + 1), "UTC");
        Assert.Equal("$: expected at most 200,000 characters, found 200,001", Assert.Single(read.Faults).ToString());
        Assert.Null(read.Rules);
    }

    private Rulebook Publish(Person by) => Rulebook.Publish(by, cast.Programme, "Harbour rules", 3, Book.Json("\"applications\": []"), Cast.Noon);
}
