using Credtrack.Core.People;

namespace Credtrack.Core.Grants;

public sealed record GrantProposed(Person By, DateTime At, string Holder, string Privilege) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} proposed to grant {Holder} the privilege: {Privilege}.";
}

public sealed record GrantSigned(Person By, DateTime At, string Privilege, Meaning Meaning, string Digest, string? GapSeal) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} signed ({Meaning}) the grant of {Privilege}; SHA-256 of the text signed {Digest}{(GapSeal is null ? "" : $", of the reason for the gap, salted, {GapSeal}")}.";
}

public sealed record GrantDeclined(Person By, DateTime At, string ReasonSeal) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} declined the proposal and said why; SHA-256 of the reason, salted, {ReasonSeal}.";
}

public sealed record GrantEnded(Person By, DateTime At, string ReasonSeal) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} ended the grant and said why; SHA-256 of the reason, salted, {ReasonSeal}.";
}

public sealed record DocumentIssued(Person By, DateTime At, string Sha256) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} had the competency summary issued; SHA-256 of the file {Sha256}.";
}
