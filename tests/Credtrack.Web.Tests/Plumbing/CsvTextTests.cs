using System.Text;
using Credtrack.Web.Commands;
using Credtrack.Web.Plumbing;

namespace Credtrack.Web.Tests.Plumbing;

/// <summary>
/// The characters are those of OWASP, "CSV Injection" (owasp.org/www-community/attacks/CSV_Injection): = + - @, tab, carriage return, line feed and the wide forms;
/// null is added by OWASP ASVS 5.0, requirement 1.2.10. The page is quoted from memory, the requirement was read.
/// </summary>
public sealed class CsvTextTests
{
    private static readonly char[] Formulas = ['=', '+', '-', '@', '\t', '\r', '\n', '\0', '＝', '＋', '－', '＠'];

    [Theory]
    [InlineData("=1+2\";=1+2", "'=1+2\";=1+2")]
    [InlineData("=cmd|' /C calc'!A0", "'=cmd|' /C calc'!A0")]
    [InlineData("@SUM(1+1)*cmd|' /C calc'!A0", "'@SUM(1+1)*cmd|' /C calc'!A0")]
    [InlineData("+1", "'+1")]
    [InlineData("-2+3", "'-2+3")]
    [InlineData("\t=1", "'\t=1")]
    [InlineData("\r=1", "'\r=1")]
    [InlineData("\n=1", "'\n=1")]
    [InlineData("  =1", "'  =1")]
    [InlineData("\u00a0\u200b=1", "'\u00a0\u200b=1")]
    [InlineData("＝1", "'＝1")]
    [InlineData("Mary-Ann, \"Ann\"\nO'Neill", "Mary-Ann, \"Ann\"\nO'Neill")]
    [InlineData("'=1", "'=1")]
    [InlineData("", "")]
    [InlineData("   ", "   ")]
    public void A_text_that_looks_like_a_formula_begins_with_an_apostrophe(string text, string cell) => Assert.Equal(cell, Cells([text])[0]);

    [Fact]
    public void Whatever_is_written_comes_back_and_never_begins_a_formula()
    {
        const string letters = "=+-@\t\r\n\0,;\"' aé語＝\u00a0\u200b1";
        var chance = new Random(20260307);
        for (var n = 0; n < 2000; n++)
        {
            var row = Enumerable.Range(0, 4).Select(_ => new string([.. Enumerable.Range(0, chance.Next(9)).Select(_ => letters[chance.Next(letters.Length)])])).ToArray();
            var cells = Cells(row);
            Assert.Equal(row, cells.Zip(row, (cell, text) => cell == text ? cell : cell[1..]));
            Assert.All(cells, cell => Assert.DoesNotContain(cell.TrimStart([.. " \u00a0\u200b"]).FirstOrDefault('x'), Formulas));
        }
    }

    [Fact]
    public void Numbers_days_and_yes_stay_what_they_are_and_the_file_says_that_it_is_utf_8()
    {
        var bytes = CsvText.Of([["name", "n"], [-3, 25, null, true, false, new DateOnly(2026, 3, 1)]]);
        Assert.Equal([0xEF, 0xBB, 0xBF], bytes[..3]);
        Assert.Equal("\"name\",\"n\"\r\n-3,25,,yes,no,2026-03-01\r\n", Encoding.UTF8.GetString(bytes[3..]));
    }

    // Read back by the program's own strict reader of RFC 4180.
    private static string[] Cells(string[] row)
    {
        var text = Encoding.UTF8.GetString(CsvText.Of([[.. row.Select((_, at) => $"c{at}")], [.. row]])[3..]);
        var table = CsvTable.Read(text, []);
        Assert.Empty(table.Faults);
        return [.. row.Select((_, at) => Assert.Single(table.Rows)[$"c{at}"] ?? "")];
    }
}
