using Microsoft.AspNetCore.Razor.TagHelpers;

namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>&lt;swatch kind="Hatch" /&gt;: the fill alone, for a legend.</summary>
[HtmlTargetElement("swatch", TagStructure = TagStructure.WithoutEndTag)]
public sealed class Swatch : TagHelper
{
    public required SwatchKind Kind { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        output.TagName = null;
        output.Content.SetHtmlContent(Swatches.Of(Kind));
    }
}

/// <summary>&lt;state kind="Solid"&gt;counts&lt;/state&gt;: the fill and the word, never one without the other.</summary>
[HtmlTargetElement("state")]
public sealed class State : TagHelper
{
    public required SwatchKind Kind { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        output.TagName = "span";
        output.Attributes.SetAttribute("class", "state");
        output.PreContent.SetHtmlContent(Swatches.Of(Kind) + "<span>");
        output.PostContent.SetHtmlContent("</span>");
    }
}

/// <summary>&lt;icon name="Note" /&gt;</summary>
[HtmlTargetElement("icon", TagStructure = TagStructure.WithoutEndTag)]
public sealed class Icon : TagHelper
{
    public required IconName Name { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        output.TagName = null;
        output.Content.SetHtmlContent(Icons.Of(Name));
    }
}
