namespace Credtrack.Web.Features.Readings;

/// <summary>The bench puts the oldest waiting scan before its reader; each scan is read at an address of its own.</summary>
[Route("readings")]
[Members(MembershipKind.Reader)]
public sealed class ReadingsController(CredtrackDb db, Me me) : Controller
{
    /// <param name="read">the scan that was read just now, to be looked at beside the trainee's answers</param>
    [HttpGet("")]
    public async Task<IActionResult> Index(Guid? read)
    {
        var queue = await Bench.Load(db, me.Person);
        if (queue.Next is not { } next) return View("Index", read);
        return LocalRedirect($"~/scans/{next}/readings/new{(read is null ? "" : $"?read={read}")}");
    }
}
