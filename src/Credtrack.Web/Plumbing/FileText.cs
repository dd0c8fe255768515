using System.Text;
using System.Text.Unicode;

namespace Credtrack.Web.Plumbing;

/// <summary>A file as text, strictly UTF-8, without its byte order mark.</summary>
public static class FileText
{
    /// <summary>The text, or null and a plain sentence that says why there is none.</summary>
    public static string? Read(string path, out string? fault)
    {
        if (FileBytes.Read(path, out fault) is not { } bytes) return null;
        if (Utf8.IsValid(bytes)) return Encoding.UTF8.GetString(bytes.AsSpan().StartsWith(Encoding.UTF8.Preamble) ? bytes.AsSpan(3) : bytes);
        fault = "expected text in UTF-8";
        return null;
    }
}
