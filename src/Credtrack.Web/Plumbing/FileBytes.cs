namespace Credtrack.Web.Plumbing;

/// <summary>A file that somebody named on the command line.</summary>
public static class FileBytes
{
    /// <summary>The bytes, or null and a plain sentence that says why there are none.</summary>
    public static byte[]? Read(string path, out string? fault)
    {
        fault = null;
        if (Directory.Exists(path)) fault = "expected a file, but this is a folder";
        else if (!File.Exists(path)) fault = "expected a file, but there is none of this name";
        if (fault is not null) return null;
        try
        {
            return File.ReadAllBytes(path);
        }
        catch (Exception denied) when (denied is IOException or UnauthorizedAccessException)
        {
            fault = "expected a file that this program may read and that is not too large";
            return null;
        }
    }
}
