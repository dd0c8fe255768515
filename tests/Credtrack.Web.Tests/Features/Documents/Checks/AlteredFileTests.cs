using System.Text;
using Credtrack.Web.Features.Documents.Checks;
using Credtrack.Web.Features.Documents.Seals;
using Credtrack.Web.Tests.Features.Documents.Seals;
using Credtrack.Web.Tests.Features.Grants;
using Microsoft.Extensions.DependencyInjection;

namespace Credtrack.Web.Tests.Features.Documents.Checks;

/// <summary>What the check page answers from the stored digest, asked as it asks, a thousand times.</summary>
public sealed class AlteredFileTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_thousand_changes_of_one_byte_anywhere_in_the_file_are_all_caught()
    {
        var (_, document) = await (await site.NewWorld()).Signed();
        Assert.Equal(Holding.Stands, (await Answers([document.Bytes]))[0].Holding);
        var chance = new Random(20261201);
        var changed = Enumerable.Range(0, 1000).Select(_ => Changed(document.Bytes, chance.Next(document.Bytes.Length), chance.Next(1, 256))).ToList();
        var parts = SealParts.Of(document.Bytes);
        Assert.Contains(changed, file => file.AsSpan(parts.Open, parts.Close - parts.Open).SequenceCompareTo(document.Bytes.AsSpan(parts.Open, parts.Close - parts.Open)) != 0);
        Assert.All(await Answers(changed), answer => Assert.Equal((Holding.Unconfirmed, null), (answer.Holding, answer.Holder)));
    }

    [Fact]
    public async Task Whatever_is_appended_after_the_seal_is_caught()
    {
        var (_, document) = await (await site.NewWorld()).Signed();
        var garbage = new byte[5000];
        new Random(20261202).NextBytes(garbage);
        var revision = Encoding.Latin1.GetBytes($"1 0 obj\n<< /Type /Catalog >>\nendobj\nxref\n1 1\n{document.Bytes.Length:D10} 00000 n \ntrailer\n<< /Root 1 0 R /Size 999 /Prev {Start(document.Bytes)} >>\nstartxref\n{document.Bytes.Length + 38}\n%%EOF\n");
        byte[][] appended = ["\n"u8.ToArray(), "\r\n"u8.ToArray(), " "u8.ToArray(), [0], "%%EOF\n"u8.ToArray(), garbage, revision, document.Bytes];
        var answers = await Answers([.. appended.Select(more => (byte[])[.. document.Bytes, .. more])]);
        Assert.All(answers, answer => Assert.Equal(Holding.Unconfirmed, answer.Holding));
        Assert.All(answers, answer => Assert.Contains("altered after it was sealed", answer.Sentence, StringComparison.Ordinal));
        Assert.Equal(Holding.Unconfirmed, (await Answers([[.. "\n"u8, .. document.Bytes]]))[0].Holding);
    }

    private Task<List<CheckAnswer>> Answers(IReadOnlyList<byte[]> files) => site.Ask(async db =>
    {
        var (answers, trust) = (new List<CheckAnswer>(), site.Services.GetRequiredService<SealTrust>());
        foreach (var file in files) answers.Add(await CheckAnswer.OfFile(db, file, trust));
        return answers;
    });

    private static byte[] Changed(byte[] bytes, int at, int flip)
    {
        var copy = bytes.ToArray();
        copy[at] ^= (byte)flip;
        return copy;
    }

    private static string Start(byte[] pdf)
    {
        var text = Encoding.Latin1.GetString(pdf);
        return text[(text.LastIndexOf("startxref\n", StringComparison.Ordinal) + 10)..text.LastIndexOf("\n%%EOF", StringComparison.Ordinal)];
    }
}
