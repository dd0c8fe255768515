namespace Credtrack.Web.Features.FollowUps;

[Route("follow-ups")]
[Members]
public sealed class FollowUpsController(CredtrackDb db, Me me) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(int page = 1) => View(await FollowUpsPage.Load(db, me.Person, Math.Clamp(page, 1, 10_000)));

    [HttpGet("{id:guid}")]
    public async Task<IActionResult> Show(Guid id) => await FollowUpPage.Load(db, me.Person, id) is { } page ? View(page) : NotFound();
}
