using Credtrack.Core.Rulebooks;
using Credtrack.Web.Features.Standings;

namespace Credtrack.Web.Features.Cohorts;

/// <summary>An application of the rulebook in force; without a plain count there is no number to reach.</summary>
public sealed record CohortColumn(string Code, string Name, int? Required);

/// <summary>The trainees of a programme beside all applications of its rulebook, sixty a page, by year group.</summary>
public sealed record CohortPage(
    IReadOnlyList<Programme> Programmes, Programme Programme, Rulebook? Rulebook, CohortQuery Query, DateOnly Today, IReadOnlyList<CohortColumn> Columns, IReadOnlyList<CohortRow> Rows,
    IReadOnlyList<string> Years, int All, int Former)
{
    public const int Size = 60;
    public DateOnly AsOf => Query.AsOf!.Value;
    public bool HasMore => Query.Page * Size < All;
    public bool HasOthers => All > Rows.Count && Rulebook is not null;

    /// <summary>Days without a counting scan, longest first.</summary>
    public IEnumerable<CohortRow> Stalled => Rows.Where(r => r.Stalls(Query.Days)).OrderByDescending(r => r.Standstill.Days).ThenBy(r => r.Who.Name, StringComparer.Ordinal);

    public IEnumerable<IGrouping<string?, CohortRow>> Groups =>
        (Query.Order == CohortOrder.Missing ? Rows.OrderByDescending(r => r.Missing) : Rows.AsEnumerable()).GroupBy(r => r.Who.YearGroup).OrderByDescending(g => g.Key, StringComparer.Ordinal);

    /// <summary>Null for somebody who sees no cohort, or not this one.</summary>
    public static async Task<CohortPage?> Load(CredtrackDb db, Me me, CohortQuery asked, DateOnly today)
    {
        if (CohortFilter.Of(db, me.Person, asked, today) is not { } filter) return null;
        var (query, programme) = (filter.Query, filter.Programme);
        var years = await filter.Begun.Select(m => m.YearGroup).Distinct().Take(100).ToListAsync();
        var (all, former) = (await filter.Shown.CountAsync(), await filter.Begun.CountAsync(m => m.LastDay < query.AsOf));
        var members = await filter.Ordered.Skip((query.Page - 1) * Size).Take(Size).ToListAsync();
        var rulebook = await db.RulebookInForce(programme.Id);
        var names = await db.Applications.ToDictionaryAsync(a => a.Code, a => a.Name);
        var rules = RulesOf.InForce(rulebook, me.Site);
        var rows = rules is null ? [] : await CohortRow.Load(db, members, new Dictionary<Guid, Rules> { [programme.Id] = rules }, query.AsOf!.Value);
        return new(me.Person.CohortsVisible(), programme, rulebook, query, today,
            [.. (rules?.Applications ?? []).Select(a => new CohortColumn(a.Code, CohortRow.NameOf(a, names), StandingLine.RequiredBy(a)))], rows,
            [.. years.OfType<string>().Order(StringComparer.Ordinal)], all, former);
    }
}
