using Credtrack.Core;

namespace Credtrack.Web.Features.Imports.Discards;

[Route("imports/{importId:guid}/discards")]
[Members(MembershipKind.Coordinator)]
public sealed class DiscardsController(CredtrackDb db, Me me, TimeProvider clock, LongWork work) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid importId)
    {
        if (await db.ImportsVisibleTo(me.Person).AsNoTracking().Find(importId) is not { } import) return NotFound();
        RuleBroken.If(work.PiecesOf(importId) is null ? import.WhyNotThrowAway(me.Person) : "Its rows are being staged just now. Wait until that has ended.");
        await TakingBack.Run(db, importId, me.Person, clock.UtcNow(), found => found.ThrowAway(me.Person, clock.UtcNow()));
        return this.Done($"~/imports/{importId}", "The import is thrown away");
    }
}
