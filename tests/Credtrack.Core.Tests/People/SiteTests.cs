using Credtrack.Core.People;

namespace Credtrack.Core.Tests.People;

public sealed class SiteTests
{
    private readonly Cast cast = new();

    [Fact]
    public void A_site_has_a_name_and_a_zone()
    {
        var site = Site.Found(cast.Director, "Harbour Hospital", "Europe/Dublin", Cast.Noon);
        Assert.Equal(("Harbour Hospital", "Europe/Dublin"), (site.Name, site.TimeZone));
        Assert.Equal("Dana set the site up as Harbour Hospital, time zone Europe/Dublin.", Assert.Single(site.NewFacts).Sentence);
    }

    [Theory]
    [InlineData("")]
    [InlineData("Dublin")]
    [InlineData("Europe/Nowhere")]
    [InlineData("+01:00")]
    public void A_zone_is_one_that_there_is(string zone) => Refused.With($"There is no time zone {zone}; take an IANA name such as Europe/Dublin.",
        Site.WhyNotFound(zone), () => Site.Found(cast.Director, "Harbour Hospital", zone, Cast.Noon));

    [Fact]
    public void A_programme_is_founded_with_its_fact()
    {
        Assert.Equal("Harbour", cast.Programme.Name);
        Assert.Equal(["Dana founded the programme Harbour."], cast.Programme.NewFacts.Select(f => f.Sentence));
        Assert.NotEqual(cast.Programme.Id, cast.Elsewhere.Id);
    }
}
