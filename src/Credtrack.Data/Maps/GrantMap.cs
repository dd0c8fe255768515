using Credtrack.Core.Grants;
using Credtrack.Core.People;

namespace Credtrack.Data.Maps;

internal sealed class GrantMap : IEntityTypeConfiguration<Grant>, IEntityTypeConfiguration<Signature>, IEntityTypeConfiguration<Decline>, IEntityTypeConfiguration<Ending>, IEntityTypeConfiguration<Document>
{
    public void Configure(EntityTypeBuilder<Grant> grant)
    {
        grant.ToTable("Grants");
        grant.Ignore(g => g.Signature);
        grant.HasIndex(g => g.HolderId); // the next one leaves out, in one database, what is over
        grant.HasIndex(g => new { g.HolderId, g.ProgrammeId, g.ApplicationId, g.IsOpen }).IsUnique();
        grant.HasOne(g => g.Holder).WithMany().HasForeignKey(g => g.HolderId);
        grant.HasOne(g => g.ProposedBy).WithMany().HasForeignKey(g => g.ProposedById);
        grant.HasOne(g => g.Decline).WithOne().HasForeignKey<Decline>(d => d.GrantId);
        grant.HasOne(g => g.Ending).WithOne().HasForeignKey<Ending>(e => e.GrantId);
        grant.HasMany(g => g.Signatures).WithOne().HasForeignKey(s => s.GrantId);
        grant.HasMany(g => g.Documents).WithOne().HasForeignKey(d => d.GrantId);
        grant.Navigation(g => g.Decline).AutoInclude();
        grant.Navigation(g => g.Ending).AutoInclude();
        grant.Navigation(g => g.Signatures).AutoInclude();
    }

    public void Configure(EntityTypeBuilder<Signature> signature)
    {
        signature.ToTable("Signatures", t => t.HasCheckConstraint("CK_Signatures_not_ones_own", "\"SignerId\" <> \"HolderId\""));
        signature.Ignore(s => s.Gap);
        signature.Property(s => s.GapSalt).HasMaxLength(SealedText.SaltLength);
        signature.HasKey(s => new { s.GrantId, s.Place });
        signature.HasOne(s => s.Signer).WithMany().HasForeignKey(s => s.SignerId);
        signature.Property(s => s.GapReason).HasMaxLength(Grant.LongestReason);
        signature.Property(s => s.Text).HasMaxLength(Signature.LongestText);
        signature.Property(s => s.Digest).HasMaxLength(64);
        signature.Navigation(s => s.Signer).AutoInclude();
    }

    public void Configure(EntityTypeBuilder<Decline> decline)
    {
        decline.ToTable("Declines");
        decline.HasKey(d => d.GrantId);
        decline.Property(d => d.ReasonSalt).HasMaxLength(SealedText.SaltLength);
        decline.Property(d => d.Reason).HasMaxLength(Grant.LongestReason);
        decline.HasOne(d => d.By).WithMany().HasForeignKey(d => d.ById);
        decline.Navigation(d => d.By).AutoInclude();
    }

    public void Configure(EntityTypeBuilder<Ending> ending)
    {
        ending.ToTable("Endings");
        ending.HasKey(e => e.GrantId);
        ending.Property(e => e.ReasonSalt).HasMaxLength(SealedText.SaltLength);
        ending.Property(e => e.Reason).HasMaxLength(Grant.LongestReason);
        ending.HasOne(e => e.By).WithMany().HasForeignKey(e => e.ById);
        ending.Navigation(e => e.By).AutoInclude();
    }

    public void Configure(EntityTypeBuilder<Document> document)
    {
        document.ToTable("Documents");
        document.Property(d => d.Code).HasMaxLength(40);
        document.Property(d => d.Sha256).HasMaxLength(64);
        document.HasIndex(d => d.Code).IsUnique();
        document.HasIndex(d => d.Sha256).IsUnique();
        document.HasIndex(d => d.GrantId).IsUnique();
    }
}
