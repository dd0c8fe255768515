using Credtrack.Core;
using Credtrack.Core.Catalogue;

namespace Credtrack.Web.Features.Applications;

/// <summary>The catalogue. It is the site's: a coordinator of any programme edits it, every member reads it.</summary>
[Route("applications")]
[Members]
public sealed class ApplicationsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(int page = 1) => View(await CataloguePage.Load(db, me.Person, Math.Clamp(page, 1, 10_000)));

    [HttpGet("{id:guid}")]
    public async Task<IActionResult> Show(Guid id) => await ApplicationPage.Load(db, me.Person, id) is { } page ? View(page) : NotFound();

    [HttpGet("new")]
    [Members(MembershipKind.Coordinator)]
    public async Task<IActionResult> New(ApplicationForm form)
    {
        ModelState.Clear(); // nothing has been sent yet that could be wrong
        return View("New", await ApplicationFormPage.Load(db, me.Person, form));
    }

    [HttpPost("")]
    [Members(MembershipKind.Coordinator)]
    public async Task<IActionResult> Create(ApplicationForm form)
    {
        if (form.AsksForARow) return this.Asked("New", await ApplicationFormPage.Load(db, me.Person, form.WithARow()));
        form.Tidy(ModelState);
        var page = await ApplicationFormPage.Load(db, me.Person, form);
        if (page.ToEntry(ModelState) is not { } entry) return this.Again("New", page);
        var application = Application.Add(me.Person, form.Code!.Trim(), form.Kind, entry, page.Catalogue, clock.UtcNow());
        db.Add(application);
        await db.SaveChangesAsync();
        return this.Done($"~/applications/{application.Id}", "Added to the catalogue");
    }

    /// <param name="form">what was typed, where a change that lost a race is shown again</param>
    [HttpGet("{id:guid}/edit")]
    [Members(MembershipKind.Coordinator)]
    public async Task<IActionResult> Edit(Guid id, ApplicationForm form)
    {
        if (await db.Applications.AsNoTracking().Find(id) is not { } application) return NotFound();
        var page = await ApplicationFormPage.Load(db, me.Person, HttpMethods.IsPost(Request.Method) ? form : null, application);
        page.Form.Version = application.Version; // with the old one a second try would lose as well
        return View("Edit", page);
    }

    [HttpPost("{id:guid}")]
    [Members(MembershipKind.Coordinator)]
    public async Task<IActionResult> Update(Guid id, ApplicationForm form)
    {
        if (await db.Applications.SingleOrDefaultAsync(a => a.Id == id) is not { } application) return NotFound();
        db.Seen(application, form.Version);
        if (form.AsksForARow) return this.Asked("Edit", await ApplicationFormPage.Load(db, me.Person, form.WithARow(), application));
        form.Tidy(ModelState);
        var page = await ApplicationFormPage.Load(db, me.Person, form, application);
        RuleBroken.If(page.WhyNot);
        if (page.ToEntry(ModelState) is not { } entry) return this.Again("Edit", page);
        application.Change(me.Person, entry, page.Catalogue, clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/applications/{id}", "Changes kept");
    }
}
