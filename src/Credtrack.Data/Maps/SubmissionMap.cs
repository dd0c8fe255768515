using Credtrack.Core.People;
using Credtrack.Core.Plumbing;
using Credtrack.Core.Scans;

namespace Credtrack.Data.Maps;

internal sealed class SubmissionMap : IEntityTypeConfiguration<Submission>, IEntityTypeConfiguration<Return>, IEntityTypeConfiguration<Withdrawal>
{
    public void Configure(EntityTypeBuilder<Submission> submission)
    {
        submission.ToTable("Submissions");
        submission.HasKey(s => new { s.ScanId, s.Number });
        submission.HasIndex(s => s.At);
        submission.HasOne(s => s.Return).WithOne().HasForeignKey<Return>(r => new { r.ScanId, r.Number });
        submission.Navigation(s => s.Return).AutoInclude();
    }

    public void Configure(EntityTypeBuilder<Return> back)
    {
        back.ToTable("Returns");
        back.HasKey(r => new { r.ScanId, r.Number });
        back.Property(r => r.Missing).HasMaxLength(1000);
        back.HasOne(r => r.Reader).WithMany().HasForeignKey(r => r.ReaderId);
        back.Navigation(r => r.Reader).AutoInclude();
    }

    public void Configure(EntityTypeBuilder<Withdrawal> withdrawal)
    {
        withdrawal.ToTable("Withdrawals");
        withdrawal.HasKey(w => w.ScanId);
        withdrawal.Property(w => w.Reason).HasMaxLength(FreeText.Longest);
        withdrawal.HasOne<Person>().WithMany().HasForeignKey(w => w.ById);
    }
}
