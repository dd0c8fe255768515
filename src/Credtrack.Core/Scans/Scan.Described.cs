using System.Globalization;
using Credtrack.Core.Plumbing;

namespace Credtrack.Core.Scans;

public sealed partial class Scan
{
    internal const string Own = "scan";

    /// <summary>What the ledger says of a change: name and value, in order. Free text is named, never quoted. A text of the catalogue may be alike to a name of ours, so each has its kind.</summary>
    private List<(string Kind, string Name, string Value)> Described =>
    [
        (Own, "application", ApplicationId.ToString()),
        (Own, "part", Subtype ?? "none"),
        (Own, "time performed", PerformedAt.ToString("yyyy-MM-dd HH:mm:ss.FFF 'UTC'", CultureInfo.InvariantCulture)),
        (Own, "role", Role.ToString()),
        (Own, "setting", Setting.ToString()),
        (Own, "clinically indicated", Said(Indicated)),
        (Own, "supervision", Supervision.ToString()),
        (Own, "supervisor", SupervisorId?.ToString() ?? "none"),
        (Own, "hands-on help", Said(Assisted)),
        (Own, "transducer", Settings.Transducer?.ToString() ?? "none"),
        (Own, "depth in mm", Said(Settings.DepthMm)),
        (Own, "frequency in kHz", Said(Settings.FrequencyKhz)),
        (Own, "mechanical index in hundredths", Said(Settings.MechanicalIndex)),
        (Own, "thermal index in hundredths", Said(Settings.ThermalIndex)),
        (Own, "note", Note ?? ""),
        .. Views.Select(v => ("view", $"view {v.Name}", v.Marked ? "shown" : "not shown")),
        .. Answers.Select(a => ("question", a.Text.TrimEnd('?'), a.Given?.ToString() ?? "open")),
    ];

    internal static string Difference(List<(string Kind, string Name, string Value)> before, List<(string Kind, string Name, string Value)> after) => TextLine.Listed(
        from now in after
        let then = before.FirstOrDefault(b => (b.Kind, b.Name) == (now.Kind, now.Name)).Value
        where then != now.Value
        select now is (Own, "note" or "application" or "supervisor" or "feedback", _) ? $"another {now.Name}"
            : then is null ? $"{now.Name}: {now.Value}"
            : $"{now.Name} from {then} to {now.Value}");

    internal static string Said(bool yes) => yes ? "yes" : "no";
    private static string Said(int? number) => number?.ToString(CultureInfo.InvariantCulture) ?? "none";
}
