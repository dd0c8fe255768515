namespace Credtrack.Web.Features.Administrators.Endings;

[Route("administrators/{personId:guid}/endings")]
[Administrators]
public sealed class EndingsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid personId)
    {
        var site = await db.Sites.SingleAsync();
        if (await db.People.SingleOrDefaultAsync(p => p.Id == personId) is not { } person || !site.IsAdministeredBy(person)) return NotFound();
        site.Dismiss(me.Person, person, await AdministratorsPage.SigningIn(db), clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done(personId == me.Person.Id ? "~/" : "~/administrators", "Ended");
    }
}
