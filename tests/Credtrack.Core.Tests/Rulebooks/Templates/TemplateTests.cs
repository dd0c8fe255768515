using Credtrack.Core.Rulebooks;
using Credtrack.Core.Rulebooks.Requirements;
using Credtrack.Core.Rulebooks.Templates;

namespace Credtrack.Core.Tests.Rulebooks.Templates;

public sealed class TemplateTests
{
    [Fact]
    public void Every_template_is_a_rulebook_that_cites_its_sources()
    {
        Assert.NotEmpty(Template.All);
        Assert.All(Template.All, template =>
        {
            var read = RulesReader.Read(template.Text, "UTC");
            Assert.Empty(read.Faults);
            Assert.Equal(template.Name, read.Rules!.Name);
            Assert.NotEmpty(read.Rules.Sources);
            Assert.Contains("starting point", read.Rules.Notes, StringComparison.Ordinal);
        });
        Assert.Null(Template.Find("none"));
    }

    [Fact] // ACEP 2016, Ann Emerg Med 2017;69:e27-e54, as reported by Stanford's credentialing page (secondary): 25 to 50 each, procedures 5 to 10, 150 to 300 in all
    public void The_first_template_asks_what_was_published()
    {
        var rules = RulesReader.Read(Template.Find("acep-2016")!.Text, "UTC").Rules!;
        var asked = rules.Applications.Select(a => Assert.IsType<Count>(Assert.Single(a.Require))).ToList();
        Assert.Equal(11, asked.Count(c => c is { Min: 25, Target: 50, Where: null }));
        Assert.Equal(6, asked.Count(c => c is { Min: 5, Target: 10, Where: null }));
        Assert.True(Assert.Single(rules.Overall) is Count { Min: 150, Target: 300 });
        Assert.All(rules.Applications, a => Assert.Empty(a.Counting.Conditions));
    }
}
