using Credtrack.Core.Catalogue;

namespace Credtrack.Core.Tests.Catalogue;

public sealed class ShippedTests
{
    public static TheoryData<string> Codes => [.. CatalogueEntry.Shipped.Select(e => e.Code)];

    [Fact] // the list of codes is a decision of ours
    public void Twenty_eight_applications_are_shipped_each_once()
    {
        const string codes = """
            efast cardiac ivc arrest-echo aorta lung biliary renal early-pregnancy late-pregnancy dvt soft-tissue msk ocular bowel testicular gastric airway
            transcranial tee piv cvc arterial-line thoracentesis paracentesis lumbar-puncture nerve-block joint-aspiration
            """;
        var expected = codes.Split([' ', '\n'], StringSplitOptions.RemoveEmptyEntries);
        Assert.Equal(28, expected.Length);
        Assert.Equal(expected.Order(StringComparer.Ordinal), CatalogueEntry.Shipped.Select(e => e.Code).Order(StringComparer.Ordinal));
        Assert.Equal(28, CatalogueEntry.Shipped.Select(e => e.Name).Distinct().Count());
    }

    [Fact]
    public void Procedures_are_what_is_done_with_a_needle() => Assert.Equal(
        ["piv", "cvc", "arterial-line", "thoracentesis", "paracentesis", "lumbar-puncture", "nerve-block", "joint-aspiration"],
        CatalogueEntry.Shipped.Where(e => e.Kind == ApplicationKind.Procedure).Select(e => e.Code));

    [Theory, MemberData(nameof(Codes))]
    public void Views_have_codes_names_and_groups_of_at_least_two(string code)
    {
        var views = Entry(code).Views;
        Assert.Contains(views, v => v.Need != ViewNeed.Optional);
        Assert.All(views, v => Assert.Equal(v.Need == ViewNeed.OneOf, v.Group is not null));
        Assert.All(views.Where(v => v.Group is not null).GroupBy(v => v.Group), g => Assert.True(g.Count() > 1, g.Key));
        AreTold(views.Select(v => (v.Code, v.Name)));
    }

    [Theory, MemberData(nameof(Codes))]
    public void Questions_have_codes_and_texts_and_are_positive_with_yes_with_no_or_never(string code)
    {
        var questions = Entry(code).Questions;
        Assert.All(questions, q => Assert.True(q.Positive is Answer.Yes or Answer.No or null, q.Code));
        Assert.All(questions, q => Assert.EndsWith("?", q.Text, StringComparison.Ordinal));
        AreTold(questions.Select(q => (q.Code, q.Text)));
    }

    [Theory, MemberData(nameof(Codes))]
    public void Each_application_can_have_a_result(string code)
    {
        var entry = Entry(code);
        if (entry.Kind == ApplicationKind.Diagnostic) Assert.Contains(entry.Questions, q => q.Positive is not null);
        else Assert.Equal((1, true), (entry.Questions.Count(q => q.Code == Question.TargetReached), entry.Questions.All(q => q.Positive is null)));
    }

    [Fact]
    public void No_lung_sliding_is_the_finding() => Assert.Equal(Answer.No, Entry("lung").Questions.Single(q => q.Code == "sliding").Positive);

    [Theory, MemberData(nameof(Codes))]
    public void Parts_are_codes_each_once(string code)
    {
        var parts = Entry(code).Subtypes ?? [];
        Assert.Equal(parts.Count, parts.Distinct().Count());
        Assert.All(parts, IsCode);
    }

    [Theory, MemberData(nameof(Codes))] // from memory: diagnostic machines transmit about 1 to 20 MHz and show depths to about 30 cm
    public void Ranges_run_upwards_and_within_what_machines_do(string code)
    {
        var entry = Entry(code);
        Assert.NotEmpty(entry.Transducer);
        Assert.True(entry.FrequencyMHz is [>= 1, <= 20] && entry.FrequencyMHz[0] < entry.FrequencyMHz[1]);
        Assert.True(entry.DepthCm is [>= 1, <= 30] && entry.DepthCm[0] < entry.DepthCm[1]);
    }

    private static CatalogueEntry Entry(string code) => CatalogueEntry.Shipped.Single(e => e.Code == code);

    // Texts too are unique: the ledger tells a change by them.
    private static void AreTold(IEnumerable<(string Code, string Text)> told)
    {
        var list = told.ToList();
        Assert.NotEmpty(list);
        Assert.Equal((list.Count, list.Count), (list.Select(t => t.Code).Distinct().Count(), list.Select(t => t.Text).Distinct().Count()));
        Assert.All(list, t => IsCode(t.Code));
        Assert.All(list, t => Assert.Matches("^[A-Z].{2,}$", t.Text));
    }

    private static void IsCode(string text) => Assert.Matches("^[a-z0-9]+(-[a-z0-9]+)*$", text);
}
