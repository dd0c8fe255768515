namespace Credtrack.Web.Features.Documents;

/// <summary>The paper as it was issued, byte for byte, for those who may see its grant.</summary>
[Route("documents")]
[Members]
public sealed class DocumentsController(CredtrackDb db, Me me) : Controller
{
    [HttpGet("{id:guid}")]
    public async Task<IActionResult> Show(Guid id)
    {
        var document = await db.GrantsVisibleTo(me.Person).SelectMany(g => g.Documents).AsNoTracking().SingleOrDefaultAsync(d => d.Id == id);
        if (document is null) return NotFound();
        Response.Headers.CacheControl = "private, no-store";
        return File(document.Bytes, "application/pdf", $"competency-summary-{document.Code}.pdf");
    }
}
