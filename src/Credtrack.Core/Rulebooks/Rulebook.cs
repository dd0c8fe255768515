using Credtrack.Core.People;
using Credtrack.Core.Plumbing;

namespace Credtrack.Core.Rulebooks;

/// <summary>A published edition of a programme's thresholds. It is never edited: a change is the next edition, and a decision keeps the one it was judged by.</summary>
public sealed class Rulebook : Recorded
{
    public const int LongestText = 200_000, LongestName = 200;

    public Guid ProgrammeId { get; private init; }
    public Programme Programme { get; private init; } = null!;
    public int Edition { get; private init; }
    public string Name { get; private init; } = "";
    public string Text { get; private init; } = "";
    public DateTime PublishedAt { get; private init; }

    private Rulebook() { }

    /// <summary>The rules in a text that is to be published, or all that is wrong with it. An edition has a name that can stand in a line.</summary>
    /// <param name="text">in the format credtrack-rulebook/1</param>
    /// <param name="timeZone">the zone of the site, which holds where the text names none</param>
    public static RulesRead Read(string text, string timeZone)
    {
        if (text.Length > LongestText) return new(null, [new Fault("$", FormattableString.Invariant($"expected at most {LongestText:N0} characters, found {text.Length:N0}"))], null);
        var read = RulesReader.Read(text, timeZone);
        return read.Rules is { } rules && TextLine.WhyNot(rules.Name, LongestName) is not null
            ? read with { Rules = null, Faults = [new Fault("$.name", $"expected one line of at most {LongestName} characters, without control characters")] }
            : read;
    }

    public static string? WhyNotPublish(Person by, Programme programme) =>
        by.Is(MembershipKind.Director, programme.Id) || by.Is(MembershipKind.Coordinator, programme.Id)
            ? null : "Only this programme's director or coordinator publishes its rulebook.";

    /// <param name="inForce">the latest edition; null before the first</param>
    /// <param name="edition">the one that was looked at before it is published</param>
    public static string? WhyNotPublishNext(Person by, Programme programme, Rulebook? inForce, int edition) =>
        WhyNotPublish(by, programme) ?? (edition == (inForce?.Edition ?? 0) + 1 ? null : $"Version {edition} cannot be published: version {inForce?.Edition ?? 0} is in force by now. Look at what differs from it.");

    public static Rulebook PublishNext(Person by, Programme programme, Rulebook? inForce, int edition, string name, string text, DateTime at)
    {
        RuleBroken.If(WhyNotPublishNext(by, programme, inForce, edition));
        return Publish(by, programme, name, edition, text, at);
    }

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
