using System.Text;
using System.Text.Unicode;

namespace Credtrack.Web.Plumbing;

/// <summary>A file as text, strictly UTF-8, without its byte order mark.</summary>
public static class FileText
{
    /// <summary>The text, or null and a plain sentence that says why there is none.</summary>
    public static string? Read(string path, out string? fault)
    {
        fault = null;
        if (Directory.Exists(path)) fault = "expected a file, but this is a folder";
        else if (!File.Exists(path)) fault = "expected a file, but there is none of this name";
        if (fault is not null) return null;
        try
        {
            var bytes = File.ReadAllBytes(path);
            if (Utf8.IsValid(bytes)) return Encoding.UTF8.GetString(bytes.AsSpan().StartsWith(Encoding.UTF8.Preamble) ? bytes.AsSpan(3) : bytes);
            fault = "expected text in UTF-8";
        }
        catch (Exception denied) when (denied is IOException or UnauthorizedAccessException)
        {
            fault = "expected a file that this program may read and that is not too large";
        }
        return null;
    }
}
