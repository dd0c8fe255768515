using Credtrack.Core.Catalogue;

namespace Credtrack.Data.Maps;

internal sealed class ApplicationMap : IEntityTypeConfiguration<Application>
{
    public void Configure(EntityTypeBuilder<Application> application)
    {
        application.ToTable("Applications");
        application.Property(a => a.Code).HasMaxLength(40);
        application.HasIndex(a => a.Code).IsUnique();
        application.Property(a => a.Name).HasMaxLength(80);
        application.Property(a => a.Note).HasMaxLength(500);
        application.Property(a => a.Views).AsText();
        application.Property(a => a.Questions).AsText();
        application.Property(a => a.Subtypes).AsText();
    }
}
