using Credtrack.Core.Imports;

namespace Credtrack.Web.Features.Imports;

[Route("imports")]
[Members(MembershipKind.Coordinator)]
public sealed class ImportsController(CredtrackDb db, Me me, TimeProvider clock, LongWork work) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(int page = 1) => View(await ImportsPage.Load(db, me.Person, Math.Clamp(page, 1, 10_000)));

    [HttpGet("{id:guid}")]
    public async Task<IActionResult> Show(Guid id, int page = 1, int faults = 1)
    {
        if (await ImportPage.Load(db, me, clock, work, id) is not { } found) return NotFound();
        if (found.Import.State == ImportState.Uploaded) return new LocalRedirectResult($"~/imports/{id}/mappings/new");
        // Without script the page asks again by itself while rows are staged.
        if (found.Running is not null) Response.Headers["Refresh"] = "2";
        return View(found with { Page = Math.Clamp(page, 1, 10_000), FaultPage = Math.Clamp(faults, 1, 10_000) });
    }

    [HttpGet("new")]
    public IActionResult New(Guid programme) => View("New", NewImportPage.Of(me.Person, new ImportForm { Programme = programme }));

    [HttpPost("")]
    [RequestSizeLimit(ImportForm.LongestForm), RequestFormLimits(MultipartBodyLengthLimit = ImportForm.LongestForm)]
    public async Task<IActionResult> Create(ImportForm form)
    {
        if (await db.Programmes.SingleOrDefaultAsync(p => p.Id == form.Programme) is not { } programme || Import.WhyNotUpload(me.Person, programme) is not null) return NotFound();
        if (await form.Take(ModelState) is not { } content) return this.Again("New", NewImportPage.Of(me.Person, form));
        var import = Import.Upload(me.Person, programme, form.File!.FileName, content, clock.UtcNow());
        db.Add(import);
        await db.SaveChangesAsync();
        return new LocalRedirectResult($"~/imports/{import.Id}/mappings/new");
    }
}
