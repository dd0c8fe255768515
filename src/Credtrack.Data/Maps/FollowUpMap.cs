using Credtrack.Core.FollowUps;
using Credtrack.Core.People;
using Credtrack.Core.Plumbing;

namespace Credtrack.Data.Maps;

internal sealed class FollowUpMap : IEntityTypeConfiguration<FollowUp>, IEntityTypeConfiguration<Closing>
{
    public void Configure(EntityTypeBuilder<FollowUp> followUp)
    {
        followUp.ToTable("FollowUps", t => t.HasCheckConstraint("CK_FollowUps_not_ones_own", "\"OpenedById\" <> \"TraineeId\""));
        followUp.Ignore(f => f.IsOpen);
        followUp.HasIndex(f => f.ScanId, "IX_FollowUps_one_open").IsUnique().HasFilter("\"ClosedAt\" IS NULL");
        followUp.HasIndex(f => f.ScanId, "IX_FollowUps_ScanId");
        followUp.HasIndex(f => new { f.ProgrammeId, f.ClosedAt });
        followUp.HasOne(f => f.Scan).WithMany().HasForeignKey(f => f.ScanId);
        followUp.HasOne(f => f.OpenedBy).WithMany().HasForeignKey(f => f.OpenedById);
        followUp.HasOne<Programme>().WithMany().HasForeignKey(f => f.ProgrammeId);
        followUp.HasOne<Person>().WithMany().HasForeignKey(f => f.TraineeId);
        followUp.HasOne(f => f.Closing).WithOne().HasForeignKey<Closing>(c => c.FollowUpId);
        followUp.Navigation(f => f.Closing).AutoInclude();
    }

    public void Configure(EntityTypeBuilder<Closing> closing)
    {
        closing.ToTable("Closings", t => t.HasCheckConstraint("CK_Closings_not_ones_own", "\"ById\" <> \"TraineeId\""));
        closing.HasKey(c => c.FollowUpId);
        closing.Property(c => c.Told).HasMaxLength(ClosingEntry.LongestTold);
        closing.Property(c => c.Remark).HasMaxLength(FreeText.Longest);
        closing.HasOne(c => c.By).WithMany().HasForeignKey(c => c.ById);
        closing.HasOne<Person>().WithMany().HasForeignKey(c => c.TraineeId);
        closing.Navigation(c => c.By).AutoInclude();
    }
}
