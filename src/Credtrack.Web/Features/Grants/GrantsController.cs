using Credtrack.Core.Grants;

namespace Credtrack.Web.Features.Grants;

[Route("grants")]
[Members]
public sealed class GrantsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(int page = 1) => View(await GrantsPage.Load(db, me, Math.Clamp(page, 1, 10_000)));

    [HttpGet("{id:guid}")]
    public async Task<IActionResult> Show(Guid id) => await GrantPage.Load(db, me, id) is { } page ? View(page) : NotFound();

    [HttpGet("new")]
    [Members(MembershipKind.Director)]
    public async Task<IActionResult> New(GrantForm form)
    {
        ModelState.Clear(); // nothing has been sent yet that could be wrong
        return await ProposalPage.Load(db, me, form) is { } page ? View("New", page) : NotFound();
    }

    [HttpPost("")]
    [Members(MembershipKind.Director)]
    public async Task<IActionResult> Create(GrantForm form)
    {
        if (await ProposalPage.Load(db, me, form) is not { } page) return NotFound();
        if (!ModelState.IsValid) return this.Again("New", page);
        var grant = Grant.Propose(me.Person, page.Holder, page.Programme, page.Application, form.Privilege!.Trim(), page.Earlier, clock.UtcNow());
        db.Add(grant);
        await db.SaveChangesAsync();
        return this.Done($"~/grants/{grant.Id}", "Proposed");
    }
}
