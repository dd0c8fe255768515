using Credtrack.Web.Features.Scans.Pictures;

namespace Credtrack.Web.Tests.Features.Scans.Pictures;

public sealed class PictureFilesTests : IDisposable
{
    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("pictures");

    public void Dispose() => folder.Delete(recursive: true);

    [Fact]
    public async Task A_still_comes_back_byte_by_byte_under_its_digest()
    {
        var (files, still) = (new PictureFiles(folder.FullName), await Still());
        Assert.Null(files.Open(still.Sha256));
        await files.Keep(still);
        Assert.Equal(still.Bytes, Read(files, still));
        Assert.Equal([Path.Combine(still.Sha256[..2], $"{still.Sha256}.jpg")], Names());
    }

    [Fact]
    public async Task The_same_still_is_stored_once_even_at_the_same_time()
    {
        var (files, still) = (new PictureFiles(folder.FullName), await Still());
        await Task.WhenAll(Enumerable.Range(0, 8).Select(_ => Task.Run(() => files.Keep(still))));
        await files.Keep(still);
        Assert.Single(Names());
        Assert.Equal(still.Bytes, Read(files, still));
    }

    [Fact]
    public async Task Only_the_owner_can_read_what_is_stored()
    {
        // Windows has no permission bits.
        if (OperatingSystem.IsWindows()) return;
        await new PictureFiles(Path.Combine(folder.FullName, "made")).Keep(await Still());
        var others = ~(UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute);
        Assert.All(folder.EnumerateFileSystemInfos("*", SearchOption.AllDirectories), found => Assert.Equal(UnixFileMode.None, found.UnixFileMode & others));
    }

    [Fact]
    public async Task A_write_that_fails_leaves_nothing_behind()
    {
        var still = await Still();
        // A folder in the place of the file makes the renaming fail.
        Directory.CreateDirectory(Path.Combine(folder.FullName, still.Sha256[..2], $"{still.Sha256}.jpg"));
        await Assert.ThrowsAnyAsync<Exception>(() => new PictureFiles(folder.FullName).Keep(still));
        Assert.Empty(Names());
    }

    [Fact]
    public async Task An_erased_still_is_gone_and_may_be_erased_again()
    {
        var (files, still) = (new PictureFiles(folder.FullName), await Still());
        await files.Keep(still);
        files.Erase(still.Sha256);
        Assert.Null(files.Open(still.Sha256));
        files.Erase(still.Sha256);
        Assert.Empty(Names());
    }

    [Theory]
    [InlineData("")]
    [InlineData("../../../../../etc/passwd")]
    [InlineData("abcdef")]
    [InlineData("0123456789ABCDEF0123456789abcdef0123456789abcdef0123456789abcdef")]
    [InlineData("0123456789abcdef0123456789abcdef0123456789abcdef0123456789abcde/")]
    [InlineData("0123456789abcdef0123456789abcdef0123456789abcdef0123456789abcdef0")]
    public void Any_other_name_is_refused(string name)
    {
        var files = new PictureFiles(folder.FullName);
        Assert.Throws<ArgumentException>(() => files.Open(name));
        Assert.Throws<ArgumentException>(() => files.Erase(name));
    }

    private IEnumerable<string> Names() => folder.EnumerateFiles("*", SearchOption.AllDirectories).Select(f => Path.GetRelativePath(folder.FullName, f.FullName));

    private static byte[] Read(PictureFiles files, StillImage still)
    {
        using var stored = files.Open(still.Sha256)!;
        using var copy = new MemoryStream();
        stored.CopyTo(copy);
        return copy.ToArray();
    }

    private static async Task<StillImage> Still() => (await StillImage.From(SentFiles.Png())).Still!;
}
