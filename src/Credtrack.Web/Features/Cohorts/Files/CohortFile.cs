using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Cohorts.Files;

/// <summary>Trainees in the order of the sheet, at most three hundred a file; the sheet offers as many files as it takes.</summary>
public sealed record CohortFile(string Name, byte[] Bytes)
{
    public const int Size = 300;
    private static readonly object?[] Header = ["trainee", "year", "application", "counted", "required", "missing", "pending", "met", "last_counting_day"];

    public static async Task<CohortFile?> Load(CredtrackDb db, Me me, CohortQuery asked, DateOnly today)
    {
        if (CohortFilter.Of(db, me.Person, asked, today) is not { } filter) return null;
        var day = filter.Query.AsOf!.Value;
        var members = await filter.Ordered.Skip((filter.Query.Page - 1) * Size).Take(Size).ToListAsync();
        var rows = await CohortRow.Load(db, members, await RulesOf.InForce(db, [filter.Programme.Id], me.Site), day);
        var cells = rows.SelectMany(row => row.Cells, (row, cell) => new object?[]
        {
            row.Who.Name, row.Who.YearGroup, cell.Code, cell.Standing.Counted, cell.Depth?.Required, cell.Depth?.Missing, cell.Standing.Pending, cell.Standing.Met, row.LastCounted(cell),
        });
        return new($"cohort-{day.Iso()}{(filter.Query.Page > 1 ? $"-part-{filter.Query.Page}" : "")}.csv", CsvText.Of([Header, .. cells]));
    }
}
