using Credtrack.Core.Imports;

namespace Credtrack.Data.Maps;

internal sealed class ImportMap : IEntityTypeConfiguration<Import>, IEntityTypeConfiguration<ImportStep>, IEntityTypeConfiguration<ImportFile>, IEntityTypeConfiguration<ImportedRow>
{
    public void Configure(EntityTypeBuilder<Import> import)
    {
        import.ToTable("Imports");
        import.Property(i => i.FileName).HasMaxLength(Import.LongestFileName);
        import.Property(i => i.Mapping).HasMaxLength(Import.LongestMapping);
        import.HasIndex(i => new { i.ProgrammeId, i.At });
        import.HasOne(i => i.By).WithMany().HasForeignKey(i => i.ById);
        import.HasOne(i => i.File).WithOne().HasForeignKey<ImportFile>(f => f.ImportId);
        import.HasMany(i => i.Steps).WithOne().HasForeignKey(s => s.ImportId);
        import.Navigation(i => i.By).AutoInclude();
        import.Navigation(i => i.Programme).AutoInclude();
        import.Navigation(i => i.Steps).AutoInclude();
    }

    public void Configure(EntityTypeBuilder<ImportStep> step)
    {
        step.ToTable("ImportSteps");
        step.HasKey(s => new { s.ImportId, s.Kind });
        step.HasOne(s => s.By).WithMany().HasForeignKey(s => s.ById);
        step.Navigation(s => s.By).AutoInclude();
    }

    public void Configure(EntityTypeBuilder<ImportFile> file)
    {
        file.ToTable("ImportFiles");
        file.HasKey(f => f.ImportId);
    }

    public void Configure(EntityTypeBuilder<ImportedRow> row)
    {
        row.ToTable("ImportedRows", t => t.HasCheckConstraint("CK_ImportedRows_not_ones_own", "\"AttestedById\" <> \"TraineeId\""));
        row.HasKey(r => r.ScanId);
        row.Property(r => r.Source).HasMaxLength(ImportedRow.LongestSource);
        row.Property(r => r.Key).HasMaxLength(64);
        row.Property(r => r.Assumed).HasMaxLength(ImportedRow.LongestAssumed);
        row.HasIndex(r => new { r.ProgrammeId, r.Key }).IsUnique();
        row.HasIndex(r => new { r.ImportId, r.Line }).IsUnique();
        row.HasOne(r => r.Import).WithMany().HasForeignKey(r => r.ImportId);
        row.HasOne(r => r.AttestedBy).WithMany().HasForeignKey(r => r.AttestedById);
        row.Navigation(r => r.AttestedBy).AutoInclude();
    }
}
