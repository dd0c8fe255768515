namespace Credtrack.Web.Features.Cohorts;

/// <summary>Within a year group: by name, or the most scans missing first.</summary>
public enum CohortOrder { Name, Missing }

/// <summary>AsOf: the day; Programme: whose trainees; Year: their year group; Days: after how many without a counting scan one stalls; Former: also those who have left.</summary>
public sealed record CohortQuery(DateOnly? AsOf = null, Guid? Programme = null, string? Year = null, int Days = CohortQuery.UsualDays, CohortOrder Order = CohortOrder.Name, bool Former = false, int Page = 1)
{
    public const int UsualDays = 30;

    /// <summary>A method: a property of its own kind would be bound and validated without end.</summary>
    public CohortQuery Bounded() => this with { Days = Math.Clamp(Days, 1, 365), Page = Math.Clamp(Page, 1, 10_000), Year = string.IsNullOrWhiteSpace(Year) ? null : Year };

    /// <summary>The same trainees, as it stands in an address.</summary>
    public string Trainees => $"programme={Programme}&asOf={AsOf?.Iso()}" + (Year is null ? "" : $"&year={Uri.EscapeDataString(Year)}") + (Former ? "&former=true" : "");

    public string Address => $"~/cohorts?{Trainees}&days={Days}&order={Order}";
}
