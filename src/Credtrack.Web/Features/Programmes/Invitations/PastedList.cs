using System.ComponentModel.DataAnnotations;
using Credtrack.Core.Plumbing;

namespace Credtrack.Web.Features.Programmes.Invitations;

/// <summary>One line of a pasted list: name, address, membership, year group.</summary>
public sealed record PastedRow(int Line, string Name, string Address, MembershipKind Kind, string? YearGroup);

public sealed record PastedFault(int Line, string Why);

/// <summary>A list as people copy it from a mail or a spreadsheet: one person a line, cells parted by tabs, semicolons or commas.</summary>
public static class PastedList
{
    public const int Most = 200;
    private static readonly EmailAddressAttribute Address = new();

    public static (IReadOnlyList<PastedRow> Rows, IReadOnlyList<PastedFault> Faults) Read(string text)
    {
        var (rows, faults, seen) = (new List<PastedRow>(), new List<PastedFault>(), new Dictionary<string, int>());
        foreach (var (index, line) in text.ReplaceLineEndings("\n").Replace('\r', '\n').Split('\n').Index().Where(l => !string.IsNullOrWhiteSpace(l.Item)))
        {
            var number = index + 1;
            if (Row(number, Cells(line)) is var (row, why) && why is not null) faults.Add(new(number, why));
            else if (!seen.TryAdd($"{Account.Folded(row!.Address)} {row.Kind}", number)) faults.Add(new(number, $"{row.Address} stands in line {seen[$"{Account.Folded(row.Address)} {row.Kind}"]} already, as a {row.Kind}."));
            else rows.Add(row);
        }
        if (rows.Count + faults.Count == 0) faults.Add(new(1, "Paste at least one line: name, address, membership, year group."));
        if (rows.Count + faults.Count > Most) faults.Add(new(Most + 1, $"A list has {Most} lines at most. Paste the rest as another list."));
        return (rows, faults);
    }

    private static string[] Cells(string line)
    {
        var border = line.Contains('\t', StringComparison.Ordinal) ? '\t' : line.Contains(';', StringComparison.Ordinal) ? ';' : ',';
        return [.. line.Split(border).Select(cell => cell.Trim().Trim('"').Trim())];
    }

    private static (PastedRow? Row, string? Why) Row(int line, string[] cells)
    {
        if (cells.Length is < 3 or > 4) return (null, $"Expected three or four cells (name, address, membership, year group), found {cells.Length}.");
        var (name, address, year) = (cells[0], cells[1], cells.Length > 3 && cells[3].Length > 0 ? cells[3] : null);
        return name.Length is 0 or > Person.LongestName ? (null, $"The name is missing or longer than {Person.LongestName} characters.")
            : TextLine.WhyNot(name + year, int.MaxValue) is { } odd ? (null, odd)
            : !Address.IsValid(address) || address.Length > Account.LongestAddress ? (null, $"“{address}” is no e-mail address.")
            : !Enum.TryParse<MembershipKind>(cells[2], ignoreCase: true, out var kind) || int.TryParse(cells[2], out _) ? (null, $"“{cells[2]}” is no membership; write {string.Join(", ", Enum.GetNames<MembershipKind>()).ToLowerInvariant()}.")
            : year is not null && kind != MembershipKind.Trainee ? (null, "Only trainees have a year group.")
            : year?.Length > MembershipTerms.LongestYearGroup ? (null, $"Keep the year group within {MembershipTerms.LongestYearGroup} characters.")
            : (new(line, name, address, kind, year), null);
    }
}
