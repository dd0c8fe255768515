using System.ComponentModel.DataAnnotations;
using System.Linq.Expressions;
using System.Text.Encodings.Web;
using AngleSharp.Dom;
using AngleSharp.Html.Parser;
using Microsoft.AspNetCore.Http;
using Microsoft.AspNetCore.Mvc;
using Microsoft.AspNetCore.Mvc.ModelBinding;
using Microsoft.AspNetCore.Mvc.Rendering;
using Microsoft.AspNetCore.Mvc.ViewEngines;
using Microsoft.AspNetCore.Mvc.ViewFeatures;
using Microsoft.AspNetCore.Razor.TagHelpers;
using Microsoft.Extensions.DependencyInjection;

namespace Credtrack.Web.Tests.Plumbing;

public sealed class Typed
{
    [Display(Name = "Image quality")]
    public int? Quality { get; set; }

    public DateOnly? Day { get; set; }
    public DateTime? PerformedAt { get; set; }
    public string? Setting { get; set; }

    [Display(Name = "Clinically indicated")]
    public bool Indicated { get; set; }
}

/// <summary>House tags, written by the program's own parts for a form with what was typed and what is wrong with it.</summary>
internal sealed class Tags
{
    private readonly ViewDataDictionary<Typed> data;
    private readonly IServiceProvider services;

    public Tags(IServiceProvider services, Typed form)
    {
        this.services = services;
        data = new(services.GetRequiredService<IModelMetadataProvider>(), new ModelStateDictionary()) { Model = form };
        var http = new DefaultHttpContext { RequestServices = services };
        var action = new ActionContext(http, new(), new(), data.ModelState);
        var carried = new TempDataDictionary(http, services.GetRequiredService<ITempDataProvider>());
        View = new(action, new NoView(), data, carried, TextWriter.Null, new() { ClientValidationEnabled = false });
    }

    public ViewContext View { get; }
    public IHtmlGenerator Html => services.GetRequiredService<IHtmlGenerator>();
    public ModelStateDictionary State => data.ModelState;

    public ModelExpression For<T>(Expression<Func<Typed, T>> field) => services.GetRequiredService<ModelExpressionProvider>().CreateModelExpression(data, field);

    public static IElement Written(TagHelper tag, string inner = "")
    {
        var context = new TagHelperContext([], new Dictionary<object, object>(), "1");
        var output = new TagHelperOutput("tag", [], (_, _) => Task.FromResult(new DefaultTagHelperContent().SetHtmlContent(inner)));
        tag.Init(context);
        tag.Process(context, output);
        using var text = new StringWriter();
        output.WriteTo(text, HtmlEncoder.Default);
        return new HtmlParser().ParseDocument(text.ToString()).Body!;
    }

    private sealed class NoView : IView
    {
        public string Path => "";

        public Task RenderAsync(ViewContext context) => throw new NotSupportedException("Only tags are written here.");
    }
}
