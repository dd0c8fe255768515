using System.Text;

namespace Credtrack.Web.Features.Rulebooks.Files;

/// <summary>An edition as the file that it is, to be kept, compared or evaluated elsewhere.</summary>
[Route("rulebooks/{rulebookId:guid}/files")]
[Members]
public sealed class FilesController(CredtrackDb db, Me me) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(Guid rulebookId) =>
        await db.RulebooksVisibleTo(me.Person).Where(r => r.Id == rulebookId).Select(r => new { r.Text, r.Edition }).SingleOrDefaultAsync() is { } rulebook
            ? File(Encoding.UTF8.GetBytes(rulebook.Text), "application/json", $"rulebook-version-{rulebook.Edition}.json") : NotFound();
}
