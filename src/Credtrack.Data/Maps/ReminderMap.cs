using Credtrack.Core.People;
using Credtrack.Core.Reminders;

namespace Credtrack.Data.Maps;

internal sealed class ReminderMap : IEntityTypeConfiguration<Reminder>
{
    public void Configure(EntityTypeBuilder<Reminder> reminder)
    {
        reminder.ToTable("Reminders");
        reminder.Property(r => r.Period).HasMaxLength(Reminder.LongestPeriod);
        reminder.HasIndex(r => new { r.PersonId, r.Kind, r.SubjectId, r.Period }).IsUnique();
        reminder.HasIndex(r => r.MadeAt);
        reminder.HasOne<Person>().WithMany().HasForeignKey(r => r.PersonId);
    }
}
