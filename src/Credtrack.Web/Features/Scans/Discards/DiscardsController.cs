using Credtrack.Web.Features.Scans.Pictures;

namespace Credtrack.Web.Features.Scans.Discards;

/// <summary>One button on the page of a draft. The row stays, marked as discarded; nobody finds it any more.</summary>
[Route("scans/{scanId:guid}/discards")]
[Members(MembershipKind.Trainee)]
public sealed class DiscardsController(CredtrackDb db, Me me, TimeProvider clock, PictureFiles files) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid scanId)
    {
        if (await db.ScansVisibleTo(me.Person).Find(scanId) is not { } scan) return NotFound();
        var pictures = scan.ShownPictures.Select(p => p.Sha256).ToList();
        scan.Discard(me.Person, clock.UtcNow());
        await db.SaveChangesAsync();
        await db.EraseUnused(files, pictures);
        return this.Done("~/scans", "Draft discarded");
    }
}
