using Credtrack.Web.Features.Programmes.Invitations;

namespace Credtrack.Web.Features.Administrators.Invitations;

/// <summary>A link with which an administrator chooses a password, the first or a new one. It goes to their own address.</summary>
[Route("administrators/{personId:guid}/invitations")]
[Administrators]
public sealed class InvitationsController(CredtrackDb db, Inviting inviting) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid personId)
    {
        var person = await db.People.Include(p => p.Invitations).SingleOrDefaultAsync(p => p.Id == personId && db.Sites.SelectMany(s => s.Administrators).Any(a => a.PersonId == p.Id && a.EndedAt == null));
        if (person is null || await db.Users.SingleOrDefaultAsync(a => a.Id == personId) is not { } account) return NotFound();
        inviting.Invite(person, account, InvitationKind.Member);
        await db.SaveChangesAsync();
        return (await inviting.Deliver(Delivery.ByMail, "/administrators")) is { AllSent: false } links && !account.HasPassword ? View("Links", links) : this.Done("~/administrators", "The link is on its way");
    }
}
