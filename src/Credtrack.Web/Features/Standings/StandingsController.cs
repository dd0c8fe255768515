namespace Credtrack.Web.Features.Standings;

[Route("standings")]
[Members]
public sealed class StandingsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    /// <summary>A trainee has one standing and goes straight to it; everybody else sees whose there are.</summary>
    [HttpGet("")]
    public async Task<IActionResult> Index(int page = 1)
    {
        if (me.Person.Memberships.All(m => m.Kind == MembershipKind.Trainee)) return LocalRedirect($"~/standings/{me.Person.Id}");
        return View(await TraineesPage.Load(db, me, Math.Clamp(page, 1, 10_000), me.Today(clock)));
    }

    [HttpGet("{personId:guid}")]
    public async Task<IActionResult> Show(Guid personId, StandingQuery query) =>
        await StandingPage.Load(db, me, personId, query, me.Today(clock)) is { } page ? View(page) : NotFound();
}
