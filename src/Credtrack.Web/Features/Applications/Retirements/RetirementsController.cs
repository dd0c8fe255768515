namespace Credtrack.Web.Features.Applications.Retirements;

/// <summary>One button on the page of an application: it is not offered for new scans any more.</summary>
[Route("applications/{applicationId:guid}/retirements")]
[Members(MembershipKind.Coordinator)]
public sealed class RetirementsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid applicationId)
    {
        if (await db.Applications.SingleOrDefaultAsync(a => a.Id == applicationId) is not { } application) return NotFound();
        application.Retire(me.Person, clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/applications/{applicationId}", "Retired");
    }
}
