using System.Globalization;
using Credtrack.Core.People;

namespace Credtrack.Core.FollowUps;

public sealed record FollowUpOpened(Person By, DateTime At) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} opened a follow-up: a discrepancy touches the patient's care.";
}

public sealed record FollowUpClosed(Person By, DateTime At, DateTime ToldAt, Way How) : Fact(By, At)
{
    public override string Sentence => string.Create(CultureInfo.InvariantCulture, $"{By.Name} closed the follow-up: told at {ToldAt:yyyy-MM-dd HH:mm} UTC ({How}), and wrote who was told.");
}
