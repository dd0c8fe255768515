using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class SupervisionsTests
{
    private static readonly Guid Named = new("00000000-0000-0000-0000-000000000001");
    private static readonly Guid Another = new("00000000-0000-0000-0000-000000000002");

    [Theory] // what counts where the reader sets no limit, and where the reader lets at most None, Later, Direct stand
    [InlineData(Supervision.None, "nobody", "None None None None")]
    [InlineData(Supervision.None, "named", "None None None None")]
    [InlineData(Supervision.None, "another", "None None None None")]
    [InlineData(Supervision.Later, "nobody", "Later None Later Later")]
    [InlineData(Supervision.Later, "named", "Later None Later Later")]
    [InlineData(Supervision.Later, "another", "Later None Later Later")]
    [InlineData(Supervision.Direct, "nobody", "Later None Later Later")]
    [InlineData(Supervision.Direct, "named", "Direct None Later Direct")]
    [InlineData(Supervision.Direct, "another", "Later None Later Later")]
    public void Direct_counts_as_later_until_the_named_person_reads_and_a_reader_only_lowers(Supervision said, string readBy, string counting)
    {
        Guid? reader = readBy == "nobody" ? null : readBy == "named" ? Named : Another;
        Supervision?[] limits = [null, Supervision.None, Supervision.Later, Supervision.Direct];
        Assert.Equal(counting, string.Join(' ', limits.Select(atMost => Supervisions.Counting(said, Named, reader, atMost))));
    }

    [Theory]
    [InlineData(Supervision.None, Supervision.None)]
    [InlineData(Supervision.Later, Supervision.Later)]
    [InlineData(Supervision.Direct, Supervision.Later)]
    public void Where_nobody_is_named_nobody_confirms(Supervision said, Supervision counting)
    {
        Assert.Equal(counting, Supervisions.Counting(said, null, null, null));
        Assert.Equal(counting, Supervisions.Counting(said, null, Another, Supervision.Direct));
    }

    [Theory] // what counts where a yes or a no was said, and the reader lets at most None, Later, Direct stand
    [InlineData(Supervision.Direct, true, "Direct None Later Direct")]
    [InlineData(Supervision.Direct, false, "Later None Later Later")]
    [InlineData(Supervision.Later, true, "Later None Later Later")]
    [InlineData(Supervision.None, true, "None None None None")]
    public void A_yes_confirms_and_raises_nothing_and_a_no_outweighs_an_own_reading(Supervision said, bool wasThere, string counting)
    {
        Supervision?[] limits = [null, Supervision.None, Supervision.Later, Supervision.Direct];
        foreach (var reader in new Guid?[] { null, Named, Another })
            Assert.Equal(counting, string.Join(' ', limits.Select(atMost => Supervisions.Counting(said, Named, reader, atMost, wasThere))));
    }
}
