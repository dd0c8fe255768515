using System.Diagnostics;

namespace Credtrack.Web.Tests.Site;

/// <summary>A program of somebody else, by which our work is checked. One that is missing fails the test.</summary>
public static class Tool
{
    public static (int Code, string Output, string Error) Run(string program, params string[] arguments)
    {
        using var process = Process.Start(new ProcessStartInfo(program, arguments) { RedirectStandardOutput = true, RedirectStandardError = true })!;
        var (output, error) = (process.StandardOutput.ReadToEndAsync(), process.StandardError.ReadToEndAsync());
        process.WaitForExit();
        return (process.ExitCode, output.GetAwaiter().GetResult(), error.GetAwaiter().GetResult());
    }
}
