namespace Credtrack.Web.Features.Programmes.Invitations;

[Route("programmes/{programmeId:guid}/invitations")]
[Members(MembershipKind.Coordinator)]
public sealed class InvitationsController(CredtrackDb db, Me me, TimeProvider clock, Inviting inviting) : Controller
{
    [HttpGet("new")]
    public async Task<IActionResult> New(Guid programmeId) => await ListPage.Load(db, me, programmeId, new ListForm()) is { } page ? View("New", page) : NotFound();

    /// <summary>First shows what the list will do; saves when that has been seen.</summary>
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid programmeId, ListForm form)
    {
        if (await ListPage.Load(db, me, programmeId, form) is not { } page) return NotFound();
        await page.Judge(inviting, me, me.Today(clock), ModelState);
        if (!ModelState.IsValid) return this.Again("New", page);
        if (form.Seen != form.List) return View("New", page.Previewed(ModelState));
        page.Admit(me, inviting, clock.UtcNow());
        await db.SaveChangesAsync();
        var links = await inviting.Deliver(form.Delivery, $"/programmes/{programmeId}/memberships");
        return links.AllSent ? this.Done($"~/programmes/{programmeId}/memberships", $"{page.Rows.Count.Of("person", "people")} admitted") : View("Links", links);
    }
}
