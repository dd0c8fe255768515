using Credtrack.Core.Scans;

namespace Credtrack.Web.Features.Scans.Withdrawals;

[Route("scans/{scanId:guid}/withdrawals")]
[Members(MembershipKind.Trainee)]
public sealed class WithdrawalsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("new")]
    public async Task<IActionResult> New(Guid scanId) =>
        await ReasonPage.Load(Own, me.Person, scanId, new ReasonForm()) is { } page ? View("New", page) : NotFound();

    [HttpPost("")]
    public async Task<IActionResult> Create(Guid scanId, ReasonForm form)
    {
        if (await Own.Find(scanId) is not { } scan) return NotFound();
        if (!ModelState.IsValid) return this.Again("New", await ReasonPage.Load(Own, me.Person, scanId, form));
        db.Seen(scan, form.Version);
        scan.Withdraw(me.Person, form.Reason!.Trim(), clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/scans/{scanId}", "Scan withdrawn");
    }

    private IQueryable<Scan> Own => db.ScansVisibleTo(me.Person).Where(s => s.TraineeId == me.Person.Id);
}
