using System.Globalization;
using System.Text.RegularExpressions;

namespace Credtrack.Web.Features.Imports;

public enum DateOrder { YearFirst, DayFirst, MonthFirst }

/// <summary>Times as spreadsheets write them: 03/04/2026 14:05. Which of the two is the month only the whole column tells, or nobody.</summary>
public static partial class DateOrders
{
    /// <summary>The orders in which all of these can be read; what is no such date is left for the reader of the format, which names it.</summary>
    public static IReadOnlyList<DateOrder> Possible(IEnumerable<string> cells)
    {
        var (day, month, any) = (true, true, false);
        foreach (var cell in cells)
        {
            if (Numbers().Match(cell) is not { Success: true } found) continue;
            any = true;
            if (Number(found, "second") > 12) day = false;
            if (Number(found, "first") > 12) month = false;
        }
        return !any ? [DateOrder.YearFirst] : [.. day ? new[] { DateOrder.DayFirst } : [], .. month ? new[] { DateOrder.MonthFirst } : []];
    }

    /// <summary>The same time as the format writes it; a cell that is no such date stays as it is.</summary>
    public static string Iso(this DateOrder order, string cell)
    {
        if (Spaced().Match(cell) is { Success: true } spaced) return $"{spaced.Groups["day"].Value}T{spaced.Groups["time"].Value}";
        if (order == DateOrder.YearFirst || Numbers().Match(cell) is not { Success: true } found) return cell;
        var (day, month) = order == DateOrder.DayFirst ? (Number(found, "first"), Number(found, "second")) : (Number(found, "second"), Number(found, "first"));
        var time = found.Groups["time"] is { Success: true } given ? $"T{(given.Value.IndexOf(':', StringComparison.Ordinal) == 1 ? "0" : "")}{given.Value}" : "";
        return string.Create(CultureInfo.InvariantCulture, $"{found.Groups["year"].Value}-{month:00}-{day:00}{time}");
    }

    public static string Printed(this DateOrder order) => order switch
    {
        DateOrder.DayFirst => "Day first: 31/12/2026",
        DateOrder.MonthFirst => "Month first: 12/31/2026",
        _ => "Year first: 2026-12-31",
    };

    private static int Number(Match found, string part) => int.Parse(found.Groups[part].ValueSpan, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"\A(?<first>\d{1,2})(?<between>[/.-])(?<second>\d{1,2})\k<between>(?<year>\d{4})([ T](?<time>\d{1,2}:\d{2}(:\d{2})?))?\z", RegexOptions.ExplicitCapture)]
    private static partial Regex Numbers();

    [GeneratedRegex(@"\A(?<day>\d{4}-\d{2}-\d{2}) (?<time>\d{2}:\d{2}\S*)\z", RegexOptions.ExplicitCapture)]
    private static partial Regex Spaced();
}
