using Credtrack.Web.Features.Documents.Checks;
using Microsoft.AspNetCore.Razor.TagHelpers;

namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>&lt;answer-figure holding="…" /&gt;: the large column of an answer; solid and met, hatched and open, or struck out.</summary>
[HtmlTargetElement("answer-figure", TagStructure = TagStructure.WithoutEndTag)]
public sealed class AnswerFigure : TagHelper
{
    public required Holding Holding { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        output.TagName = null;
        output.Content.SetHtmlContent(Svg.Hidden(64, 56, Holding switch
        {
            Holding.Stands => """<rect class="fig-solid" x="18" y="0" width="28" height="45"/><path class="fig-notch" d="M46 45l14 -8v16Z"/><path class="fig-mark" d="M18 45H46"/>""",
            Holding.Ended => $"""<rect class="fig-track" x="18" y="0" width="28" height="45"/><path class="fig-hatch" d="{Svg.Hatch(18.5, 0, 27, 29, 6)}"/><path class="fig-rim" d="M18.5 0V29H45.5V0"/><path class="fig-notch open" d="M46 45l14 -8v16Z"/><path class="fig-mark" d="M18 45H46"/>""",
            _ => """<path class="fig-faint" d="M18.5 0V52M45.5 0V52"/><path class="fig-mark" d="M20 12L44 38M44 12L20 38"/>""",
        }));
    }
}
