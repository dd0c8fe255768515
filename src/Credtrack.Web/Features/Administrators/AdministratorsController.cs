using Credtrack.Web.Features.Programmes.Invitations;

namespace Credtrack.Web.Features.Administrators;

[Route("administrators")]
[Administrators]
public sealed class AdministratorsController(CredtrackDb db, Me me, TimeProvider clock, Inviting inviting) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index() => View(await AdministratorsPage.Load(db, me));

    [HttpGet("new")]
    public IActionResult New() => View("New", new AdministratorPage(new AdministratorForm()));

    [HttpPost("")]
    public async Task<IActionResult> Create(AdministratorForm form)
    {
        var site = await db.Sites.SingleAsync();
        await form.Judge(inviting, site, me, ModelState);
        if (!ModelState.IsValid) return this.Again("New", new AdministratorPage(form));
        form.Appoint(site, me, inviting, clock.UtcNow());
        await db.SaveChangesAsync();
        var links = await inviting.Deliver(form.Delivery, "/administrators");
        return links.AllSent ? this.Done("~/administrators", "Appointed") : View("Links", links);
    }
}
