using Credtrack.Core.Catalogue;

namespace Credtrack.Core.Tests.Catalogue;

public sealed class MarkedViewTests
{
    private static readonly View[] Views =
    [
        new("long", "Long", ViewNeed.Required), new("trans", "Transverse", ViewNeed.Required), new("other", "Other side", ViewNeed.Optional),
        new("subxiphoid", "Subxiphoid", ViewNeed.OneOf, "heart"), new("parasternal", "Parasternal", ViewNeed.OneOf, "heart"),
        new("right", "Right base", ViewNeed.OneOf, "chest"), new("left", "Left base", ViewNeed.OneOf, "chest"), new("apex", "Apex", ViewNeed.OneOf, "chest"),
    ];

    [Theory]
    [InlineData("long trans subxiphoid right", "")]
    [InlineData("long trans parasternal apex", "")]
    [InlineData("long trans other subxiphoid parasternal right left apex", "")]
    [InlineData("long parasternal apex", "Transverse")]
    [InlineData("other subxiphoid left", "Long; Transverse")]
    [InlineData("long trans subxiphoid parasternal", "Right base or Left base or Apex")]
    [InlineData("long trans other right left apex", "Subxiphoid or Parasternal")]
    [InlineData("other", "Long; Transverse; Subxiphoid or Parasternal; Right base or Left base or Apex")]
    [InlineData("", "Long; Transverse; Subxiphoid or Parasternal; Right base or Left base or Apex")]
    public void Required_views_and_one_of_each_group_suffice(string marked, string missing)
    {
        MarkedView[] views = [.. Views.Select(v => v.With(marked.Split(' ').Contains(v.Code)))];
        Assert.Equal(missing, string.Join("; ", MarkedView.Missing(views)));
        Assert.Equal(missing.Length == 0, MarkedView.Suffice(views));
    }

    [Fact]
    public void Optional_views_alone_suffice_marked_or_not()
    {
        Assert.True(MarkedView.Suffice([]));
        Assert.True(MarkedView.Suffice([Views[2].With(false)]));
    }

    [Fact]
    public void A_view_keeps_what_it_was_when_it_is_marked() =>
        Assert.Equal(new MarkedView("subxiphoid", "Subxiphoid", ViewNeed.OneOf, "heart", true), Views[3].With(true));
}
