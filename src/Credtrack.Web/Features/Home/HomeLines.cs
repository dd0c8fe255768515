using Credtrack.Web.Features.FollowUps;

namespace Credtrack.Web.Features.Home;

/// <summary>Discrepancies that touch a patient's care and are open: the first ones, and how many there are.</summary>
public sealed record OpenCare(IReadOnlyList<FollowUpLine> Lines, int All)
{
    public static OpenCare None { get; } = new([], 0);

    public static async Task<OpenCare> Load(CredtrackDb db, Person person)
    {
        if (person.Memberships.All(m => m.Kind is MembershipKind.Trainee or MembershipKind.Chair)) return None;
        var open = db.FollowUpsVisibleTo(person).AsNoTracking().Where(f => f.ClosedAt == null);
        return await open.CountAsync() is > 0 and var all ? new(await FollowUpLine.Of(open.OrderBy(f => f.OpenedAt).Take(20)).ToListAsync(), all) : None;
    }
}

public sealed record SupervisedLine(Guid ScanId, string Trainee, string Application, DateTime PerformedAt);

/// <summary>Scans that name a person as direct supervisor and wait for a yes or no: the oldest, and how many there are.</summary>
public sealed record ToConfirm(IReadOnlyList<SupervisedLine> Lines, int All)
{
    public static ToConfirm None { get; } = new([], 0);

    public static async Task<ToConfirm> Load(CredtrackDb db, Person person)
    {
        if (!person.Is(MembershipKind.Reader)) return None;
        var scans = db.ScansToConfirmBy(person).AsNoTracking();
        if (await scans.CountAsync() is not (> 0 and var all)) return None;
        return new(await scans.OrderBy(s => s.PerformedAt).Take(20).Select(s => new SupervisedLine(s.Id, s.Trainee.Name, s.Application.Name, s.PerformedAt)).ToListAsync(), all);
    }
}
