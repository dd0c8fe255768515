namespace Credtrack.Web.Features.Sessions.Endings;

[Route("sessions/{sessionId:guid}/endings")]
public sealed class EndingsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid sessionId)
    {
        if (await db.Sessions.SingleOrDefaultAsync(s => s.Id == sessionId && s.AccountId == me.Person.Id) is not { } session) return NotFound();
        session.End(clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done("~/sessions", "Ended");
    }
}
