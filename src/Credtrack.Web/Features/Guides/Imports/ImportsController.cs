namespace Credtrack.Web.Features.Guides.Imports;

[Route("guides/imports")]
public sealed class ImportsController : Controller
{
    [HttpGet("")]
    public IActionResult Index() => View();
}
