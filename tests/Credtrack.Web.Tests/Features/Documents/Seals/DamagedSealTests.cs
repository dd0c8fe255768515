using Credtrack.Web.Features.Documents.Seals;

namespace Credtrack.Web.Tests.Features.Documents.Seals;

public sealed class DamagedSealTests
{
    private static readonly byte[] Whole = SealPress.Press();

    [Fact]
    public void A_thousand_changes_of_one_byte_in_what_the_seal_covers_are_all_found()
    {
        var (chance, parts) = (new Random(14), SealParts.Of(Whole));
        var unseen = new List<string>();
        for (var round = 0; round < 1000; round++)
        {
            var place = chance.Next(parts.Covered.Length);
            var at = place < parts.Open ? place : place - parts.Open + parts.Close + 1;
            if (Changed(at, chance.Next(1, 256)) is { } how) unseen.Add(how);
        }
        Assert.Empty(unseen);
    }

    [Fact]
    public void No_byte_of_the_signature_itself_can_change_unseen()
    {
        var (chance, parts) = (new Random(15), SealParts.Of(Whole));
        var unseen = new List<string>();
        for (var at = parts.Open; at <= parts.Open + 2 * parts.Signature.Length; at++)
        {
            // Another hexadecimal digit, which leads further in than any other byte; the case of a digit; any byte.
            var digit = (int)"0123456789ABCDEF"[chance.Next(16)];
            foreach (var flip in new[] { Whole[at] ^ digit, 0x20, chance.Next(1, 256) })
                if (flip != 0 && Changed(at, flip) is { } how) unseen.Add(how);
        }
        for (var at = parts.Open + 2 * parts.Signature.Length; at <= parts.Close; at += 37)
            if (Changed(at, Whole[at] ^ '1') is { } how) unseen.Add(how);
        Assert.True(unseen.Count == 0, string.Join('\n', unseen));
    }

    [Fact]
    public void What_is_added_behind_or_taken_away_is_found_with_its_place()
    {
        var appended = SealPress.Check([.. Whole, (byte)'\n']);
        Assert.Equal((SealVerdict.Altered, "This document was altered after it was sealed: 1 bytes follow the sealed document.", $"after byte {Whole.Length}"), (appended.Verdict, appended.Sentence, appended.Place));
        Assert.Equal((SealVerdict.Altered, $"after byte {Whole.Length}"), (SealPress.Check(PlainPdf.Updated(Whole)).Verdict, SealPress.Check(PlainPdf.Updated(Whole)).Place));
        Assert.Equal((SealVerdict.Altered, $"after byte {Whole.Length - 9}"), (SealPress.Check(Whole[..^9]).Verdict, SealPress.Check(Whole[..^9]).Place));
        Assert.Equal(SealVerdict.NoPdf, SealPress.Check([(byte)' ', .. Whole]).Verdict);
    }

    [Fact]
    public void Two_sealed_documents_in_one_file_are_not_one() =>
        Assert.Equal("This document was altered after it was sealed: it carries 2 seals instead of one.", SealPress.Check([.. Whole, .. Whole]).Sentence);

    [Fact]
    public void The_seal_of_one_document_does_not_fit_another()
    {
        var other = SealParts.Of(SealPress.Press(PlainPdf.Make("/Lang(en)")));
        var finding = SealPress.Check(SealParts.Exchange(Whole, _ => other.Signature));
        Assert.Equal((SealVerdict.Altered, "This document was altered after it was sealed: its bytes are not those that were sealed."), (finding.Verdict, finding.Sentence));
    }

    [Fact]
    public void Pages_that_change_places_are_found()
    {
        var at = Whole.AsSpan().IndexOf("3 0 R 4 0 R"u8);
        var swapped = Whole.ToArray();
        (swapped[at], swapped[at + 6]) = (swapped[at + 6], swapped[at]);
        Assert.Equal(SealVerdict.Altered, SealPress.Check(swapped).Verdict);
    }

    private static string? Changed(int at, int flip)
    {
        var copy = Whole.ToArray();
        copy[at] ^= (byte)flip;
        return SealPress.Check(copy).IsGood ? $"byte {at}: {(char)Whole[at]} to {(char)copy[at]}" : null;
    }
}
