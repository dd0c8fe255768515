using Credtrack.Core;

namespace Credtrack.Web.Features.Imports.Undos;

[Route("imports/{importId:guid}/undos")]
[Members(MembershipKind.Coordinator)]
public sealed class UndosController(CredtrackDb db, Me me, TimeProvider clock, LongWork work) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid importId)
    {
        if (await ImportPage.Load(db, me, clock, work, importId) is not { } page) return NotFound();
        RuleBroken.If(page.WhyNotUndo);
        await TakingBack.Run(db, importId, me.Person, clock.UtcNow(), import => import.Undo(me.Person, [], clock.UtcNow()));
        return this.Done($"~/imports/{importId}", "The import is undone");
    }
}
