using Credtrack.Web.Features.Readings;

namespace Credtrack.Web.Features.Home;

/// <summary>What is to be done, each membership's part on its own and loading itself; a part that does not concern the person is null or empty.</summary>
public sealed record HomePage(
    OpenCare Care, OwnWork? Own, Bench? Bench, ToConfirm Supervised, IReadOnlyList<ProgrammeLine> Programmes, ToSign ToSign, Progress? Progress, LateScans Late, DateTime LateBefore)
{
    public static async Task<HomePage> Load(CredtrackDb db, Me me, DateTime now)
    {
        var (person, today, late) = (me.Person, now.DayIn(me.Zone), now.AddDays(-me.Site.LateAfterDays));
        return new(
            await OpenCare.Load(db, person),
            await OwnWork.Load(db, me, today),
            person.Is(MembershipKind.Reader) ? await Bench.Load(db, person) : null,
            await ToConfirm.Load(db, person),
            await ProgrammeLine.Load(db, person, today),
            await ToSign.Load(db, person),
            await Progress.Load(db, me, today),
            await LateScans.Load(db, person, late),
            late);
    }
}
