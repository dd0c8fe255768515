using Microsoft.AspNetCore.Razor.TagHelpers;

namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>&lt;queue-strip position="7" length="20" /&gt;: where in the queue the reader is; the words "7 of 20" stand beside it.</summary>
[HtmlTargetElement("queue-strip", TagStructure = TagStructure.WithoutEndTag)]
public sealed class QueueStrip : TagHelper
{
    public required int Position { get; set; }
    public required int Length { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        output.TagName = null;
        output.Content.SetHtmlContent(BenchDrawings.Queue(Position, Length));
    }
}

/// <summary>&lt;closed-strip&gt;The trainee's own answers stay closed until you have given yours.&lt;/closed-strip&gt;: the strip and its sentence.</summary>
[HtmlTargetElement("closed-strip")]
public sealed class ClosedStrip : TagHelper
{
    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        output.TagName = "div";
        output.Attributes.SetAttribute("class", "closed");
        output.PreContent.SetHtmlContent(BenchDrawings.Closed() + "<p class=\"note\">");
        output.PostContent.SetHtmlContent("</p>");
    }
}
