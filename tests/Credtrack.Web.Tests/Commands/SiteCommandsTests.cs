using Credtrack.Web.Tests.Features.Documents.Seals;

namespace Credtrack.Web.Tests.Commands;

/// <summary>The built program itself, in a folder of its own in which nothing may appear.</summary>
public sealed class SiteCommandsTests : IDisposable
{
    private const string NoDatabase = "There is no database here: see ConnectionStrings:Credtrack, or start the program once, which makes it.\n";
    private const string Old = "The database is not that of this version: start the program once, which brings it up to date.\n";

    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("credtrack-commands-");

    [Theory]
    [InlineData("check")]
    [InlineData("verify")]
    public void Without_a_database_a_command_ends_with_one_sentence_and_makes_nothing(string command)
    {
        Assert.Equal((2, "", NoDatabase), Run(command));
        Assert.Equal((2, "", NoDatabase), Run(command, database: Path.Combine("no-folder", "site.db")));
    }

    [Theory]
    [InlineData("check")]
    [InlineData("verify")]
    public void On_a_database_that_was_never_migrated_it_says_so(string command)
    {
        using (var connection = new Microsoft.Data.Sqlite.SqliteConnection($"Data Source={Path.Combine(folder.FullName, "site.db")};Pooling=False"))
        {
            connection.Open();
            using var table = new Microsoft.Data.Sqlite.SqliteCommand("PRAGMA journal_mode = WAL; CREATE TABLE Other (Id INTEGER)", connection);
            table.ExecuteNonQuery();
        }
        Assert.Equal((2, "", Old), Run(command));
    }

    [Fact]
    public void Where_nothing_was_sealed_yet_no_key_is_made_for_a_check()
    {
        File.Copy(BlankSite.NewCopy(), Path.Combine(folder.FullName, "site.db"));
        Assert.Equal((2, "", $"There is no certificate of the seal, {Path.Combine(folder.FullName, "seal", "seal.pfx")}: this site has sealed nothing yet.\n"), Run("check"));
        Assert.Equal(0, Run("verify").Code);
    }

    private (int Code, string Output, string Error) Run(string command, string database = "site.db")
    {
        var asked = Path.Combine(folder.FullName, "asked.pdf");
        File.WriteAllBytes(asked, PlainPdf.Make());
        var before = Entries();
        var answer = Tool.Run("env", ["-C", folder.FullName, "Database__Provider=Sqlite", $"ConnectionStrings__Credtrack=Data Source={Path.Combine(folder.FullName, database)}", "Pictures__Folder=pictures", "Seal__Certificate=seal/seal.pfx", "PublicAddress=http://localhost", "Paper=A4",
            "dotnet", typeof(Program).Assembly.Location, command, .. command == "check" ? new[] { asked } : []]);
        Assert.Equal(before, Entries());
        return answer;
    }

    private List<string> Entries() => [.. Directory.EnumerateFileSystemEntries(folder.FullName, "*", SearchOption.AllDirectories).Order()];

    public void Dispose() => folder.Delete(recursive: true);
}
