using System.Globalization;
using System.Text.RegularExpressions;
using Credtrack.Core.Measures.Standings;
using Credtrack.Core.Rulebooks;

namespace Credtrack.Web.Commands;

/// <summary>One person's item, as items.csv has it.</summary>
public sealed record PersonItem(string Person, ItemEvidence Item);

/// <summary>The table of courses, examinations and direct observations.</summary>
public static partial class ItemsCsv
{
    /// <param name="text">The text of the file.</param>
    /// <param name="zone">The rulebook's zone.</param>
    /// <param name="faults">Every fault of the table is added here.</param>
    public static IReadOnlyList<PersonItem> Read(string text, TimeZoneInfo zone, List<CsvFault> faults)
    {
        var table = CsvTable.Read(text, ["person", "item", "at"]);
        var items = table.Rows.Select(row => Item(row, zone)).ToList();
        faults.AddRange(table.Faults.OrderBy(fault => fault.Line));
        return items;
    }

    private static PersonItem Item(CsvRow row, TimeZoneInfo zone)
    {
        var (person, item) = (row.Required("person"), row.Required("item"));
        row.Required("at");
        return new(person, new(item, row.Time("at", zone) ?? default, Amount(row), row.Word("passed", RuleWords.YesNo, true)));
    }

    private static decimal Amount(CsvRow row)
    {
        if (row["amount"] is not { } text) return 1;
        if (Plain().IsMatch(text) && decimal.TryParse(text, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var amount)) return amount;
        row.Fault("amount", "expected a decimal number, 0 or more, such as 7.5");
        return 0;
    }

    // So few digits that the decimals of the language, which have 28, hold also the sum of many exactly.
    [GeneratedRegex(@"\A[0-9]{1,9}(\.[0-9]{1,17})?\z")]
    private static partial Regex Plain();
}
