namespace Credtrack.Web.Features.Cohorts;

/// <summary>Who may see scans of a programme may see its trainees side by side; to everybody else there is no sheet.</summary>
[Route("cohorts")]
[Members]
public sealed class CohortsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(CohortQuery query) =>
        await CohortPage.Load(db, me, query, me.Today(clock)) is { } page ? View(page) : NotFound();
}
