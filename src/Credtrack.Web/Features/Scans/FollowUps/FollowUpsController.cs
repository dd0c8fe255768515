using Credtrack.Core.FollowUps;

namespace Credtrack.Web.Features.Scans.FollowUps;

/// <summary>One button on the page of a scan that one has read.</summary>
[Route("scans/{scanId:guid}/follow-ups")]
[Members(MembershipKind.Reader)]
public sealed class FollowUpsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid scanId)
    {
        if (await db.ScansVisibleTo(me.Person).Find(scanId) is not { } scan) return NotFound();
        var followUp = FollowUp.Open(me.Person, scan, await db.FollowUps.Where(f => f.ScanId == scanId).ToListAsync(), clock.UtcNow());
        db.Add(followUp);
        await db.SaveChangesAsync();
        return this.Done($"~/follow-ups/{followUp.Id}", "Follow-up opened");
    }
}
