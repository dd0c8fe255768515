namespace Credtrack.Web.Features.Rulebooks;

[Route("rulebooks")]
[Members]
public sealed class RulebooksController(CredtrackDb db, Me me) : Controller
{
    [HttpGet("{id:guid}")]
    public async Task<IActionResult> Show(Guid id) => await RulebookPage.Load(db, me, id) is { } page ? View(page) : NotFound();
}
