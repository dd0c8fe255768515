namespace Credtrack.Web.Features.Scans.Pictures;

/// <summary>
/// The stills on disk, each named by the SHA-256 of its bytes: <c>ab/abcd….jpg</c>. The name is no permission:
/// who may see a picture is asked of its scan. Only the owner of the process can read folder and files (Unix).
/// </summary>
public sealed class PictureFiles(string folder)
{
    private const UnixFileMode OwnersFile = UnixFileMode.UserRead | UnixFileMode.UserWrite;
    private const UnixFileMode OwnersFolder = OwnersFile | UnixFileMode.UserExecute;

    /// <summary>Stores the still; when the task ends, its bytes are on the disk. Storing it again changes nothing but its age.</summary>
    public async Task Keep(StillImage still)
    {
        var path = PathOf(still.Sha256);
        // One after the other: only the last folder of a path gets the permissions asked for.
        MakeFolder(folder);
        MakeFolder(Path.GetDirectoryName(path)!);
        var unfinished = $"{path}.{Path.GetRandomFileName()}";
        try
        {
            await using (var file = new FileStream(unfinished, NewFile()))
            {
                await file.WriteAsync(still.Bytes);
                file.Flush(flushToDisk: true);
            }
            // A name appears only with all its bytes: renaming within a folder is one step.
            File.Move(unfinished, path, overwrite: true);
        }
        finally
        {
            File.Delete(unfinished);
        }
    }

    /// <summary>The bytes of a still, for the caller to dispose, or null if it is not here.</summary>
    /// <exception cref="ArgumentException">The name is not 64 lower-case hexadecimal digits.</exception>
    public Stream? Open(string sha256)
    {
        var path = PathOf(sha256);
        return File.Exists(path) ? new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.Read | FileShare.Delete, 4096, useAsync: true) : null;
    }

    public bool Has(string sha256) => File.Exists(PathOf(sha256));

    /// <summary>Removes a still; one that is not here is already gone.</summary>
    /// <exception cref="ArgumentException">The name is not 64 lower-case hexadecimal digits.</exception>
    public void Erase(string sha256)
    {
        var path = PathOf(sha256);
        if (File.Exists(path)) File.Delete(path);
    }

    /// <summary>The names of the stills written before an instant. What a killed process left unfinished before then is removed on the way.</summary>
    public IEnumerable<string> OlderThan(DateTime utc)
    {
        if (!Directory.Exists(folder)) yield break;
        foreach (var path in Directory.EnumerateFiles(folder, "*", SearchOption.AllDirectories).Where(path => File.GetLastWriteTimeUtc(path) < utc))
        {
            if (path.EndsWith(".jpg", StringComparison.Ordinal)) yield return Path.GetFileNameWithoutExtension(path);
            else File.Delete(path);
        }
    }

    private string PathOf(string sha256) => sha256.Length == 64 && sha256.All(char.IsAsciiHexDigitLower)
        ? Path.Combine(folder, sha256[..2], $"{sha256}.jpg")
        : throw new ArgumentException("A still is named by 64 lower-case hexadecimal digits.", nameof(sha256));

    private static void MakeFolder(string path)
    {
        if (OperatingSystem.IsWindows()) Directory.CreateDirectory(path);
        else Directory.CreateDirectory(path, OwnersFolder);
    }

    private static FileStreamOptions NewFile()
    {
        var options = new FileStreamOptions { Mode = FileMode.CreateNew, Access = FileAccess.Write, Options = FileOptions.Asynchronous };
        if (!OperatingSystem.IsWindows()) options.UnixCreateMode = OwnersFile;
        return options;
    }
}
