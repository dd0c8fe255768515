using Credtrack.Core.Catalogue;

namespace Credtrack.Core.Tests.Catalogue;

public sealed class ApplicationTests
{
    private readonly Cast cast = new();

    [Fact]
    public void An_application_is_what_its_entry_says()
    {
        var entry = CatalogueEntry.Shipped.Single(e => e.Code == "msk");
        var application = Application.List(cast.Director, entry, Cast.Noon);
        Assert.Equal((entry.Code, entry.Name, entry.Kind, entry.Transducer, entry.Note), (application.Code, application.Name, application.Kind, application.Transducer, application.Note));
        Assert.Equal((entry.Views, entry.Questions, entry.Subtypes), (application.Views, application.Questions, application.Subtypes));
        Assert.Equal((7000, 15_000, 20, 60), (application.FrequencyFromKhz, application.FrequencyToKhz, application.DepthFromMm, application.DepthToMm));
        Assert.Equal("Dana listed Musculoskeletal (msk) in the catalogue.", Assert.Single(application.NewFacts).Sentence);
    }

    [Fact]
    public void An_application_without_parts_offers_none() => Assert.Empty(cast["cardiac"].Subtypes);

    [Fact] // 32.3 and 64.1 times 1000 fall just below the whole number in binary
    public void Ranges_become_the_nearest_whole_kilohertz_and_millimetre()
    {
        var application = Application.List(cast.Director, CatalogueEntry.Shipped[0] with { FrequencyMHz = [32.3, 64.1], DepthCm = [0.6, 1.1] }, Cast.Noon);
        Assert.Equal((32_300, 64_100, 6, 11), (application.FrequencyFromKhz, application.FrequencyToKhz, application.DepthFromMm, application.DepthToMm));
    }

    [Fact]
    public void A_diagnosis_is_decided_by_what_can_be_positive()
    {
        Assert.Equal(["hydronephrosis-right", "hydronephrosis-left"], cast["renal"].Questions.Where(cast["renal"].Decides).Select(q => q.Code));
        Assert.False(cast["renal"].Decides(new(Question.TargetReached, "Target reached?", null)));
    }

    [Fact]
    public void A_procedure_is_decided_by_its_target_alone()
    {
        Assert.Equal(["target-reached"], cast["cvc"].Questions.Where(cast["cvc"].Decides).Select(q => q.Code));
        Assert.False(cast["cvc"].Decides(new("arterial", "Arterial puncture?", Answer.Yes)));
    }
}
