using Microsoft.AspNetCore.Mvc.Rendering;

namespace Credtrack.Web.Plumbing;

/// <summary>What may be chosen: a value that is sent and a text that is read.</summary>
public static class Options
{
    public static IEnumerable<SelectListItem> AsOptions(this IEnumerable<string> words) => words.Select(w => new SelectListItem(w, w));

    public static IEnumerable<SelectListItem> AsOptions(this IEnumerable<(string Value, string Text)> choices) => choices.Select(c => new SelectListItem(c.Text, c.Value));
}
