using Microsoft.AspNetCore.Authorization;

namespace Credtrack.Web.Plumbing;

/// <summary>[Administrators]: who looks after the site. It opens no scan.</summary>
public sealed class AdministratorsAttribute() : AuthorizeAttribute(Policy)
{
    public new const string Policy = "Administrator";
}
