namespace Credtrack.Web.Features.FollowUps.Closings;

[Route("follow-ups/{followUpId:guid}/closings")]
[Members]
public sealed class ClosingsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("new")]
    public async Task<IActionResult> New(Guid followUpId) =>
        await ClosingPage.Load(db, me.Person, followUpId, new ClosingForm { ToldAt = clock.UtcNow().In(me.Zone) }) is { } page ? View("New", page) : NotFound();

    [HttpPost("")]
    public async Task<IActionResult> Create(Guid followUpId, ClosingForm form)
    {
        if (await db.FollowUpsVisibleTo(me.Person).Find(followUpId) is not { } followUp) return NotFound();
        db.Seen(followUp, form.Version);
        if (form.ToEntry(followUp.ReadAt, me.Zone, clock.UtcNow(), ModelState) is not { } entry) return this.Again("New", await ClosingPage.Load(db, me.Person, followUpId, form));
        followUp.Close(me.Person, entry, clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/follow-ups/{followUpId}", "Follow-up closed");
    }
}
