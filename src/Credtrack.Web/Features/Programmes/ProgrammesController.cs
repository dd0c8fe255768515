using Credtrack.Web.Features.Programmes.Invitations;
using Credtrack.Web.Features.Scans;

namespace Credtrack.Web.Features.Programmes;

[Route("programmes")]
public sealed class ProgrammesController(CredtrackDb db, Me me, TimeProvider clock, Inviting inviting) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(int page = 1) => View(await ProgrammesPage.Load(db, me, me.Today(clock), Math.Clamp(page, 1, 10_000)));

    [HttpGet("new")]
    [Administrators]
    public IActionResult New(ProgrammeForm form)
    {
        ModelState.Clear(); // nothing has been sent yet that could be wrong
        return View("New", new ProgrammePage(null, form));
    }

    [HttpPost("")]
    [Administrators]
    public async Task<IActionResult> Create(ProgrammeForm form)
    {
        await form.Judge(db, inviting, ModelState);
        if (!ModelState.IsValid) return this.Again("New", new ProgrammePage(null, form));
        var programme = form.Found(db, me, inviting, clock.UtcNow());
        await db.SaveChangesAsync();
        var links = await inviting.Deliver(form.Delivery, $"/programmes/{programme.Id}/memberships");
        return links.AllSent ? this.Done($"~/programmes/{programme.Id}/memberships", "Founded") : View("Links", links);
    }

    [HttpGet("{id:guid}/edit")]
    [Administrators]
    public async Task<IActionResult> Edit(Guid id) => await db.Programmes.AsNoTracking().Find(id) is { } programme
        ? View("Edit", new RenamingPage(programme, await HistoryLine.Latest(db, id), new RenamingForm { Name = programme.Name, Version = programme.Version })) : NotFound();

    [HttpPost("{id:guid}")]
    [Administrators]
    public async Task<IActionResult> Update(Guid id, RenamingForm form)
    {
        if (await db.Programmes.SingleOrDefaultAsync(p => p.Id == id) is not { } programme) return NotFound();
        if (ModelState.IsValid && await db.Programmes.AnyAsync(p => p.Id != id && p.Name == form.Name!.Trim())) ModelState.AddModelError("Form.Name", "Another programme has this name already.");
        if (!ModelState.IsValid) return this.Again("Edit", new RenamingPage(programme, await HistoryLine.Latest(db, id), form));
        db.Seen(programme, form.Version);
        programme.Rename(me.Person, me.Site, form.Name!.Trim(), clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done("~/programmes", "Renamed");
    }
}
