using Credtrack.Core.Catalogue;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;
using Credtrack.Web.Features.Scans.Pictures;

namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>A year of scans from a seed: most read within days, some waiting, some returned. Each trainee works at a pace and gets better.</summary>
internal sealed class DemoScans(CredtrackDb db, PictureFiles pictures, IReadOnlyList<Person> people, IReadOnlyList<Application> applications, DateTime now)
{
    private const int Drawings = 24;

    private readonly Random chance = new(20261201);
    private readonly DemoAnswers answers = new(20261202);
    private readonly List<StoredStill> stills = [];

    private static readonly Dictionary<string, int> Emergency = new()
    {
        ["efast"] = 22, ["cardiac"] = 20, ["lung"] = 14, ["ivc"] = 9, ["aorta"] = 9, ["biliary"] = 9, ["renal"] = 8, ["early-pregnancy"] = 5,
        ["dvt"] = 6, ["soft-tissue"] = 9, ["ocular"] = 4, ["piv"] = 8, ["msk"] = 2,
    };

    private static readonly Dictionary<string, int> Medicine = new()
    { ["cardiac"] = 26, ["lung"] = 26, ["ivc"] = 10, ["renal"] = 8, ["thoracentesis"] = 5, ["paracentesis"] = 5 };

    public async Task Build(IReadOnlyList<Programme> programmes)
    {
        for (var n = 0; n < Drawings; n++) stills.Add(await pictures.Keep(InventedPicture.Draw(n)));
        foreach (var programme in programmes)
        {
            var trainees = people.Where(p => p.Is(MembershipKind.Trainee, programme.Id)).ToList();
            for (var n = 0; n < trainees.Count; n++)
            {
                db.AddRange(Year(trainees[n], programme, pace: 0.4 + 0.9 * chance.NextDouble()).ToList());
                await db.SaveChangesAsync();
            }
        }
    }

    private IEnumerable<Scan> Year(Person trainee, Programme programme, double pace)
    {
        var mix = programme == people[0].Memberships[0].Programme ? Emergency : Medicine;
        var begun = trainee.Memberships.Single(m => m.Kind == MembershipKind.Trainee).FirstDay.ToDateTime(new TimeOnly(8, 0), DateTimeKind.Utc);
        var first = begun > now.AddYears(-1) ? begun : now.AddYears(-1);
        Scan? last = null;
        foreach (var (code, weight) in mix)
        {
            var known = applications.Single(a => a.Code == code);
            var share = (now - first).TotalDays / 365;
            var many = (int)(weight * pace * share * (0.7 + 0.6 * chance.NextDouble()) * 1.6);
            for (var n = 0; n < many; n++)
            {
                var at = Truncated(first + (now.AddHours(-3) - first) * chance.NextDouble());
                yield return last = One(trainee, programme, known, at, skill: (double)n / (many + 1), chance.Next(25) == 0 ? last : null);
            }
        }
    }

    private Scan One(Person trainee, Programme programme, Application application, DateTime at, double skill, Scan? samePatient)
    {
        var readers = people.Where(p => p.Is(MembershipKind.Reader, programme.Id)).ToList();
        var supervisor = chance.Next(4) == 0 ? readers[chance.Next(readers.Count)] : null;
        var truth = answers.Truth(application);
        var entry = answers.Entry(application, truth, at, supervisor, skill);
        var logged = at.AddMinutes(chance.Next(2, 90));
        var scan = Scan.Log(trainee, programme, Guid.CreateVersion7(logged), entry, samePatient, logged);
        for (var n = chance.Next(1, 4); n > 0; n--) scan.Attach(trainee, stills[chance.Next(stills.Count)], logged);
        if (chance.Next(90) == 0) return scan;
        scan.Submit(trainee, logged.AddMinutes(3));
        var reader = supervisor ?? readers[chance.Next(readers.Count)];
        var readAt = Truncated(logged.AddHours(6 + 150 * chance.NextDouble() * chance.NextDouble()));
        if (readAt > now || chance.Next(60) == 0 && at > now.AddDays(-50)) return scan;
        if (chance.Next(30) == 0)
        {
            scan.SendBack(reader, "One view is missing: add the picture that shows it and submit again.", readAt);
            if (chance.Next(2) == 0 || readAt.AddDays(1) > now) return scan;
            scan.Submit(trainee, readAt.AddHours(8));
            readAt = readAt.AddDays(1);
        }
        scan.Read(reader, answers.Judgement(scan, application, truth, skill), readAt);
        return scan;
    }

    private static DateTime Truncated(DateTime time) => time.AddTicks(-(time.Ticks % TimeSpan.TicksPerMinute));
}
