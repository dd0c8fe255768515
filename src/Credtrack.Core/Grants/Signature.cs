using Credtrack.Core.People;

namespace Credtrack.Core.Grants;

/// <summary>The fixed list of what a signature can mean.</summary>
public enum Meaning { Granted, GrantedUnderProctoring }

/// <summary>Who signed, exactly which text, when and what it means. One for each place of a grant; it carries the holder, so that the database itself can refuse one's own.</summary>
public sealed class Signature
{
    /// <summary>The first of several places; the chair will sign at the second.</summary>
    public const int Director = 1;

    public const int LongestText = 50_000;

    public Guid GrantId { get; private init; }
    public int Place { get; private init; }
    public Guid HolderId { get; private init; }
    public Guid SignerId { get; private init; }
    public Person Signer { get; private init; } = null!;
    public DateTime At { get; private init; }
    public Meaning Meaning { get; private init; }
    public string? GapReason { get; private init; }
    public string? GapSalt { get; private init; }
    public SealedText? Gap => GapReason is null ? null : new(GapReason, GapSalt ?? "");

    /// <summary>The text that was on the screen, and its SHA-256.</summary>
    public string Text { get; private init; } = "";
    public string Digest { get; private init; } = "";

    private Signature() { }

    internal Signature(Grant grant, Person by, Statement statement, Meaning meaning, SealedText? gap, DateTime at)
    {
        (GrantId, Place, HolderId, SignerId, At) = (grant.Id, Director, grant.HolderId, by.Id, at);
        (Meaning, GapReason, GapSalt, Text, Digest) = (meaning, gap?.Text, gap?.Salt, statement.Text, statement.Digest);
    }
}

/// <summary>The answer no, with the reason that the trainee is told.</summary>
public sealed class Decline
{
    public Guid GrantId { get; private init; }
    public Guid ById { get; private init; }
    public Person By { get; private init; } = null!;
    public string Reason { get; private init; } = "";
    public string ReasonSalt { get; private init; } = "";
    public DateTime At { get; private init; }

    private Decline() { }

    internal Decline(Grant grant, Person by, SealedText reason, DateTime at) => (GrantId, ById, Reason, ReasonSalt, At) = (grant.Id, by.Id, reason.Text, reason.Salt, at);
}

/// <summary>From this moment on the grant no longer stands; what was signed keeps its evidence.</summary>
public sealed class Ending
{
    public Guid GrantId { get; private init; }
    public Guid ById { get; private init; }
    public Person By { get; private init; } = null!;
    public string Reason { get; private init; } = "";
    public string ReasonSalt { get; private init; } = "";
    public DateTime At { get; private init; }

    private Ending() { }

    internal Ending(Grant grant, Person by, SealedText reason, DateTime at) => (GrantId, ById, Reason, ReasonSalt, At) = (grant.Id, by.Id, reason.Text, reason.Salt, at);
}

/// <summary>A sealed paper as it was issued. The random code is all that a stranger can look up.</summary>
public sealed class Document
{
    public Guid Id { get; private init; }
    public Guid GrantId { get; private init; }
    public string Code { get; private init; } = "";
    public string Sha256 { get; private init; } = "";
    public byte[] Bytes { get; private init; } = [];
    public DateTime At { get; private init; }

    private Document() { }

    internal Document(Grant grant, string code, byte[] bytes, string sha256, DateTime at) =>
        (Id, GrantId, Code, Bytes, Sha256, At) = (Guid.CreateVersion7(at), grant.Id, code, bytes, sha256, at);
}
