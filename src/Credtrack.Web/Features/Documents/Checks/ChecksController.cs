using Credtrack.Web.Features.Documents.Seals;
using Microsoft.AspNetCore.Authorization;
using Microsoft.AspNetCore.RateLimiting;

namespace Credtrack.Web.Features.Documents.Checks;

/// <summary>For strangers: no account, nothing kept. The square code on the paper leads here with its number filled in.</summary>
[Route("documents/checks")]
[AllowAnonymous]
[EnableRateLimiting(RateLimits.Checks)]
public sealed class ChecksController(CredtrackDb db, SealTrust trust, TimeProvider clock) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(string? code) => View("Index", await CheckPage.Load(db, new CheckForm { Code = code },
        DocumentCode.Read(code) is { } number ? await CheckAnswer.OfCode(db, number) : null, clock.UtcNow()));

    [HttpPost("")]
    [RequestSizeLimit(CheckForm.LongestFile + 100_000)]
    public async Task<IActionResult> Create(CheckForm form)
    {
        if (!ModelState.IsValid) return this.Again("Index", await CheckPage.Load(db, form, null, clock.UtcNow()));
        return View("Index", await CheckPage.Load(db, form, await Answer(form), clock.UtcNow()));
    }

    private async Task<CheckAnswer> Answer(CheckForm form)
    {
        if (form.File is null) return await CheckAnswer.OfCode(db, DocumentCode.Read(form.Code)!);
        using var bytes = new MemoryStream();
        await form.File.CopyToAsync(bytes);
        return await CheckAnswer.OfFile(db, bytes.ToArray(), trust);
    }
}
