namespace Credtrack.Web.Features.Grants.Endings;

[Route("grants/{grantId:guid}/endings")]
[Members(MembershipKind.Director)]
public sealed class EndingsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("new")]
    public async Task<IActionResult> New(Guid grantId) =>
        await ReasonPage.Load(db, me.Person, grantId, (grant, by) => grant.WhyNotEnd(by), new ReasonForm()) is { } page ? View("New", page) : NotFound();

    [HttpPost("")]
    public async Task<IActionResult> Create(Guid grantId, ReasonForm form)
    {
        if (await db.GrantsVisibleTo(me.Person).Find(grantId) is not { } grant) return NotFound();
        if (!ModelState.IsValid) return this.Again("New", await ReasonPage.Load(db, me.Person, grantId, (one, by) => one.WhyNotEnd(by), form));
        db.Seen(grant, form.Version);
        grant.End(me.Person, form.Reason!.Trim(), clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/grants/{grantId}", "Ended");
    }
}
