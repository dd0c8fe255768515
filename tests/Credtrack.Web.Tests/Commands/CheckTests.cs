using System.Security.Cryptography;
using Credtrack.Web.Commands;
using Credtrack.Web.Features.Documents.Seals;
using Credtrack.Web.Tests.Features.Documents.Seals;

namespace Credtrack.Web.Tests.Commands;

public sealed class CheckTests : IDisposable
{
    private static readonly byte[] Whole = SealPress.Press();

    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("credtrack-check-");

    [Fact]
    public async Task By_the_certificate_alone_it_says_what_it_does_not_know()
    {
        var pem = Write("seal.pem", System.Text.Encoding.ASCII.GetBytes(SealPress.Certificate.Trust.Pem));
        var file = Write("a.pdf", Whole);
        var (code, output, error) = await Run(null, null, "--certificate", pem, file);
        Assert.Equal((0, $"{file}: Sealed by Document seal of this site at 2026-03-01 12:00:00 UTC, and not altered since. {Check.NotAsked}\n", ""), (code, output, error));
    }

    [Theory]
    [InlineData(true, true, 0, "The privilege stands until 2027-03-01.")]
    [InlineData(true, false, 3, "The privilege was withdrawn on 2026-02-01.")]
    [InlineData(false, false, 1, Check.NotKept)]
    public async Task With_the_site_at_hand_it_says_whether_the_grant_stands(bool isKept, bool stands, int expected, string sentence)
    {
        var sha256 = Convert.ToHexStringLower(SHA256.HashData(Whole));
        var (code, output, _) = await Run(SealPress.Certificate.Trust, asked => Task.FromResult(isKept && asked == sha256 ? new StoredDocument(stands, sentence) : null), Write("a.pdf", Whole));
        Assert.Equal(expected, code);
        Assert.EndsWith($"not altered since. {sentence}\n", output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_is_altered_is_not_even_looked_up()
    {
        var file = Write("a.pdf", [.. Whole, 10]);
        var (code, output, _) = await Run(SealPress.Certificate.Trust, _ => throw new InvalidOperationException("asked"), file);
        Assert.Equal((1, $"{file}: This document was altered after it was sealed: 1 bytes follow the sealed document. Seen after byte {Whole.Length}.\n"), (code, output));
    }

    [Fact]
    public async Task Of_several_files_the_worst_decides_and_each_has_its_line()
    {
        var (good, bad) = (Write("good.pdf", Whole), Write("bad.pdf", PlainPdf.Make()));
        Assert.Equal(0, (await Run(SealPress.Certificate.Trust, null, good, good)).Code);
        var (code, output, error) = await Run(SealPress.Certificate.Trust, null, bad, good);
        Assert.Equal((1, 2, ""), (code, output.Count(c => c == '\n'), error));
        var missing = await Run(SealPress.Certificate.Trust, null, bad, "no-such-file.pdf");
        Assert.Equal((2, "no-such-file.pdf: expected a file, but there is none of this name\n"), (missing.Code, missing.Error));
    }

    [Theory]
    [InlineData("FILE is needed.")]
    [InlineData("FILE is needed.", "--certificate", "a")]
    [InlineData("--certificate FILE is needed: there is no certificate here.", "a.pdf")]
    [InlineData("--verbose stands in the wrong place or is no option of check.", "a.pdf", "--verbose")]
    [InlineData("no-such.pem: expected a file, but there is none of this name", "--certificate", "no-such.pem", "a.pdf")]
    public async Task Wrong_use_is_told_in_a_sentence(string sentence, params string[] args)
    {
        var (code, output, error) = await Run(null, null, args);
        Assert.Equal((2, "", $"{sentence}\n{Check.Usage}\n"), (code, output, error));
    }

    [Fact]
    public async Task A_certificate_that_is_none_is_told()
    {
        var file = Write("a.pdf", Whole);
        Assert.Equal((2, "", $"{file}: expected text in UTF-8\n{Check.Usage}\n"), await Run(null, null, "--certificate", file, file));
    }

    private static async Task<(int Code, string Output, string Error)> Run(SealTrust? ours, Func<string, Task<StoredDocument?>>? find, params string[] args)
    {
        using var output = new StringWriter { NewLine = "\n" };
        using var error = new StringWriter { NewLine = "\n" };
        return (await Check.Run(args, output, error, ours, find), output.ToString(), error.ToString());
    }

    private string Write(string name, byte[] bytes)
    {
        var path = Path.Combine(folder.FullName, name);
        File.WriteAllBytes(path, bytes);
        return path;
    }

    public void Dispose() => folder.Delete(recursive: true);
}
