namespace Credtrack.Web.Features.Scans.Pictures.Removals;

/// <summary>A picture that should not be here, taken out by others than its trainee: the bytes go, the fact stays.</summary>
[Route("scans/{scanId:guid}/pictures/{number:int}/removals")]
[Members]
public sealed class RemovalsController(CredtrackDb db, Me me, TimeProvider clock, PictureFiles files) : Controller
{
    [HttpGet("new")]
    public async Task<IActionResult> New(Guid scanId, int number) =>
        await ReasonPage.Load(db.ScansOverseenBy(me.Person), me.Person, scanId, new ReasonForm(), number) is { } page ? View("New", page) : NotFound();

    [HttpPost("")]
    public async Task<IActionResult> Create(Guid scanId, int number, ReasonForm form)
    {
        if (await db.ScansOverseenBy(me.Person).Find(scanId) is not { } scan) return NotFound();
        if (scan.Pictures.SingleOrDefault(p => p.Number == number) is not { } picture) return NotFound();
        if (!ModelState.IsValid) return this.Again("New", await ReasonPage.Load(db.ScansOverseenBy(me.Person), me.Person, scanId, form, number));
        db.Seen(scan, form.Version);
        scan.TakeOut(me.Person, picture, form.Reason!.Trim(), clock.UtcNow());
        await db.SaveChangesAsync();
        await db.EraseUnused(files, [picture.Sha256]);
        return this.Done($"~/scans/{scanId}", files.Has(picture.Sha256) ? $"Picture {number} removed here; another scan shows the same picture, and its file is erased when it is removed there too" : $"Picture {number} removed, its file erased");
    }
}
