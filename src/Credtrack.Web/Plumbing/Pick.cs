using Microsoft.AspNetCore.Mvc.Rendering;
using Microsoft.AspNetCore.Mvc.ViewFeatures;
using Microsoft.AspNetCore.Razor.TagHelpers;

namespace Credtrack.Web.Plumbing;

/// <summary>&lt;pick for="Form.Setting" legend="Setting" options="…" /&gt;: one of few, all of them in sight. A line of the error summary leads to its first radio.</summary>
[HtmlTargetElement("pick", TagStructure = TagStructure.WithoutEndTag)]
public sealed class Pick(IHtmlGenerator html) : TagHelper
{
    public required ModelExpression For { get; set; }
    public required IEnumerable<SelectListItem> Options { get; set; }
    public string? Legend { get; set; }
    public string? Hint { get; set; }

    [HtmlAttributeNotBound, ViewContext]
    public required ViewContext View { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        var tied = new Tied(For, Hint, View);
        (output.TagName, output.TagMode) = ("fieldset", TagMode.StartTagAndEndTag);
        if (tied.Description is { } description) output.Attributes.SetAttribute("aria-describedby", description);
        var (legend, choices) = (new TagBuilder("legend"), new TagBuilder("div") { Attributes = { ["class"] = "pick" } });
        legend.InnerHtml.Append(string.IsNullOrEmpty(Legend) ? tied.Name : Legend);
        foreach (var (index, option) in Options.Index()) choices.InnerHtml.AppendHtml(Choice(option, index == 0 ? tied.Id : $"{tied.Id}-{index + 1}"));
        output.Content.AppendHtml(legend).AppendHtml(tied.Hint()).AppendHtml(choices).AppendHtml(tied.Fault());
    }

    private TagBuilder Choice(SelectListItem option, string id)
    {
        var (label, words) = (new TagBuilder("label") { Attributes = { ["for"] = id } }, new TagBuilder("span"));
        words.InnerHtml.Append(option.Text);
        label.InnerHtml.AppendHtml(html.GenerateRadioButton(View, For.ModelExplorer, For.Name, option.Value, isChecked: null, new { id })).AppendHtml(words);
        return label;
    }
}
