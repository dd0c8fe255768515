using Credtrack.Core.Catalogue;
using Credtrack.Core.People;
using Credtrack.Core.Plumbing;

namespace Credtrack.Core.Scans;

/// <summary>What a trainee says of a scan, before it is tied to a person and a moment.</summary>
public sealed record ScanEntry(
    Application Application, string? Subtype, DateTime PerformedAt, Role Role, Setting Setting, bool Indicated,
    Supervision Supervision, Person? Supervisor, bool Assisted, MachineSettings Settings, string? Note,
    IReadOnlyCollection<string> ViewsShown, IReadOnlyDictionary<string, Answer> Answers)
{
    public const int LongestNote = 1000;

    /// <summary>Before it nobody scanned at a bedside (from memory); a year of two digits ends up far before it.</summary>
    public const int EarliestYear = 1950;

    /// <summary>What cannot be so, each with the name of the value it is about.</summary>
    /// <param name="changed">the scan that this changes, if it is no new one: what it has already, it keeps</param>
    public IEnumerable<(string About, string Why)> Faults(Guid traineeId, Guid programmeId, DateTime now, Scan? changed = null)
    {
        if (Application.IsRetired && changed?.Has(Application) != true) yield return (nameof(Application), $"{Application.Name} is retired; choose another application.");
        if (PerformedAt > now) yield return (nameof(PerformedAt), "This time has not come yet. Enter when the scan was performed.");
        if (PerformedAt.Year < EarliestYear) yield return (nameof(PerformedAt), "This is too long ago. Check the year.");
        if (Subtype is not null && !(changed?.PartsUnder(Application) ?? Application.Subtypes).Contains(Subtype)) yield return (nameof(Subtype), $"Choose a part that belongs to {Application.Name}, or none.");
        if (Supervision == Supervision.Direct && Supervisor is null && changed is not { Imported.Supervision: Supervision.Direct, SupervisorId: null }) yield return (nameof(Supervisor), "Name the person who supervised at the bedside.");
        if (Supervisor?.Id == traineeId) yield return (nameof(Supervisor), "Nobody supervises themselves.");
        else if (Supervisor is not null && !Supervisor.Is(MembershipKind.Reader, programmeId)) yield return (nameof(Supervisor), "Choose a reader of this programme.");
        if (Note?.Length > LongestNote) yield return (nameof(Note), $"Keep the note within {LongestNote} characters.");
        if (FreeText.WhyNotName(Note) is { } named) yield return (nameof(Note), named);
        foreach (var fault in Settings.Faults()) yield return fault;
    }
}

/// <summary>As the machine showed them; each may be missing.</summary>
/// <param name="DepthMm">depth in millimetres</param>
/// <param name="FrequencyKhz">transmitted frequency in kilohertz</param>
/// <param name="MechanicalIndex">in hundredths, no unit</param>
/// <param name="ThermalIndex">in hundredths, no unit</param>
public sealed record MachineSettings(Transducer? Transducer, int? DepthMm, int? FrequencyKhz, int? MechanicalIndex, int? ThermalIndex)
{
    public static MachineSettings None { get; } = new(null, null, null, null, null);

    /// <summary>Wide limits of what a diagnostic machine can show (from memory: MI up to 1.9 and TI up to 6.0 are the usual regulatory display limits).</summary>
    internal IEnumerable<(string About, string Why)> Faults()
    {
        if (DepthMm is < 5 or > 400) yield return (nameof(DepthMm), "Give the depth in cm, from 0.5 to 40.");
        if (FrequencyKhz is < 500 or > 60_000) yield return (nameof(FrequencyKhz), "Give the frequency in MHz, from 0.5 to 60.");
        if (MechanicalIndex is < 0 or > 300) yield return (nameof(MechanicalIndex), "Give the mechanical index as the machine shows it, from 0 to 3.");
        if (ThermalIndex is < 0 or > 1000) yield return (nameof(ThermalIndex), "Give the thermal index as the machine shows it, from 0 to 10.");
    }
}

public enum Transducer { Curved, Linear, Phased, Endocavity, Transoesophageal }
