namespace Credtrack.Web.Plumbing;

/// <summary>
/// A file that only the owner of the process can read (Unix), alone in a folder of its own. The folder appears by one renaming, with the
/// whole file in it, because that is the one step which fails on every file system for all but the first.
/// </summary>
public static class SecretFile
{
    private const UnixFileMode Owners = UnixFileMode.UserRead | UnixFileMode.UserWrite;
    private const UnixFileMode Strangers = UnixFileMode.OtherRead | UnixFileMode.OtherWrite;

    /// <summary>True if this call made the file; false if it was there already or somebody else was faster.</summary>
    /// <exception cref="InvalidOperationException">Other things lie in the folder.</exception>
    public static bool Create(string path, byte[] bytes)
    {
        var folder = Path.GetDirectoryName(Path.GetFullPath(path))!;
        if (File.Exists(path)) return false;
        if (Directory.Exists(folder))
        {
            if (Directory.EnumerateFileSystemEntries(folder).Any())
                return File.Exists(path) ? false : throw Settings.Wrong($"{path} is to be made in a folder of its own, and {folder} holds other things.");
            Directory.Delete(folder);
        }
        var unfinished = $"{folder}.{Path.GetRandomFileName()}";
        try
        {
            Write(unfinished, Path.GetFileName(path), bytes);
            Directory.Move(unfinished, folder);
            return true;
        }
        catch (IOException) when (File.Exists(path))
        {
            return false;
        }
        finally
        {
            if (Directory.Exists(unfinished)) Directory.Delete(unfinished, recursive: true);
        }
    }

    /// <summary>A file that the owner of the process alone can read (Unix).</summary>
    public static FileStream New(string path)
    {
        var options = new FileStreamOptions { Mode = FileMode.Create, Access = FileAccess.Write };
        if (!OperatingSystem.IsWindows()) options.UnixCreateMode = Owners;
        return new FileStream(path, options);
    }

    /// <summary>A folder that the owner of the process alone can read (Unix), made if there is none.</summary>
    public static void Folder(string path)
    {
        if (OperatingSystem.IsWindows()) Directory.CreateDirectory(path);
        else if (!Directory.Exists(path)) Directory.CreateDirectory(path, Owners | UnixFileMode.UserExecute);
    }

    /// <summary>Whether everybody on this machine may read or change the file (Unix).</summary>
    public static bool IsOpenToAll(string path) => !OperatingSystem.IsWindows() && (File.GetUnixFileMode(path) & Strangers) != 0;

    private static void Write(string folder, string name, byte[] bytes)
    {
        var options = new FileStreamOptions { Mode = FileMode.CreateNew, Access = FileAccess.Write };
        if (OperatingSystem.IsWindows())
        {
            Directory.CreateDirectory(folder);
        }
        else
        {
            Directory.CreateDirectory(folder, Owners | UnixFileMode.UserExecute);
            options.UnixCreateMode = Owners;
        }
        using var file = new FileStream(Path.Combine(folder, name), options);
        file.Write(bytes);
        file.Flush(flushToDisk: true);
    }
}
