using System.Diagnostics;

namespace Credtrack.Web.Tests.Site;

/// <summary>A program of the system, run to its end: a second opinion that knows nothing of our code. What is missing fails the test.</summary>
public static class Tool
{
    /// <summary>What the program wrote; it must end well.</summary>
    public static string Says(string program, params string[] arguments)
    {
        var (code, said, complaint) = Run(program, arguments);
        Assert.True(code == 0, $"{program} {string.Join(' ', arguments)} ended with {code}:\n{said}\n{complaint}");
        return said;
    }

    /// <summary>How the program ended, what it wrote, and what it complained about.</summary>
    public static (int Code, string Output, string Error) Run(string program, params string[] arguments)
    {
        var places = Environment.GetEnvironmentVariable("PATH")!.Split(Path.PathSeparator);
        Assert.True(places.Append("").Any(place => File.Exists(Path.Combine(place, program))), $"{program} is not installed. The tests need these Debian packages: poppler-utils qpdf zbar-tools python3-pikepdf libnss3-tools openssl.");
        using var run = Process.Start(new ProcessStartInfo(program, arguments) { RedirectStandardOutput = true, RedirectStandardError = true })!;
        // Both ends are read at once: a full pipe would stop the program for ever.
        var complaint = run.StandardError.ReadToEndAsync();
        var said = run.StandardOutput.ReadToEnd();
        run.WaitForExit();
        return (run.ExitCode, said, complaint.Result);
    }
}
