using Credtrack.Core.Catalogue;
using Credtrack.Core.People;

namespace Credtrack.Data.Maps;

internal sealed class ApplicationMap : IEntityTypeConfiguration<Application>
{
    public void Configure(EntityTypeBuilder<Application> application)
    {
        application.ToTable("Applications");
        application.Property(a => a.Code).HasMaxLength(Codes.Longest);
        application.HasIndex(a => a.Code).IsUnique();
        application.Property(a => a.Name).HasMaxLength(ApplicationEntry.LongestName);
        // A name that is given up with a retired application may be borne by another one.
        application.HasIndex(a => a.Name).IsUnique().HasFilter("\"RetiredAt\" IS NULL");
        application.Property(a => a.Note).HasMaxLength(ApplicationEntry.LongestNote);
        application.HasOne<Person>().WithMany().HasForeignKey(a => a.RetiredById);
        application.Property(a => a.Views).AsText();
        application.Property(a => a.Questions).AsText();
        application.Property(a => a.Subtypes).AsText();
    }
}
