using Credtrack.Web.Features.Programmes.Invitations;

namespace Credtrack.Web.Features.Programmes.Memberships.Invitations;

[Route("programmes/{programmeId:guid}/memberships/{membershipId:guid}/invitations")]
public sealed class InvitationsController(CredtrackDb db, Me me, TimeProvider clock, Inviting inviting) : Controller
{
    [HttpGet("new")]
    public async Task<IActionResult> New(Guid programmeId, Guid membershipId) => await InvitationPage.Load(db, me, programmeId, membershipId, new InvitationForm(), me.Today(clock)) is { } page ? View("New", page) : NotFound();

    [HttpPost("")]
    public async Task<IActionResult> Create(Guid programmeId, Guid membershipId, InvitationForm form)
    {
        if (await InvitationPage.Load(db, me, programmeId, membershipId, form, me.Today(clock)) is not { } page) return NotFound();
        await page.Judge(inviting, me, ModelState);
        if (!ModelState.IsValid) return this.Again("New", page);
        page.Invite(inviting);
        await db.SaveChangesAsync();
        var back = $"/programmes/{programmeId}/memberships/{membershipId}";
        var links = await inviting.Deliver(form.Delivery, back);
        return links.AllSent ? this.Done($"~{back}", "The link is on its way") : View("Links", links);
    }
}
