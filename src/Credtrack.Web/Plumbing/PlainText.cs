using Microsoft.AspNetCore.Mvc.ModelBinding;
using Microsoft.AspNetCore.Mvc.ModelBinding.Binders;

namespace Credtrack.Web.Plumbing;

/// <summary>
/// No text of a form holds what cannot be seen: control characters, which no database keeps alike, and marks that turn the direction of what
/// follows, with which a name can be made to read as another. A password is never shown and may hold anything.
/// </summary>
public sealed class PlainText(IModelBinder text) : IModelBinder
{
    public async Task BindModelAsync(ModelBindingContext bindingContext)
    {
        await text.BindModelAsync(bindingContext);
        if (bindingContext.Result.Model is not string typed || Hidden(typed) is not { } hidden) return;
        bindingContext.ModelState.TryAddModelError(bindingContext.ModelName, $"This text holds a character that cannot be seen (U+{(int)hidden:X4}). Type it anew here instead of pasting it.");
    }

    public static char? Hidden(string text)
    {
        foreach (var letter in text)
            if ((char.IsControl(letter) && letter is not ('\r' or '\n' or '\t')) || letter is '\u061C' or (>= '\u200E' and <= '\u200F') or (>= '\u202A' and <= '\u202E') or (>= '\u2066' and <= '\u2069') || letter is '\u2028' or '\u2029' or '\uFEFF') return letter;
        return null;
    }
}

public sealed class PlainTexts : IModelBinderProvider
{
    public IModelBinder? GetBinder(ModelBinderProviderContext context) =>
        context.Metadata.ModelType == typeof(string) && context.Metadata.DataTypeName != "Password" && context.BindingInfo.BindingSource != BindingSource.Path
            ? new PlainText(new SimpleTypeModelBinder(typeof(string), context.Services.GetRequiredService<ILoggerFactory>()))
            : null;
}
