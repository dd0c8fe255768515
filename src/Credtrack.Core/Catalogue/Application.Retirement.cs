using Credtrack.Core.People;

namespace Credtrack.Core.Catalogue;

public sealed partial class Application
{
    public DateTime? RetiredAt { get; private set; }
    public Guid? RetiredById { get; private set; }
    public bool IsRetired => RetiredAt is not null;

    public string? WhyNotRetire(Person by) =>
          !by.Is(MembershipKind.Coordinator) ? OnlyCoordinators
        : IsRetired ? $"{Name} is already retired."
        : null;

    /// <summary>Not offered any more. What there is of it, scans, standings, grants and rulebooks, goes on as before.</summary>
    public void Retire(Person by, DateTime at)
    {
        RuleBroken.If(WhyNotRetire(by));
        (RetiredAt, RetiredById) = (at, by.Id);
        Record(new ApplicationRetired(by, at, Name));
    }

    /// <param name="catalogue">all applications, this one among them or not</param>
    public string? WhyNotBringBack(Person by, IEnumerable<Application> catalogue) =>
          !by.Is(MembershipKind.Coordinator) ? OnlyCoordinators
        : !IsRetired ? $"{Name} is not retired."
        : catalogue.Any(a => a.Id != Id && !a.IsRetired && string.Equals(a.Name, Name, StringComparison.OrdinalIgnoreCase)) ? $"Another application bears the name {Name} now; give that one another name first."
        : null;

    public void BringBack(Person by, IEnumerable<Application> catalogue, DateTime at)
    {
        RuleBroken.If(WhyNotBringBack(by, catalogue));
        (RetiredAt, RetiredById) = (null, null);
        Record(new ApplicationBroughtBack(by, at, Name));
    }
}
