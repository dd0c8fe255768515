using Microsoft.AspNetCore.Http.Features;
using Microsoft.AspNetCore.Http.Metadata;

namespace Credtrack.Web.Plumbing;

/// <summary>
/// A browser shows no answer that comes while it is still sending, only a broken connection. So a form over the limit of its address
/// is let in to its end and thrown away unread, and then answered; only what is far over it is cut off.
/// </summary>
public static class TooLong
{
    private const int FarOver = 4;

    public static async Task Answer(HttpContext context, RequestDelegate next)
    {
        var limit = context.GetEndpoint()?.Metadata.GetMetadata<IRequestSizeLimitMetadata>()?.MaxRequestBodySize;
        if (limit is null || context.Request.ContentLength is not { } length || length <= limit)
        {
            await next(context);
            return;
        }
        if (length <= limit * FarOver && context.Features.Get<IHttpMaxRequestBodySizeFeature>() is { IsReadOnly: false } most)
        {
            most.MaxRequestBodySize = null;
            await context.Request.Body.CopyToAsync(Stream.Null, context.RequestAborted);
        }
        // The error page must not look for a form in what is gone.
        (context.Request.ContentType, context.Request.ContentLength) = (null, null);
        context.Response.StatusCode = StatusCodes.Status413PayloadTooLarge;
    }
}
