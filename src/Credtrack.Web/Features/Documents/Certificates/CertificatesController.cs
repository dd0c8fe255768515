using Credtrack.Web.Features.Documents.Seals;
using Microsoft.AspNetCore.Authorization;

namespace Credtrack.Web.Features.Documents.Certificates;

/// <summary>The public certificates of the seal, for whoever wants to check a file without us. The key is not among them.</summary>
[Route("documents/certificates")]
[AllowAnonymous]
public sealed class CertificatesController(SealTrust trust) : Controller
{
    [HttpGet("")]
    public IActionResult Index() => Content(trust.Pem, "application/x-pem-file");
}
