using Credtrack.Web.Features.Shared.Figures;
using Microsoft.AspNetCore.Mvc.ModelBinding;
using Microsoft.AspNetCore.Mvc.Rendering;
using Microsoft.AspNetCore.Mvc.ViewFeatures;
using Microsoft.AspNetCore.Razor.TagHelpers;

namespace Credtrack.Web.Plumbing;

/// <summary>&lt;fault for="Form.Pictures" /&gt; or &lt;fault name="…" /&gt;: what is wrong with an input that the page writes itself.</summary>
[HtmlTargetElement("fault", TagStructure = TagStructure.WithoutEndTag)]
public sealed class FaultLine : TagHelper
{
    public ModelExpression? For { get; set; }
    public string? Name { get; set; }

    [HtmlAttributeNotBound, ViewContext]
    public required ViewContext View { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        var name = Name ?? For!.Name;
        output.TagName = null;
        foreach (var error in View.ModelState.GetValueOrDefault(name)?.Errors ?? [])
        {
            var (text, words) = (new TagBuilder("p") { Attributes = { ["class"] = "wrong" } }, new TagBuilder("span"));
            words.InnerHtml.Append(error.ErrorMessage);
            text.InnerHtml.AppendHtml(Icons.Of(IconName.Bad)).AppendHtml(words);
            output.Content.AppendHtml(text);
        }
    }
}

public static class Faults
{
    public static bool ContainsFault(this ModelStateDictionary form, params IEnumerable<string> names) => names.Any(name => form.GetValueOrDefault(name)?.Errors.Count > 0);

    /// <summary>What the core finds wrong goes to the field of that name.</summary>
    public static void Tell(this ModelStateDictionary form, IEnumerable<(string About, string Why)> faults)
    {
        foreach (var (about, why) in faults) form.AddModelError($"Form.{about}", why);
    }
}
