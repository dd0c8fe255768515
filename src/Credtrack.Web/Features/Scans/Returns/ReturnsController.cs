namespace Credtrack.Web.Features.Scans.Returns;

[Route("scans/{scanId:guid}/returns")]
[Members(MembershipKind.Reader)]
public sealed class ReturnsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("new")]
    public async Task<IActionResult> New(Guid scanId) =>
        await ReturnPage.Load(db, me.Person, scanId, new ReturnForm()) is { } page ? View("New", page) : NotFound();

    [HttpPost("")]
    public async Task<IActionResult> Create(Guid scanId, ReturnForm form)
    {
        if (await db.ScansVisibleTo(me.Person).Find(scanId) is not { } scan) return NotFound();
        if (!ModelState.IsValid) return this.Again("New", await ReturnPage.Load(db, me.Person, scanId, form));
        db.Seen(scan, form.Version);
        scan.SendBack(me.Person, form.Missing!.Trim(), clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done("~/readings", "Returned to its trainee");
    }
}
