using System.Globalization;
using Credtrack.Core.Measures.Standings;

namespace Credtrack.Core.Rulebooks;

public enum Fit { No, Open, Yes }

/// <summary>Conditions that must all hold, in the order in which a reason is looked for.</summary>
/// <param name="Read">The key read: null is not given, which is true; false admits unread scans.</param>
public sealed record Filter(IReadOnlyList<Condition> Conditions, bool? Read = null)
{
    private bool AsksReading => (Read ?? true) || Conditions.Any(c => c.OfReading);

    /// <summary>Yes; no with the first condition that fails; or open, which only a reading can settle.</summary>
    public Fit For(SeenScan scan, out Condition? failed)
    {
        failed = Conditions.FirstOrDefault(c => (scan.IsRead || !c.OfReading) && !c.Holds(scan));
        return failed is not null ? Fit.No : !scan.IsRead && AsksReading ? Fit.Open : Fit.Yes;
    }

    public bool Matches(SeenScan scan) => For(scan, out _) == Fit.Yes;

    public bool MayMatch(SeenScan scan) => For(scan, out _) != Fit.No;

    /// <summary>This filter laid over another key by key: a key given here replaces, a key in <paramref name="removed"/> goes.</summary>
    public Filter Over(Filter below, IReadOnlySet<string> removed)
    {
        var kept = below.Conditions.Where(c => !removed.Contains(c.Key) && Conditions.All(own => own.Key != c.Key));
        return new([.. kept.Concat(Conditions).OrderBy(c => FilterReader.PlaceOf(c.Key))], Read ?? (removed.Contains("read") ? null : below.Read));
    }

    /// <summary>"1 positive scan", "5 teaching scans of image quality 3 or better".</summary>
    public string Scans(double number) => $"{number.ToString(CultureInfo.InvariantCulture)} {Phrase(number == 1 ? "scan" : "scans")}";

    /// <summary>"positive scans", "teaching scans of image quality 3 or better".</summary>
    public string Phrase(string noun) =>
        string.Join(' ', [.. Conditions.Select(c => c.Before).OfType<string>(), noun, .. Conditions.Select(c => c.After).OfType<string>()]);

    /// <summary>The conditions alone: "positive, of image quality 3 or better"; "read" if there are none, and "read or not" if not even that.</summary>
    public string Words => Conditions.Count > 0 ? string.Join(", ", Conditions.Select(c => c.Before ?? c.After)) : AsksReading ? "read" : "read or not";
}
