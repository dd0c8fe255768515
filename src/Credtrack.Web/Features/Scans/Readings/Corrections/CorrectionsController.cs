namespace Credtrack.Web.Features.Scans.Readings.Corrections;

[Route("scans/{scanId:guid}/readings/{number:int}/corrections")]
[Members(MembershipKind.Reader)]
public sealed class CorrectionsController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("new")]
    public async Task<IActionResult> New(Guid scanId, int number) =>
        await CorrectionPage.Load(db, me.Person, scanId, number, typed: this.Typed("Form.Application")) is { } page ? View("New", page) : NotFound();

    [HttpPost("")]
    public async Task<IActionResult> Create(Guid scanId, int number, CorrectionForm form)
    {
        if (await CorrectionPage.Load(db, me.Person, scanId, number, form) is not { } page) return NotFound();
        if (form.AsksForQuestions) return this.Asked("New", page);
        var scan = (await db.ScansVisibleTo(me.Person).Find(scanId))!;
        var (reading, judgement) = (scan.Readings.Single(r => r.Number == number), form.ToJudgement(page.Judged.Application));
        db.Seen(scan, form.Version);
        if (page.Judged.WhyNot is null) ModelState.Tell(scan.FaultsOfCorrection(reading, judgement, form.Reason?.Trim()));
        if (page.Judged.WhyNot is null && !ModelState.IsValid) return this.Again("New", page);
        scan.Correct(me.Person, reading, judgement, form.Reason?.Trim() ?? "", clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done($"~/scans/{scanId}", "Reading corrected");
    }
}
