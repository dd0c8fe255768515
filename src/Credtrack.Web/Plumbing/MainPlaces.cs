using Microsoft.AspNetCore.Mvc.Rendering;
using Microsoft.AspNetCore.Mvc.ViewFeatures;
using Microsoft.AspNetCore.Razor.TagHelpers;

namespace Credtrack.Web.Plumbing;

/// <summary>&lt;sites&gt;&lt;site href="~/scans"&gt;Scan log&lt;/site&gt;&lt;/sites&gt;: the main places. The one that is open, or under which the open page lies, is marked.</summary>
[HtmlTargetElement("sites")]
public sealed class MainPlaces : TagHelper
{
    private readonly List<(PathString Path, string Words)> places = [];

    [HtmlAttributeNotBound, ViewContext]
    public required ViewContext View { get; set; }

    public override void Init(TagHelperContext context) => context.Items[typeof(MainPlaces)] = this;

    public void Add(PathString path, string words) => places.Add((path, words));

    public override async Task ProcessAsync(TagHelperContext context, TagHelperOutput output)
    {
        await output.GetChildContentAsync();
        var request = View.HttpContext.Request;
        // The longest that fits: /scans/new is itself, although it lies under /scans too.
        var here = places.Select(p => p.Path).Where(p => request.Path.StartsWithSegments(p)).OrderByDescending(p => p.Value!.Length).FirstOrDefault();
        output.TagName = "nav";
        output.Attributes.SetAttribute("class", "sites");
        output.Attributes.SetAttribute("aria-label", "Main");
        output.Content.Clear();
        foreach (var (path, words) in places)
        {
            var link = new TagBuilder("a") { Attributes = { ["href"] = request.PathBase + path } };
            if (path == here) link.Attributes["aria-current"] = path == request.Path ? "page" : "true";
            link.InnerHtml.AppendHtml(words);
            output.Content.AppendHtml(link);
        }
    }
}

/// <summary>One place of the &lt;sites&gt; around it.</summary>
[HtmlTargetElement("site", ParentTag = "sites")]
public sealed class MainPlace : TagHelper
{
    public required string Href { get; set; }

    public override async Task ProcessAsync(TagHelperContext context, TagHelperOutput output)
    {
        var words = await output.GetChildContentAsync();
        ((MainPlaces)context.Items[typeof(MainPlaces)]).Add(Href.TrimStart('~'), words.GetContent());
        output.SuppressOutput();
    }
}
