using System.Globalization;
using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;
using Credtrack.Web.Features.Shared.Figures;

namespace Credtrack.Web.Plumbing;

/// <summary>Which fill stands beside which word, decided once.</summary>
public static class Signs
{
    public static SwatchKind Swatch(this ScanState state) => state switch
    {
        ScanState.Draft or ScanState.Imported => SwatchKind.Draft,
        ScanState.Waiting => SwatchKind.Hatch,
        ScanState.Returned => SwatchKind.Back,
        ScanState.Read => SwatchKind.Solid,
        _ => SwatchKind.Gone,
    };

    public static SwatchKind Swatch(this Verdict verdict) => verdict switch
    {
        Verdict.Counts => SwatchKind.Solid,
        Verdict.Pending => SwatchKind.Hatch,
        _ => SwatchKind.None,
    };

    public static SwatchKind Swatch(this Result result) => result is Result.TP or Result.TN ? SwatchKind.Solid : result == Result.ID ? SwatchKind.Over : SwatchKind.None;

    public static string Printed(this Verdict verdict) => verdict switch
    {
        Verdict.Counts => "counts",
        Verdict.Pending => "is pending",
        _ => "does not count",
    };

    public static string PrintedTogether(this Result result) => result switch
    {
        Result.TP or Result.TN => $"agree, {result.Printed()}",
        Result.ID => "the trainee was unsure",
        _ => $"differ, {result.Printed()}",
    };

    /// <summary>Of a procedure the codes are a mere encoding of reached and not reached.</summary>
    public static string PrintedOfProcedure(this Result result) => result switch
    {
        Result.TP or Result.TN => "target reached",
        Result.ID => "not settled",
        _ => "target not reached",
    };

    public static string Printed(this MachineSettings settings)
    {
        string?[] said =
        [
            settings.Transducer?.ToString(),
            settings.FrequencyKhz is { } khz ? $"{khz.Scaled(1000)} MHz" : null,
            settings.DepthMm is { } mm ? $"depth {mm.Scaled(10)} cm" : null,
            settings.MechanicalIndex is { } mi ? $"MI {(mi / 100m).ToString("0.0#", CultureInfo.InvariantCulture)}" : null,
            settings.ThermalIndex is { } ti ? $"TI {(ti / 100m).ToString("0.0#", CultureInfo.InvariantCulture)}" : null,
        ];
        var known = said.OfType<string>().ToList();
        return known.Count == 0 ? "not noted" : string.Join(", ", known);
    }
}
