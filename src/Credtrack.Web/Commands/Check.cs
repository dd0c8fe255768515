using System.Security.Cryptography;
using Credtrack.Web.Features.Documents.Seals;

namespace Credtrack.Web.Commands;

/// <summary>
/// Checks sealed documents. Exit status 0 if all are ours and unaltered and, where the site can be asked, still stand; 1 if one is altered or not
/// ours; 3 if all are unaltered but what one certifies has ended; 2 for wrong use or a file that cannot be read.
/// </summary>
public static class Check
{
    public const string Usage = "usage: check [--certificate FILE] FILE [FILE...]";
    public const string NotAsked = "Whether what it certifies still stands is not known: only the seal was checked.";
    public const string NotKept = "This site keeps no document of these bytes, although the seal is its own.";

    private const int Good = 0, Bad = 1, Wrong = 2, Ended = 3;

    /// <param name="args">What follows the word check.</param>
    /// <param name="output">A line for each file, with what the seal says, where, and what the site says.</param>
    /// <param name="ours">The certificates of this site; null where none are at hand, then --certificate is needed.</param>
    /// <param name="find">The document by the SHA-256 of its bytes (64 lower-case digits); null where no database is at hand.</param>
    public static async Task<int> Run(string[] args, TextWriter output, TextWriter error, SealTrust? ours = null, Func<string, Task<StoredDocument?>>? find = null)
    {
        var (certificate, files) = args is ["--certificate", var named, .. var rest] ? (named, rest) : (null, args);
        var trust = certificate is null ? ours : null;
        var wrong = WhyNot(files, isTrusting: certificate is not null || ours is not null);
        if (wrong is null && certificate is not null && (trust = Read(certificate, out var fault)) is null) wrong = $"{certificate}: {fault}";
        if (wrong is not null)
        {
            await error.WriteLineAsync(wrong);
            await error.WriteLineAsync(Usage);
            return Wrong;
        }
        var codes = new List<int>();
        foreach (var file in files) codes.Add(await Judge(file, output, error, trust!, find));
        return new[] { Wrong, Bad, Ended }.FirstOrDefault(codes.Contains, Good);
    }

    private static string? WhyNot(string[] files, bool isTrusting) =>
          files.Length == 0                                                                              ? "FILE is needed."
        : files.FirstOrDefault(f => f.StartsWith("--", StringComparison.Ordinal)) is { } odd             ? $"{odd} stands in the wrong place or is no option of check."
        : !isTrusting                                                                                    ? "--certificate FILE is needed: there is no certificate here."
        : null;

    private static SealTrust? Read(string certificate, out string? fault)
    {
        var trust = FileText.Read(certificate, out fault) is { } pem ? SealTrust.Of(pem) : null;
        fault ??= trust is null ? "expected certificates in PEM" : null;
        return trust;
    }

    private static async Task<int> Judge(string path, TextWriter output, TextWriter error, SealTrust ours, Func<string, Task<StoredDocument?>>? find)
    {
        if (FileBytes.Read(path, out var fault) is not { } bytes)
        {
            await error.WriteLineAsync($"{path}: {fault}");
            return Wrong;
        }
        var finding = SealCheck.Of(bytes, ours);
        if (!finding.IsGood)
        {
            await output.WriteLineAsync($"{path}: {finding.Sentence} Seen {finding.Place}.");
            return Bad;
        }
        var stored = find is null ? null : await find(Convert.ToHexStringLower(SHA256.HashData(bytes)));
        await output.WriteLineAsync($"{path}: {finding.Sentence} {(find is null ? NotAsked : stored?.Sentence ?? NotKept)}");
        return find is null ? Good : stored is null ? Bad : stored.Stands ? Good : Ended;
    }
}
