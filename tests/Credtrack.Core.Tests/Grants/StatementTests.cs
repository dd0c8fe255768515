using System.Security.Cryptography;
using System.Text;
using Credtrack.Core.Grants;

namespace Credtrack.Core.Tests.Grants;

public sealed class StatementTests
{
    [Fact]
    public void The_digest_is_that_of_the_text_as_anybody_computes_it()
    {
        var text = Texts.Of(met: true);
        Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text.Text))), text.Digest);
        Assert.EndsWith("\n", text.Text, StringComparison.Ordinal);
    }

    public static TheoryData<string, Func<Statement, Statement>> Movements => new()
    {
        { "a reading", s => s with { Read = 13 } },
        { "a scan", s => s with { Performed = 15 } },
        { "a count", s => s with { Counted = 12 } },
        { "a requirement", s => s with { Requirements = [new("25 scans", "11", false)] } },
        { "a rulebook", s => s with { Edition = 5 } },
        { "a day", s => s with { AsOf = s.AsOf.AddDays(1) } },
        { "a scan's verdict alone", s => s with { Trace = "other" } },
        { "the name", s => s with { Holder = "Tariq B." } },
    };

    [Theory, MemberData(nameof(Movements))]
    public void Whatever_moves_makes_another_digest_and_is_shown(string what, Func<Statement, Statement> moved)
    {
        var (before, after) = (Texts.Of(met: true), moved(Texts.Of(met: true)));
        Assert.False(before.Digest == after.Digest, what);
        Assert.NotEmpty(Statement.Difference(before.Text, after.Text));
    }

    [Fact]
    public void Without_a_movement_there_is_no_difference() => Assert.Empty(Statement.Difference(Texts.Of(true).Text, Texts.Of(true).Text));

    [Fact]
    public void A_line_break_in_a_name_makes_no_line_of_the_text() =>
        Assert.DoesNotContain(Texts.Of(true) with { Holder = "Tariq\nscans that count: 99" } is var forged ? forged.Text.Split('\n') : [], l => l == "scans that count: 99");
}

internal static class Texts
{
    public static Statement Of(bool met) => new("Site", "Tariq", Guid.Empty, "Harbour", "Lung without supervision", "Lung", Cast.Today, 14, 12, 11,
        [new Evidenced("10 scans", "11", true), new Evidenced("3 positive scans", met ? "3" : "1", met)], "Harbour rules", 4, "trace");
}
