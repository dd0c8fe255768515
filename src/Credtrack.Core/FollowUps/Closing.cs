using Credtrack.Core.People;
using Credtrack.Core.Plumbing;

namespace Credtrack.Core.FollowUps;

public enum Way { InPerson, Telephone, Message, Writing }

/// <summary>What is written when a follow-up is closed: who was told, by their part in the care, when and how.</summary>
public sealed record ClosingEntry(string Told, DateTime ToldAt, Way How, string? Remark)
{
    public const int LongestTold = 200;

    /// <summary>What cannot be so, each with the name of the value it is about. Forms know minutes, so the minute of the reading is not before it.</summary>
    public IEnumerable<(string About, string Why)> Faults(DateTime readAt, DateTime now)
    {
        if (string.IsNullOrWhiteSpace(Told)) yield return (nameof(Told), "Write who was told, by their part in the care.");
        else if (Told.Length > LongestTold) yield return (nameof(Told), "Keep it within 200 characters.");
        else if (FreeText.WhyNotKeep(Told) is { } why) yield return (nameof(Told), why);
        if (ToldAt > now) yield return (nameof(ToldAt), "This time has not come yet. Enter when they were told.");
        if (ToldAt < readAt.AddTicks(-(readAt.Ticks % TimeSpan.TicksPerMinute))) yield return (nameof(ToldAt), "This is before the reading. Enter when they were told what it found.");
        if (FreeText.WhyNotKeep(Remark) is { } whyNot) yield return (nameof(Remark), whyNot);
    }
}

/// <summary>The row that closes a follow-up.</summary>
public sealed class Closing
{
    public Guid FollowUpId { get; private init; }
    public Guid TraineeId { get; private init; }
    public Guid ById { get; private init; }
    public Person By { get; private init; } = null!;
    public DateTime At { get; private init; }
    public string Told { get; private init; } = "";
    public DateTime ToldAt { get; private init; }
    public Way How { get; private init; }
    public string? Remark { get; private init; }

    private Closing() { }

    internal Closing(FollowUp followUp, Person by, ClosingEntry entry, DateTime at)
    {
        (FollowUpId, TraineeId, ById, At) = (followUp.Id, followUp.TraineeId, by.Id, at);
        (Told, ToldAt, How, Remark) = (entry.Told, entry.ToldAt, entry.How, entry.Remark);
    }
}
