namespace Credtrack.Web.Features.Scans.Pictures;

/// <summary>A picture is served only through its scan, to who may see that scan, and is kept by nobody on the way.</summary>
[Route("scans/{scanId:guid}/pictures")]
[Members]
public sealed class PicturesController(CredtrackDb db, Me me, PictureFiles files) : Controller
{
    [HttpGet("{id:guid}")]
    public async Task<IActionResult> Show(Guid scanId, Guid id)
    {
        var sha256 = await db.ScansVisibleTo(me.Person).Where(s => s.Id == scanId)
            .SelectMany(s => s.Pictures.Where(p => p.Id == id && p.RemovedAt == null).Select(p => p.Sha256)).SingleOrDefaultAsync();
        if (sha256 is null || files.Open(sha256) is not { } bytes) return NotFound();
        Response.Headers.CacheControl = "private, no-store";
        Response.Headers.ContentSecurityPolicy = "default-src 'none'; sandbox";
        Response.Headers["Cross-Origin-Resource-Policy"] = "same-origin";
        return File(bytes, "image/jpeg");
    }
}
