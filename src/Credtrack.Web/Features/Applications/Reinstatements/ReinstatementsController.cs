namespace Credtrack.Web.Features.Applications.Reinstatements;

/// <summary>One button on the page of a retired application: it is offered again.</summary>
[Route("applications/{applicationId:guid}/reinstatements")]
[Members(MembershipKind.Coordinator)]
public sealed class ReinstatementsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid applicationId)
    {
        if (await db.Applications.SingleOrDefaultAsync(a => a.Id == applicationId) is not { } application) return NotFound();
        application.BringBack(me.Person, await db.Applications.AsNoTracking().ToListAsync(), clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/applications/{applicationId}", "Back in the catalogue");
    }
}
