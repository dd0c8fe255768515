namespace Credtrack.Web.Features.Home;

[Route("")]
public sealed class HomeController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index() => View(await HomePage.Load(db, me, clock.UtcNow()));
}
