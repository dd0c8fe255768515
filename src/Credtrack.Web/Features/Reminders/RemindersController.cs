namespace Credtrack.Web.Features.Reminders;

/// <summary>One's own, with or without mail.</summary>
[Route("reminders")]
public sealed class RemindersController(CredtrackDb db, Me me) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(int page = 1) => View(await RemindersPage.Load(db, me.Person, Math.Clamp(page, 1, 10_000)));
}
