namespace Credtrack.Core.People;

/// <summary>Somebody who handles accounts and settings of the site. Sees no scans by it.</summary>
public sealed class Administrator
{
    public Guid Id { get; private init; }
    public Guid SiteId { get; private init; }
    public Guid PersonId { get; private init; }
    public Person Person { get; private init; } = null!;
    public DateTime BeganAt { get; private init; }
    public DateTime? EndedAt { get; private set; }

    private Administrator() { }

    internal Administrator(Site site, Person person, DateTime at) =>
        (Id, SiteId, PersonId, Person, BeganAt) = (Guid.CreateVersion7(at), site.Id, person.Id, person, at);

    internal void End(DateTime at) => EndedAt = at;
}
