using Credtrack.Core.Readings;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Rulebooks;

/// <summary>The words of rulebooks and scan files, and what they mean: the one place that maps them. They compare exactly.</summary>
public static class RuleWords
{
    public static IReadOnlyDictionary<string, Role> Roles { get; } = new Dictionary<string, Role>
    {
        ["performed"] = Role.Performed, ["interpreted"] = Role.Interpreted,
    };

    public static IReadOnlyDictionary<string, Setting> Settings { get; } = new Dictionary<string, Setting>
    {
        ["clinical"] = Setting.Clinical, ["education"] = Setting.Education, ["simulation"] = Setting.Simulation,
    };

    public static IReadOnlyDictionary<string, Supervision> Supervisions { get; } = new Dictionary<string, Supervision>
    {
        ["direct"] = Supervision.Direct, ["later"] = Supervision.Later, ["none"] = Supervision.None,
    };

    public static IReadOnlyDictionary<string, Result> Results { get; } = new Dictionary<string, Result>
    {
        ["TP"] = Result.TP, ["TN"] = Result.TN, ["FP"] = Result.FP, ["FN"] = Result.FN, ["ID"] = Result.ID,
    };

    public static IReadOnlyDictionary<string, bool> YesNo { get; } = new Dictionary<string, bool> { ["yes"] = true, ["no"] = false };

    /// <summary>As people read it: the interface calls the setting education Teaching.</summary>
    public static string Said(Setting setting) => setting == Setting.Education ? "teaching" : setting.ToString().ToLowerInvariant();

    public static string Said(Role role) => role.ToString().ToLowerInvariant();

    /// <summary>As a value of its own: direct, later, none.</summary>
    public static string Named(Supervision supervision) => supervision.ToString().ToLowerInvariant();

    public static string Said(Supervision supervision) => supervision switch
    {
        Supervision.Direct => "directly supervised",
        Supervision.Later => "supervised later",
        _ => "unsupervised",
    };
}
