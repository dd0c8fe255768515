using Credtrack.Web.Features.Shared.Figures;
using Microsoft.AspNetCore.Mvc.Rendering;
using Microsoft.AspNetCore.Mvc.ViewFeatures;

namespace Credtrack.Web.Plumbing;

/// <summary>What stands around an input, the hint before it and the error after it, and the ids that tie them to it.</summary>
public sealed class Tied(ModelExpression input, string? hint, ViewContext view)
{
    private readonly string? fault = view.ModelState.GetValueOrDefault(input.Name)?.Errors.FirstOrDefault()?.ErrorMessage;

    public string Id { get; } = Field.IdOf(input.Name);
    public string Name { get; } = input.Metadata.DisplayName ?? input.Metadata.PropertyName ?? input.Name;
    public bool IsWrong => fault is not null;

    /// <summary>For aria-describedby; null if there is nothing to add.</summary>
    public string? Description => (HasHint, IsWrong) switch
    {
        (false, false) => null,
        (true, false) => $"{Id}-hint",
        (false, true) => $"{Id}-fault",
        _ => $"{Id}-hint {Id}-fault",
    };

    public TagBuilder? Hint()
    {
        if (!HasHint) return null;
        var text = new TagBuilder("p") { Attributes = { ["class"] = "hint", ["id"] = $"{Id}-hint" } };
        text.InnerHtml.Append(hint!);
        return text;
    }

    public TagBuilder? Fault()
    {
        if (fault is null) return null;
        var (text, words) = (new TagBuilder("p") { Attributes = { ["class"] = "wrong", ["id"] = $"{Id}-fault" } }, new TagBuilder("span"));
        words.InnerHtml.Append(fault);
        text.InnerHtml.AppendHtml(Icons.Of(IconName.Bad)).AppendHtml(words);
        return text;
    }

    // Razor hands over an empty string for null.
    private bool HasHint => !string.IsNullOrEmpty(hint);
}
