using Microsoft.AspNetCore.Razor.TagHelpers;

namespace Credtrack.Web.Features.Shared.Figures;

/// <summary>&lt;depth-figures for="@depth" unit="@chart" /&gt;: the column and the row; the stylesheet shows the one that has room. Without unit it is a chart of its own.</summary>
[HtmlTargetElement("depth-figures", TagStructure = TagStructure.WithoutEndTag)]
public sealed class DepthFigures : TagHelper
{
    public required Depth For { get; set; }
    public DepthUnit? Unit { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        var unit = Unit ?? Depth.UnitFor([For]);
        output.TagName = null;
        output.Content.SetHtmlContent(DepthDrawing.Column(For, unit) + DepthDrawing.Row(For, unit));
    }
}

/// <summary>&lt;short-row for="@depth" /&gt;: for lists and tiles, with its words beside it.</summary>
[HtmlTargetElement("short-row", TagStructure = TagStructure.WithoutEndTag)]
public sealed class ShortRow : TagHelper
{
    public required Depth For { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        output.TagName = null;
        output.Content.SetHtmlContent(ShortDrawing.Of(For));
    }
}

/// <summary>&lt;depth-legend unit="@chart" /&gt;: what the fills and marks of a depth chart mean, and how far apart its ticks are.</summary>
[HtmlTargetElement("depth-legend", TagStructure = TagStructure.WithoutEndTag)]
public sealed class DepthLegend : TagHelper
{
    public DepthUnit? Unit { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        var unit = Unit ?? DepthUnit.For(0);
        (output.TagName, output.TagMode) = ("p", TagMode.StartTagAndEndTag);
        output.Attributes.SetAttribute("class", "legend");
        output.Content.SetHtmlContent(string.Concat(Meanings(unit).Select(m => $"<span>{Swatches.Of(m.Kind)}{m.Words}</span>")));
    }

    private static (SwatchKind Kind, string Words)[] Meanings(DepthUnit unit) =>
    [
        (SwatchKind.Solid, "counts"),
        (SwatchKind.Hatch, "waits for a reading"),
        (SwatchKind.Over, "beyond the requirement"),
        (SwatchKind.Unmet, "required count"),
        (SwatchKind.Met, "reached, all conditions met"),
        (SwatchKind.Shadow, "over a cap"),
        (SwatchKind.Stall, "stalled"),
        (SwatchKind.Ticks, $"every {unit.Tick} scans, longer every {unit.LongTick}"),
    ];
}

/// <summary>&lt;depth-cell for="@depth" /&gt;: for the cohort sheet, with its words under it.</summary>
[HtmlTargetElement("depth-cell", TagStructure = TagStructure.WithoutEndTag)]
public sealed class DepthCell : TagHelper
{
    public required Depth For { get; set; }

    public override void Process(TagHelperContext context, TagHelperOutput output)
    {
        output.TagName = null;
        output.Content.SetHtmlContent(CellDrawing.Of(For));
    }
}
