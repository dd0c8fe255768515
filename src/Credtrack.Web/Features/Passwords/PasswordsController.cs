using Microsoft.AspNetCore.Authorization;
using Microsoft.AspNetCore.Identity;

namespace Credtrack.Web.Features.Passwords;

[Route("passwords")]
public sealed class PasswordsController(CredtrackDb db, Me me, TimeProvider clock, IPasswordHasher<Account> hasher) : Controller
{
    [HttpGet("new")]
    [AllowAnonymous]
    public async Task<IActionResult> New(string? key) => await NewPasswordPage.Load(db, new NewPasswordForm { Key = key }, clock.UtcNow()) is { } page ? Shown(page) : NotFound();

    [HttpPost("")]
    [AllowAnonymous]
    public async Task<IActionResult> Create(NewPasswordForm form)
    {
        if (await NewPasswordPage.Load(db, form, clock.UtcNow()) is not { } page) return NotFound();
        if (page.WhyNot is not null) return Shown(page);
        await page.Judge(db, ModelState);
        if (!ModelState.IsValid) return this.Again("New", page);
        page.Choose(db, hasher, clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done("~/sign-in", "Your password is saved. Sign in with it.");
    }

    [HttpGet("{id:guid}/edit")]
    public IActionResult Edit(Guid id) => id == me.Person.Id ? View("Edit", new PasswordPage(new PasswordForm())) : NotFound();

    /// <summary>Whoever else is signed in with the old password is out; this browser stays.</summary>
    [HttpPost("{id:guid}")]
    public async Task<IActionResult> Update(Guid id, PasswordForm form, [FromServices] UserManager<Account> accounts, [FromServices] PasswordPace pace)
    {
        if (id != me.Person.Id || await accounts.FindByIdAsync($"{id}") is not { } account) return NotFound();
        if (ModelState.IsValid) await form.Judge(accounts, account, me, pace, ModelState);
        if (!ModelState.IsValid) return this.Again("Edit", new PasswordPage(form));
        account.PasswordHash = hasher.HashPassword(account, form.Password!);
        me.Person.ChangePassword(clock.UtcNow());
        foreach (var other in await db.Sessions.Open(clock.UtcNow()).Where(s => s.AccountId == id && s.Id != me.SessionId).ToListAsync()) other.End(clock.UtcNow());
        await db.SaveChangesAsync();
        return this.Done("~/sessions", "Your password is changed, and you are signed out everywhere else");
    }

    // A link that is over is gone, not missing: the page says what to do.
    private ViewResult Shown(NewPasswordPage page)
    {
        if (page.WhyNot is not null) Response.StatusCode = StatusCodes.Status410Gone;
        return View("New", page);
    }
}
