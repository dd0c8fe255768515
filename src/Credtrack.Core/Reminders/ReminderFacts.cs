using Credtrack.Core.People;

namespace Credtrack.Core.Reminders;

// Nobody did these; a schedule did. They are told of the person whom they concern.

public sealed record ReminderMade(Person By, DateTime At, ReminderKind Kind, string Period) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} is to be reminded ({Kind}) in {Period}.";
}

public sealed record ReminderSent(Person By, DateTime At, ReminderKind Kind, string Period) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} was sent a letter with the reminder ({Kind}) of {Period}.";
}
