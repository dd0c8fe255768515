namespace Credtrack.Web.Features.Rulebooks;

[Route("rulebooks")]
[Members]
public sealed class RulebooksController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(int page = 1) => View(await RulebooksPage.Load(db, me.Person, Math.Clamp(page, 1, 10_000)));

    [HttpGet("{id:guid}")]
    public async Task<IActionResult> Show(Guid id) => await RulebookPage.Load(db, me, id) is { } page ? View(page) : NotFound();

    [HttpGet("new")]
    [Members(MembershipKind.Director, MembershipKind.Coordinator)]
    public async Task<IActionResult> New(RulebookForm form)
    {
        ModelState.Clear(); // nothing has been sent yet that could be wrong
        return await RulebookFormPage.Load(db, me, form) is { } page ? View("New", page) : NotFound();
    }

    [HttpPost("")]
    [Members(MembershipKind.Director, MembershipKind.Coordinator)]
    [RequestSizeLimit(RulebookForm.LongestForm), RequestFormLimits(ValueLengthLimit = RulebookForm.LongestForm, MultipartBodyLengthLimit = RulebookForm.LongestForm)]
    public async Task<IActionResult> Create(RulebookForm form)
    {
        await form.Take(ModelState);
        if (await RulebookFormPage.Load(db, me, form) is not { } page) return NotFound();
        page.Tell(ModelState);
        if (!ModelState.IsValid) return this.Again("New", page);
        if (!form.Publishes) return View("New", page);
        var rulebook = page.Publish(me.Person, clock.UtcNow());
        db.Add(rulebook);
        await db.SaveChangesAsync();
        return this.Done($"~/rulebooks/{rulebook.Id}", $"Version {rulebook.Edition} is published and in force");
    }
}
