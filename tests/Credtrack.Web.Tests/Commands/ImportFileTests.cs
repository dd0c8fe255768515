using Credtrack.Web.Commands;
using Credtrack.Web.Tests.Features.Imports;
using Microsoft.Extensions.DependencyInjection;

namespace Credtrack.Web.Tests.Commands;

public sealed class ImportFileTests(RunningSite site) : IClassFixture<RunningSite>, IDisposable
{
    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("credtrack-import-");

    [Fact]
    public async Task It_shows_what_it_will_do_saves_with_yes_and_again_adds_nothing()
    {
        var world = await site.NewWorld();
        var by = World.AddressOf(await world.Coordinator());
        var csv = Importing.Table(world.Row("1", world.Trainee.Name), world.Row("2", "Newcomer Two", rest: ",,,,"));
        const string told = "rows that become scans: 2\nrows that are here already: 0\nrows left out: 0\npeople enrolled without sign-in: Newcomer Two\ncells that take a default: 5\n";
        Assert.Equal((0, told + "Nothing is saved yet: with --yes it is.\n", ""), await Run(world, csv, by));
        Assert.Equal(0, await site.Ask(db => db.Imports.CountAsync(i => i.ProgrammeId == world.Programme.Id)));
        Assert.Equal((0, told + "Imported.\n", ""), await Run(world, csv, by, "--yes"));
        Assert.Equal(2, await world.Evidence());
        var (code, output, error) = await Run(world, csv, by, "--yes");
        Assert.Equal((0, ""), (code, error));
        Assert.EndsWith("Nothing of this file would be added.\n", output, StringComparison.Ordinal);
        Assert.Equal(2, await world.Evidence());
    }

    [Fact]
    public async Task Every_fault_is_one_line_with_status_2_and_nothing_is_saved()
    {
        var world = await site.NewWorld();
        var by = World.AddressOf(await world.Coordinator());
        var file = Path.Combine(folder.FullName, "log.csv");
        var csv = Importing.Table(world.Row("1", world.Trainee.Name, reading: "{0},6,yes,TN"), world.Row("2", world.Trainee.Name, reading: "{0},4,yes,"), world.Row("2", world.Trainee.Name));
        await Answers($"{file}:2: quality: expected one of 1, 2, 3, 4, 5\n{file}:4: scan: expected each scan once\n", csv);
        await Answers($"{file}: Say what “FAST” means under “Application”.\nWhat is said of a file on the import page is remembered for the next one.\n", Importing.Table(world.Row("3", world.Trainee.Name, "FAST")));
        Assert.Equal(0, await site.Ask(db => db.Imports.CountAsync(i => i.ProgrammeId == world.Programme.Id)));

        async Task Answers(string faults, string csv) => Assert.Equal((2, "", faults), await Run(world, csv, by, "--yes"));
    }

    [Fact]
    public async Task Wrong_use_and_those_who_may_not_are_told_so()
    {
        var world = await site.NewWorld();
        var csv = Importing.Table(world.Row("1", world.Trainee.Name));
        foreach (var person in new[] { world.Trainee, world.Reader, world.Director })
            Assert.Equal((2, "", "Only this programme's coordinators import scans.\n"), await Run(world, csv, World.AddressOf(person), "--yes"));
        Assert.Equal((2, "", "Nobody here has the address nobody@tests.example.\n"), await Run(world, csv, "nobody@tests.example"));
        var output = new StringWriter();
        Assert.Equal(2, await ImportFile.Run(["--by", "x", "a.csv"], TextWriter.Null, output, site.Services));
        Assert.Equal($"--programme NAME is needed.\n{ImportOptions.Usage}\n", output.ToString());
        Assert.Equal(0, await world.Evidence());
    }

    private async Task<(int Code, string Output, string Error)> Run(World world, string csv, string by, params string[] more)
    {
        var file = Path.Combine(folder.FullName, "log.csv");
        await File.WriteAllTextAsync(file, csv);
        var (output, error) = (new StringWriter(), new StringWriter());
        await using var scope = site.Services.CreateAsyncScope();
        return (await ImportFile.Run(["--programme", world.Programme.Name, "--by", by, file, .. more], output, error, scope.ServiceProvider), output.ToString(), error.ToString());
    }

    public void Dispose() => folder.Delete(recursive: true);
}
