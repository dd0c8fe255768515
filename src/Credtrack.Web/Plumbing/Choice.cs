using Microsoft.AspNetCore.Mvc.Rendering;
using Microsoft.AspNetCore.Mvc.ViewFeatures;
using Microsoft.AspNetCore.Razor.TagHelpers;

namespace Credtrack.Web.Plumbing;

/// <summary>
/// &lt;choice type="radio" name="Form.Answers[stones]" value="Yes" chosen="@given" /&gt;: one radio or box of a list that the page writes itself.
/// What was sent with this request is shown again before anything else.
/// </summary>
[HtmlTargetElement("choice")]
public sealed class Choice : TagHelper
{
    public required string Type { get; set; }
    public required string Name { get; set; }
    public required string Value { get; set; }
    public bool Chosen { get; set; }

    /// <summary>In a part of the form that is switched off nothing is chosen: radios of one name are one group, of which the last one wins.</summary>
    public bool Off { get; set; }

    /// <summary>The first of a group carries the id to which a line of the error summary leads.</summary>
    public bool First { get; set; }

    [HtmlAttributeNotBound, ViewContext]
    public required ViewContext View { get; set; }

    public override async Task ProcessAsync(TagHelperContext context, TagHelperOutput output)
    {
        var words = await output.GetChildContentAsync();
        var input = new TagBuilder("input") { TagRenderMode = TagRenderMode.SelfClosing, Attributes = { ["type"] = Type, ["name"] = Name, ["value"] = Value } };
        if (First) input.Attributes["id"] = Field.IdOf(Name);
        if (IsChosen()) input.Attributes["checked"] = "checked";
        (output.TagName, output.TagMode) = ("label", TagMode.StartTagAndEndTag);
        output.Content.SetHtmlContent(input);
        output.Content.AppendHtml("<span>").AppendHtml(words).AppendHtml("</span>");
    }

    private bool IsChosen() => !Off && IsChosen(View, Name, Value, Chosen);

    /// <summary>What was sent with this request, or else what the page holds.</summary>
    public static bool IsChosen(ViewContext view, string name, string value, bool held) =>
        HttpMethods.IsPost(view.HttpContext.Request.Method) ? view.HttpContext.Request.Form[name].Contains(value) : held;
}
