using Credtrack.Core.People;

namespace Credtrack.Core.Rulebooks;

/// <summary>A published edition of a programme's thresholds. It is never edited: a change is the next edition, and a decision keeps the one it was judged by.</summary>
public sealed class Rulebook : Recorded
{
    public const int LongestText = 200_000;

    public Guid ProgrammeId { get; private init; }
    public Programme Programme { get; private init; } = null!;
    public int Edition { get; private init; }
    public string Name { get; private init; } = "";
    public string Text { get; private init; } = "";
    public DateTime PublishedAt { get; private init; }

    private Rulebook() { }

    public static string? WhyNotPublish(Person by, Programme programme) =>
        by.Is(MembershipKind.Director, programme.Id) || by.Is(MembershipKind.Coordinator, programme.Id)
            ? null : "Only this programme's director or coordinator publishes its rulebook.";

    /// <param name="text">a rulebook in the format credtrack-rulebook/1, read without a fault</param>
    public static Rulebook Publish(Person by, Programme programme, string name, int edition, string text, DateTime at)
    {
        RuleBroken.If(WhyNotPublish(by, programme));
        var rulebook = new Rulebook
        {
            Id = Guid.CreateVersion7(at),
            ProgrammeId = programme.Id,
            Edition = edition,
            Name = name,
            Text = text,
            PublishedAt = at,
        };
        rulebook.Record(new RulebookPublished(by, at, name, edition, programme.Name));
        return rulebook;
    }
}

public sealed record RulebookPublished(Person By, DateTime At, string Name, int Edition, string Programme) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} published {Name}, version {Edition}, as the rulebook of {Programme}.";
}
