namespace Credtrack.Core.Catalogue;

public enum ViewNeed { Required, Optional, OneOf }

/// <summary>One of the pictures that make an examination. Of the views in one group, one suffices.</summary>
public sealed record View(string Code, string Name, ViewNeed Need, string? Group = null)
{
    public MarkedView With(bool marked) => new(Code, Name, Need, Group, marked);
}

/// <summary>A view as it was asked for: shown, says the trainee; adequate, says the reader.</summary>
public sealed record MarkedView(string Code, string Name, ViewNeed Need, string? Group, bool Marked)
{
    /// <summary>All required ones, and of each group at least one.</summary>
    public static bool Suffice(IReadOnlyCollection<MarkedView> views) => Missing(views).Count == 0;

    /// <summary>The names of what is missing; of a group its names together.</summary>
    public static IReadOnlyList<string> Missing(IReadOnlyCollection<MarkedView> views) =>
    [
        .. views.Where(v => v is { Need: ViewNeed.Required, Marked: false }).Select(v => v.Name),
        .. views.Where(v => v.Need == ViewNeed.OneOf).GroupBy(v => v.Group).Where(g => g.All(v => !v.Marked)).Select(g => string.Join(" or ", g.Select(v => v.Name))),
    ];
}
