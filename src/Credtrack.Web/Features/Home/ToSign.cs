namespace Credtrack.Web.Features.Home;

public sealed record ToSignLine(Guid GrantId, string Holder, string Privilege, DateTime ProposedAt, string By);

/// <summary>What waits for a director's signature: the oldest, and how many there are.</summary>
public sealed record ToSign(IReadOnlyList<ToSignLine> Lines, int All)
{
    public static ToSign None { get; } = new([], 0);

    public static async Task<ToSign> Load(CredtrackDb db, Person person)
    {
        if (!person.Is(MembershipKind.Director)) return None;
        var grants = db.GrantsToSignBy(person).AsNoTracking();
        if (await grants.CountAsync() is not (> 0 and var all)) return None;
        return new(await grants.OrderBy(g => g.ProposedAt).ThenBy(g => g.Id).Take(20).Select(g => new ToSignLine(g.Id, g.Holder.Name, g.Privilege, g.ProposedAt, g.ProposedBy.Name)).ToListAsync(), all);
    }
}
