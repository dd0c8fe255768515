using Microsoft.AspNetCore.Mvc.Rendering;
using Microsoft.AspNetCore.Mvc.ViewFeatures;
using Microsoft.AspNetCore.Razor.TagHelpers;

namespace Credtrack.Web.Plumbing;

/// <summary>&lt;tick for="Form.Indicated" label="Clinically indicated" /&gt;: yes or no. A browser says nothing of an empty box, so a hidden "false" follows it.</summary>
[HtmlTargetElement("tick", TagStructure = TagStructure.WithoutEndTag)]
public sealed class Tick(IHtmlGenerator html) : TagHelper
{
    public required ModelExpression For { get; set; }
    public string? Label { get; set; }
    public string? Hint { get; set; }

    [HtmlAttributeNotBound, ViewContext]
    public required ViewContext View { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        var tied = new Tied(For, Hint, View);
        (output.TagName, output.TagMode) = ("div", TagMode.StartTagAndEndTag);
        output.Attributes.SetAttribute("class", "field");
        var (box, label, words) = (new TagBuilder("div") { Attributes = { ["class"] = "tick" } }, new TagBuilder("label") { Attributes = { ["for"] = tied.Id } }, new TagBuilder("span"));
        words.InnerHtml.Append(string.IsNullOrEmpty(Label) ? tied.Name : Label);
        label.InnerHtml.AppendHtml(Checkbox(tied)).AppendHtml(words);
        box.InnerHtml.AppendHtml(label);
        output.Content.AppendHtml(box).AppendHtml(html.GenerateHiddenForCheckbox(View, For.ModelExplorer, For.Name)).AppendHtml(tied.Hint()).AppendHtml(tied.Fault());
    }

    private TagBuilder Checkbox(Tied tied)
    {
        var attributes = new Dictionary<string, object?> { ["id"] = tied.Id };
        if (tied.Description is { } description) attributes["aria-describedby"] = description;
        if (tied.IsWrong) attributes["aria-invalid"] = "true";
        return html.GenerateCheckBox(View, For.ModelExplorer, For.Name, isChecked: null, attributes);
    }
}
