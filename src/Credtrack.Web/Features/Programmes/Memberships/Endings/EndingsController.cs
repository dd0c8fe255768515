namespace Credtrack.Web.Features.Programmes.Memberships.Endings;

/// <summary>One button: the membership opens nothing from this moment on.</summary>
[Route("programmes/{programmeId:guid}/memberships/{membershipId:guid}/endings")]
public sealed class EndingsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid programmeId, Guid membershipId)
    {
        if (await MembershipPage.Find(db.People, db, me, programmeId, membershipId) is not var (person, membership)) return NotFound();
        var today = me.Today(clock);
        person.End(me.Person, me.Site, membership, await EditPage.CoordinatorsOf(db, programmeId, today), today, clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/programmes/{programmeId}/memberships/{membershipId}", "Ended");
    }
}
