namespace Credtrack.Core.Readings;

/// <summary>A reader put an own reading right: when, why, and what it said before. What it says now stands in the reading itself, and governs every day.</summary>
public sealed class Correction
{
    public Guid ReadingId { get; private init; }
    public int Number { get; private init; }
    public DateTime At { get; private init; }
    public string Reason { get; private init; } = "";
    public Judged Before { get; private init; } = null!;

    private Correction() { }

    internal Correction(Reading reading, int number, string reason, DateTime at) =>
        (ReadingId, Number, Before, Reason, At) = (reading.Id, number, reading.Now, reason, at);
}
