using Credtrack.Web.Features.Programmes.Invitations;

namespace Credtrack.Web.Features.Programmes.Memberships;

[Route("programmes/{programmeId:guid}/memberships")]
public sealed class MembershipsController(CredtrackDb db, Me me, TimeProvider clock, Inviting inviting) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(Guid programmeId, MembershipsFilter filter) =>
        await MembershipsPage.Load(db, me, programmeId, filter, me.Today(clock)) is { } page ? View(page) : NotFound();

    [HttpGet("{id:guid}")]
    public async Task<IActionResult> Show(Guid programmeId, Guid id) => await MembershipPage.Load(db, me, programmeId, id, me.Today(clock)) is { } page ? View(page) : NotFound();

    [HttpGet("new")]
    public async Task<IActionResult> New(Guid programmeId) =>
        await NewMembershipPage.Load(db, me, programmeId, new MembershipForm { FirstDay = me.Today(clock) }) is { } page ? View("New", page) : NotFound();

    [HttpPost("")]
    public async Task<IActionResult> Create(Guid programmeId, MembershipForm form)
    {
        if (await NewMembershipPage.Load(db, me, programmeId, form) is not { } page) return NotFound();
        await page.Judge(inviting, ModelState);
        if (!ModelState.IsValid) return this.Again("New", page);
        page.Admit(me, inviting, clock.UtcNow());
        await db.SaveChangesAsync();
        var links = await inviting.Deliver(form.Delivery, $"/programmes/{programmeId}/memberships");
        return links.AllSent ? this.Done($"~/programmes/{programmeId}/memberships", links.Lines.Count > 0 ? "Saved, and the link is on its way" : "Saved") : View("Links", links);
    }

    [HttpGet("{id:guid}/edit")]
    public async Task<IActionResult> Edit(Guid programmeId, Guid id) => await EditPage.Load(db, me, programmeId, id, me.Today(clock)) is { } page ? View("Edit", page) : NotFound();

    [HttpPost("{id:guid}")]
    public async Task<IActionResult> Update(Guid programmeId, Guid id, EditForm form)
    {
        if (await EditPage.Load(db, me, programmeId, id, me.Today(clock)) is not { } page) return NotFound();
        page = page with { Form = form };
        page.Judge(ModelState);
        if (!ModelState.IsValid) return this.Again("Edit", page);
        db.Seen(page.Person, form.Version);
        page.Change(me, clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/programmes/{programmeId}/memberships/{id}", "Saved");
    }
}
