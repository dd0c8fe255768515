namespace Credtrack.Web.Features.Programmes.Memberships.Leaves.Withdrawals;

[Route("programmes/{programmeId:guid}/memberships/{membershipId:guid}/leaves/{leaveId:guid}/withdrawals")]
[Members(MembershipKind.Coordinator)]
public sealed class WithdrawalsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid programmeId, Guid membershipId, Guid leaveId)
    {
        if (await MembershipPage.Find(db.People, db, me, programmeId, membershipId) is not var (person, membership)) return NotFound();
        if (membership.Leaves.SingleOrDefault(l => l.Id == leaveId) is not { } leave) return NotFound();
        person.TakeBack(me.Person, me.Site, leave, clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/programmes/{programmeId}/memberships/{membershipId}", "Taken back");
    }
}
