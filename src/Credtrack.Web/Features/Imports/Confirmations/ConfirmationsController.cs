using Credtrack.Core;

namespace Credtrack.Web.Features.Imports.Confirmations;

[Route("imports/{importId:guid}/confirmations")]
[Members(MembershipKind.Coordinator)]
public sealed class ConfirmationsController(CredtrackDb db, Me me, TimeProvider clock, LongWork work) : Controller
{
    // What a browser waits for without asking itself whether anything happens.
    private const int Long = 5000;

    [HttpPost("")]
    public async Task<IActionResult> Create(Guid importId, ConfirmationForm form)
    {
        if (await ImportPage.Load(db, me, clock, work, importId) is not { } page) return NotFound();
        if (page.Running is not null) return new LocalRedirectResult($"~/imports/{importId}");
        RuleBroken.If(page.WhyNotConfirm);
        if (page.Plan!.Assumed > 0 && !form.Accepted) ModelState.AddModelError("Form.Accepted", "Tick that the missing cells take these values, or complete the file and upload it again.");
        if (!ModelState.IsValid) return this.Again("/Features/Imports/Show.cshtml", page with { Form = form });
        var (by, site, plan) = (me.Person, me.Site, page.Plan);
        if (plan.New.Count() <= Long) await new Staging(db, clock).Run(importId, by, site, plan);
        else work.Start(importId, plan.New.Count(), services => new Staging(services.GetRequiredService<CredtrackDb>(), clock).Run(importId, by, site, plan));
        return plan.New.Count() <= Long ? this.Done($"~/imports/{importId}", $"{plan.New.Count().Of("scan")} imported") : new LocalRedirectResult($"~/imports/{importId}");
    }
}
