using Credtrack.Core.Catalogue;
using Credtrack.Migrations.Sqlite;

namespace Credtrack.Web.Tests.Site;

/// <summary>A migrated database with a site, its catalogue and the person who set it up; each class of tests works on a copy of the file.</summary>
public static class BlankSite
{
    private static readonly DirectoryInfo Temporary = Directory.CreateTempSubdirectory("credtrack-");
    private static readonly Lazy<string> Blank = new(Make);

    public static string Folder => Temporary.FullName;

    public static string NewCopy()
    {
        var copy = NewFile();
        File.Copy(Blank.Value, copy);
        return copy;
    }

    public static string NewFile() => Path.Combine(Folder, $"{Guid.NewGuid():N}.db");

    private static string Make()
    {
        AppDomain.CurrentDomain.ProcessExit += (_, _) => Temporary.Delete(recursive: true);
        var blank = NewFile();
        var options = new DbContextOptionsBuilder<CredtrackDb>();
        SqliteStore.Use(options, $"Data Source={blank};Pooling=False");
        using var db = new CredtrackDb(options.Options);
        db.Database.Migrate();
        var at = new DateTime(2026, 1, 1, 0, 0, 0, DateTimeKind.Utc);
        var founder = Person.Enrol("Founder", null, at);
        db.AddRange(founder, Credtrack.Core.People.Site.Found(founder, "Test site", "Europe/Dublin", at));
        db.AddRange(CatalogueEntry.Shipped.Select(entry => Application.List(founder, entry, at)));
        db.SaveChangesAsync().GetAwaiter().GetResult();
        return blank;
    }
}
