using Credtrack.Core.FollowUps;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>What people put right in the open: a scan withdrawn, a reading corrected, a picture taken out, and two discrepancies that touch care, one of them open.</summary>
internal static class DemoCorrections
{
    public static async Task Build(CredtrackDb db, IReadOnlyList<Person> people, DateTime now)
    {
        var (trainee, reader) = (people.Single(p => p.Name == DemoNames.EmergencyTrainees[0]), people.Single(p => p.Name == DemoNames.EmergencyReaders[0]));
        var (programme, before) = (reader.Memberships[0].ProgrammeId, now.AddDays(-1));
        var coordinator = people.First(p => p.Is(MembershipKind.Coordinator, programme));
        var applications = await db.Applications.ToDictionaryAsync(a => a.Id);
        var scans = await db.Scans.Where(s => s.TraineeId == trainee.Id && s.Readings.Any(r => r.ReaderId == reader.Id && r.At < before && r.Quality > 2)).OrderByDescending(s => s.PerformedAt).Take(3).ToListAsync();
        var missed = await db.Scans.Where(s => s.TraineeId != trainee.Id && s.Readings.Any(r => r.ReaderId == reader.Id && r.At < before && r.Result == Result.FN && s.ProgrammeId == programme)).OrderByDescending(s => s.PerformedAt).Take(2).ToListAsync();
        scans[0].Withdraw(trainee, "Logged twice: the other one has all its pictures.", now.AddHours(-2));
        var (given, seen) = (scans[1].Readings[0], scans[1].Readings[0].Now);
        scans[1].Correct(reader, given, new Judgement(applications[seen.ApplicationId], seen.Subtype, seen.Indicated, seen.Assisted, seen.AtMost,
            seen.Answers.Where(a => a.Given is not null).ToDictionary(a => a.Code, a => a.Given!.Value), [.. seen.Views.Where(v => v.Marked).Select(v => v.Code)], seen.Quality - 1, seen.Feedback),
            "Seen again on a larger screen: the far field is lost.", now.AddHours(-3));
        scans[2].TakeOut(coordinator, scans[2].Pictures[0], "Writing can be read in the upper corner.", now.AddHours(-4));
        var closed = FollowUp.Open(reader, missed[0], [], now.AddHours(-7));
        closed.Close(reader, new ClosingEntry("The emergency physician in charge", now.AddHours(-6), Way.Telephone, "They had seen it too."), now.AddHours(-5));
        db.AddRange(closed, FollowUp.Open(reader, missed[1], [], now.AddHours(-8)));
        await db.SaveChangesAsync();
        db.ChangeTracker.Clear();
    }
}
