using System.Globalization;

namespace Credtrack.Core.Scans;

public sealed partial class Scan
{
    /// <summary>What the ledger says of a change: name and value, in order. Free text is named, never quoted.</summary>
    private List<(string Name, string Value)> Described =>
    [
        ("application", ApplicationId.ToString()),
        ("part", Subtype ?? "none"),
        ("time performed", PerformedAt.ToString("yyyy-MM-dd HH:mm:ss.FFF 'UTC'", CultureInfo.InvariantCulture)),
        ("role", Role.ToString()),
        ("setting", Setting.ToString()),
        ("clinically indicated", Said(Indicated)),
        ("supervision", Supervision.ToString()),
        ("supervisor", SupervisorId?.ToString() ?? "none"),
        ("hands-on help", Said(Assisted)),
        ("transducer", Settings.Transducer?.ToString() ?? "none"),
        ("depth in mm", Said(Settings.DepthMm)),
        ("frequency in kHz", Said(Settings.FrequencyKhz)),
        ("mechanical index in hundredths", Said(Settings.MechanicalIndex)),
        ("thermal index in hundredths", Said(Settings.ThermalIndex)),
        ("note", Note ?? ""),
        .. Views.Select(v => ($"view {v.Name}", v.Marked ? "shown" : "not shown")),
        .. Answers.Select(a => (a.Text.TrimEnd('?'), a.Given?.ToString() ?? "open")),
    ];

    internal static string Difference(List<(string Name, string Value)> before, List<(string Name, string Value)> after) => string.Join("; ",
        from now in after
        let then = before.FirstOrDefault(b => b.Name == now.Name).Value
        where then != now.Value
        select now.Name is "note" or "application" or "supervisor" or "feedback" ? $"another {now.Name}"
            : then is null ? $"{now.Name}: {now.Value}"
            : $"{now.Name} from {then} to {now.Value}");

    internal static string Said(bool yes) => yes ? "yes" : "no";
    private static string Said(int? number) => number?.ToString(CultureInfo.InvariantCulture) ?? "none";
}
