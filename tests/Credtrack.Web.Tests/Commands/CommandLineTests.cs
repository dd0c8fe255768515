namespace Credtrack.Web.Tests.Commands;

/// <summary>The built program itself.</summary>
public sealed class CommandLineTests : IDisposable
{
    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("credtrack-line-");

    [Fact]
    public void An_unknown_word_gets_the_list_and_status_2()
    {
        var (code, output, error) = Run("Production", "improt");
        Assert.Equal((2, ""), (code, output));
        Assert.StartsWith("improt is no command.\nusage: dotnet Credtrack.Web.dll [COMMAND]\n", error, StringComparison.Ordinal);
        var (helped, list, _) = Run("Production", "--help");
        Assert.Equal((0, error["improt is no command.\n".Length..]), (helped, list));
        Assert.All("migrate demo import invite evaluate check verify".Split(' '), word => Assert.Contains($"\n  {word}", list, StringComparison.Ordinal));
        Assert.Matches(@"^credtrack \d+\.\d+", Run("Production", "--version").Output);
        Assert.Empty(folder.EnumerateFileSystemInfos());
    }

    [Fact]
    public void Migrate_makes_the_database_and_the_demonstration_fills_it_in_development_only()
    {
        Assert.Equal((0, "The database is up to date.\n", ""), Run("Production", "migrate"));
        Assert.Equal((2, "", "The demonstration is for Development only: set DOTNET_ENVIRONMENT=Development.\n"), Run("Production", "demo"));
        Assert.Equal((2, "", "x is no option of migrate.\n"), Run("Production", "migrate", "x"));
        Assert.Equal((0, "The database holds the demonstration now. Everything in it is invented.\n", ""), Run("Development", "demo"));
        Assert.Equal((2, "", "There are people here already; the demonstration fills an empty database only.\n"), Run("Development", "demo"));
    }

    private (int Code, string Output, string Error) Run(string environment, params string[] words) => Tool.Run("env", ["-C", folder.FullName, $"DOTNET_ENVIRONMENT={environment}", $"ASPNETCORE_ENVIRONMENT={environment}", "Demo__On=false",
        "Database__Provider=Sqlite", "ConnectionStrings__Credtrack=Data Source=site.db", "Pictures__Folder=pictures", "Seal__Certificate=seal/seal.pfx", "PublicAddress=http://localhost", "Paper=A4", "dotnet", typeof(Program).Assembly.Location, .. words]);

    public void Dispose() => folder.Delete(recursive: true);
}
