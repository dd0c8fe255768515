namespace Credtrack.Web.Features.Sites;

[Route("sites")]
[Administrators]
public sealed class SitesController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("{id:guid}/edit")]
    public async Task<IActionResult> Edit(Guid id) => await SitePage.Load(db, id) is { } page ? View("Edit", page) : NotFound();

    [HttpPost("{id:guid}")]
    public async Task<IActionResult> Update(Guid id, SiteForm form)
    {
        if (await db.Sites.SingleOrDefaultAsync(s => s.Id == id) is not { } site) return NotFound();
        var entry = form.ToEntry(ModelState);
        if (!ModelState.IsValid) return this.Again("Edit", (await SitePage.Load(db, id))! with { Form = form });
        db.Seen(site, form.Version);
        site.Change(me.Person, entry, clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/sites/{id}/edit", "Saved");
    }
}
