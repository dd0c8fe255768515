namespace Credtrack.Web.Features.Sessions;

[Route("sessions")]
public sealed class SessionsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index() => View(await SessionsPage.Load(db, me, clock.UtcNow()));
}
