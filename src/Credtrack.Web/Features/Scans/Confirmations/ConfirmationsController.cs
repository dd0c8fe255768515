namespace Credtrack.Web.Features.Scans.Confirmations;

/// <summary>Two buttons on the home page of the person named as direct supervisor: there, or not there.</summary>
[Route("scans/{scanId:guid}/confirmations")]
[Members(MembershipKind.Reader)]
public sealed class ConfirmationsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpPost("")]
    public async Task<IActionResult> Create(Guid scanId, bool? wasThere)
    {
        if (wasThere is null || await db.ScansVisibleTo(me.Person).Find(scanId) is not { } scan) return NotFound();
        scan.Confirm(me.Person, wasThere.Value, clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done("~/", wasThere.Value ? "Supervision confirmed" : "Noted that you were not there; the scan counts as read later");
    }
}
