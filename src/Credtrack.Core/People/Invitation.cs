namespace Credtrack.Core.People;

public enum InvitationKind { Administrator, Member, Reset }

/// <summary>A link, good once and for a time, with which a person chooses a password. Only the digest of its secret is kept.</summary>
public sealed class Invitation
{
    public Guid Id { get; private init; }
    public Guid PersonId { get; private init; }
    public InvitationKind Kind { get; private init; }

    /// <summary>SHA-256 of the secret, 64 capital hexadecimal digits.</summary>
    public string Digest { get; private init; } = "";
    public DateTime MadeAt { get; private init; }
    public DateTime GoodUntil { get; private set; }
    public DateTime? UsedAt { get; private set; }

    private Invitation() { }

    internal Invitation(Person person, InvitationKind kind, string digest, DateTime at, TimeSpan good) =>
        (Id, PersonId, Kind, Digest, MadeAt, GoodUntil) = (Guid.CreateVersion7(at), person.Id, kind, digest, at, at + good);

    public bool IsOpen(DateTime at) => UsedAt is null && at < GoodUntil;

    internal void Use(DateTime at) => UsedAt = at;

    internal void Replace(DateTime at) => GoodUntil = at;
}
