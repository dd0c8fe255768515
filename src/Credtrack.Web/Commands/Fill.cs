using Credtrack.Web.Features.SignIn.Demo;

namespace Credtrack.Web.Commands;

/// <summary>Commands that make or fill the database and end. Exit status 0, or 2 where they may not.</summary>
public static class Fill
{
    public static async Task<int> Migrate(string[] args, IServiceProvider services)
    {
        if (args.Length > 0) return await Refused($"{args[0]} is no option of migrate.");
        await services.Migrate();
        await Console.Out.WriteLineAsync("The database is up to date.");
        return 0;
    }

    /// <summary>With the demonstration everybody may sign in as anybody, so the settings allow it in Development alone.</summary>
    public static async Task<int> Demonstrate(string[] args, IServiceProvider services)
    {
        if (args.Length > 0) return await Refused($"{args[0]} is no option of demo.");
        if (!services.GetRequiredService<IHostEnvironment>().IsDevelopment()) return await Refused("The demonstration is for Development only: set DOTNET_ENVIRONMENT=Development.");
        await services.Migrate();
        await using var scope = services.CreateAsyncScope();
        if (await scope.ServiceProvider.GetRequiredService<CredtrackDb>().People.AnyAsync()) return await Refused("There are people here already; the demonstration fills an empty database only.");
        await DemoSite.Build(services);
        await Console.Out.WriteLineAsync("The database holds the demonstration now. Everything in it is invented.");
        return 0;
    }

    private static async Task<int> Refused(string why)
    {
        await Console.Error.WriteLineAsync(why);
        return 2;
    }
}
