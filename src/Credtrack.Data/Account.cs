using Microsoft.AspNetCore.Identity;

namespace Credtrack.Data;

/// <summary>How a person signs in. Its key is the person's; what happens to it is told as a fact of the person.</summary>
public sealed class Account : IdentityUser<Guid>;
