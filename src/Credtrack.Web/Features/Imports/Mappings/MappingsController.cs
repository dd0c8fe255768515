namespace Credtrack.Web.Features.Imports.Mappings;

[Route("imports/{importId:guid}/mappings")]
[Members(MembershipKind.Coordinator)]
public sealed class MappingsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("new")]
    public async Task<IActionResult> New(Guid importId) => await MappingPage.Load(db, me, clock, importId) is { } page ? View("New", page) : NotFound();

    [HttpPost("")]
    [RequestFormLimits(ValueCountLimit = 4096)]
    public async Task<IActionResult> Create(Guid importId, MappingForm form)
    {
        if (await MappingPage.Load(db, me, clock, importId, form) is not { } page) return NotFound();
        if (form.AsksAgain) return this.Asked("New", page);
        page.Judge(ModelState);
        if (!ModelState.IsValid) return this.Again("New", page);
        var import = await db.ImportsVisibleTo(me.Person).Find(importId);
        import!.Map(me.Person, page.Mapping.ToJson(), clock.UtcNow());
        await db.SaveChangesAsync();
        return new LocalRedirectResult($"~/imports/{importId}");
    }
}
