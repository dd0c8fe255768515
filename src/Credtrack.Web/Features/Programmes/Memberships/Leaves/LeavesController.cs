namespace Credtrack.Web.Features.Programmes.Memberships.Leaves;

[Route("programmes/{programmeId:guid}/memberships/{membershipId:guid}/leaves")]
[Members(MembershipKind.Coordinator)]
public sealed class LeavesController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("new")]
    public async Task<IActionResult> New(Guid programmeId, Guid membershipId) => await LeavePage.Load(db, me, programmeId, membershipId, new LeaveForm()) is { } page ? View("New", page) : NotFound();

    [HttpPost("")]
    public async Task<IActionResult> Create(Guid programmeId, Guid membershipId, LeaveForm form)
    {
        if (await LeavePage.Load(db, me, programmeId, membershipId, form) is not { } page) return NotFound();
        page.Judge(ModelState);
        if (!ModelState.IsValid) return this.Again("New", page);
        page.Person.NoteLeave(me.Person, me.Site, page.Membership.Programme, form.FirstDay!.Value, form.LastDay!.Value, clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/programmes/{programmeId}/memberships/{membershipId}", "Noted");
    }
}
