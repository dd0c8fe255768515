using Credtrack.Core;
using Credtrack.Web.Features.Documents;
using Microsoft.AspNetCore.Identity;

namespace Credtrack.Web.Features.Grants.Signatures;

[Route("grants/{grantId:guid}/signatures")]
[Members(MembershipKind.Director)]
public sealed class SignaturesController(CredtrackDb db, Me me, TimeProvider clock, Issuing issuing) : Controller
{
    [HttpGet("new")]
    public async Task<IActionResult> New(Guid grantId) =>
        await SignaturePage.Load(db, me, grantId, new SignatureForm(), issuing, clock.UtcNow()) is { } page ? View("New", page) : NotFound();

    [HttpPost("")]
    public async Task<IActionResult> Create(Guid grantId, SignatureForm form, [FromServices] UserManager<Account> accounts, [FromServices] PasswordPace pace)
    {
        if (await db.GrantsVisibleTo(me.Person).Find(grantId) is not { } grant) return NotFound();
        var (version, shown) = (form.Version, form.Digest);
        var page = (await SignaturePage.Load(db, me, grantId, form, issuing, clock.UtcNow()))!;
        if (shown != page.Statement.Digest) return this.Moved("New", page with { HasMoved = true });
        RuleBroken.If(page.WhyNot);
        await form.Judge(page, accounts, pace, me.Person, ModelState);
        if (ModelState.IsValid && issuing.WhyNot(page.Statement, me.Person, form.GapReason, me.Site, clock.UtcNow()) is { } why) ModelState.AddModelError("", why);
        if (!ModelState.IsValid) return this.Again("New", page);
        db.Seen(grant, version);
        grant.Sign(me.Person, page.Statement, form.Meaning ?? default, form.GapReason, clock.UtcNow());
        issuing.Issue(grant, page.Statement, me.Person, me.Site);
        await db.SaveChangesAsync();
        return this.Done($"~/grants/{grantId}", "Signed and sealed");
    }
}
