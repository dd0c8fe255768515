using Credtrack.Core.Measures.Standings;

namespace Credtrack.Core.Rulebooks.Requirements;

/// <summary>A number of applications that are met, or, if <paramref name="AtLeast"/> is given, that have so many counting scans, met or not.</summary>
public sealed record ApplicationsMeeting(long Min, long? AtLeast) : Requirement
{
    public override string Kind => "applications";

    public override string Asks => Words(Min);

    public override RequirementStanding Measure(Basis basis)
    {
        var meeting = basis.Applications.Where(a => AtLeast is { } least ? a.Counted >= least : a.Met).Select(a => a.Code).ToHashSet(StringComparer.Ordinal);
        var value = meeting.Count;
        return new(this, value >= Min, value) { Behind = [.. basis.Counting.Where(scan => meeting.Contains(scan.Evidence.Application))], Min = Min, Missing = Math.Max(0, Min - value) };
    }

    public override string Lacks(RequirementStanding standing) => Words(standing.Missing ?? 0);

    private string Words(double number) => FormattableString.Invariant($"{number} {(number == 1 ? "application" : "applications")} ") + (AtLeast is { } least
        ? FormattableString.Invariant($"at {least} {(least == 1 ? "scan" : "scans")} or more") : "with all requirements met");

    internal static ApplicationsMeeting Read(JsonPart part)
    {
        var keys = part.Keys(["kind", "min", "meeting"]);
        var meeting = keys.Required("meeting");
        long? least = null;
        if (meeting is not null && !meeting.IsText(out _)) least = meeting.Keys(["count"]).Required("count")?.Whole(0) ?? 0;
        else if (meeting?.IsText("own") == false) meeting.Fault("expected \"own\" or an object with count");
        return new(keys.Required("min")?.Whole(0) ?? 0, least);
    }
}
