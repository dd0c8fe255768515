using Credtrack.Core.Catalogue;
using Credtrack.Core.Scans;
using Credtrack.Web.Features.Scans.Pictures;

namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>A year of scans from a seed: most read within days, some waiting, some returned. Each trainee works at a pace and gets better.</summary>
internal sealed class DemoScans(CredtrackDb db, PictureFiles pictures, IReadOnlyList<Person> people, IReadOnlyList<Application> applications, DateTime now)
{
    private const int DrawingsOfATheme = 5;

    private readonly Random chance = new(20261201);
    private readonly DemoAnswers answers = new(20261202);
    private readonly Dictionary<InventedTheme, List<StoredStill>> stills = [];

    private static readonly Dictionary<string, int> Emergency = new()
    {
        ["efast"] = 22, ["cardiac"] = 20, ["lung"] = 14, ["ivc"] = 9, ["aorta"] = 9, ["biliary"] = 9, ["renal"] = 8, ["early-pregnancy"] = 5,
        ["dvt"] = 6, ["soft-tissue"] = 9, ["ocular"] = 4, ["piv"] = 8, ["msk"] = 2,
    };

    private static readonly Dictionary<string, int> Medicine = new()
    { ["cardiac"] = 26, ["lung"] = 26, ["ivc"] = 10, ["renal"] = 8, ["thoracentesis"] = 5, ["paracentesis"] = 5 };

    public async Task Build(IReadOnlyList<Programme> programmes)
    {
        foreach (var theme in Enum.GetValues<InventedTheme>()) stills[theme] = await Draw(theme);
        foreach (var programme in programmes)
        {
            var trainees = people.Where(p => p.Is(MembershipKind.Trainee, programme.Id)).ToList();
            for (var n = 0; n < trainees.Count; n++)
            {
                db.AddRange(Year(trainees[n], programme, pace: n == 0 ? 2 : 0.6 + 1.1 * chance.NextDouble()).ToList());
                await db.SaveChangesAsync();
                db.ChangeTracker.Clear(); // else each save would look through all before it
            }
        }
    }

    private IEnumerable<Scan> Year(Person trainee, Programme programme, double pace)
    {
        var mix = programme == people.SelectMany(p => p.Memberships).First().Programme ? Emergency : Medicine;
        var begun = trainee.Memberships.Single(m => m.Kind == MembershipKind.Trainee).FirstDay.ToDateTime(new TimeOnly(8, 0), DateTimeKind.Utc);
        var first = begun > now.AddYears(-1) ? begun : now.AddYears(-1);
        Scan? last = null;
        foreach (var (code, weight) in mix)
        {
            var known = applications.Single(a => a.Code == code);
            var share = (now - first).TotalDays / 365;
            var many = (int)(weight * pace * share * (0.7 + 0.6 * chance.NextDouble()) * 1.25);
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
        for (var n = chance.Next(1, 4); n > 0; n--) scan.Attach(trainee, stills[ThemeOf(application.Code)][chance.Next(DrawingsOfATheme)], logged);
        if (chance.Next(90) == 0) return scan;
        scan.Submit(trainee, logged.AddMinutes(3));
        var reader = supervisor ?? readers[chance.Next(readers.Count)];
        var readAt = Truncated(logged.AddHours(6 + 150 * chance.NextDouble() * chance.NextDouble()));
        if (readAt > now || chance.NextDouble() < StillWaiting((now - at).TotalDays)) return scan;
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

    private async Task<List<StoredStill>> Draw(InventedTheme theme)
    {
        var drawn = Enumerable.Range(1, DrawingsOfATheme).Select(seed => InventedPicture.Draw(theme, seed)).ToList();
        foreach (var still in drawn) await pictures.Keep(still);
        return [.. drawn.Select(still => new StoredStill(still.Sha256, still.Width, still.Height))];
    }

    private static InventedTheme ThemeOf(string application) => application switch
    {
        "cardiac" or "ivc" => InventedTheme.Heart,
        "lung" or "thoracentesis" => InventedTheme.Lung,
        "dvt" or "piv" or "aorta" => InventedTheme.Vessels,
        "soft-tissue" or "msk" or "ocular" => InventedTheme.SoftTissue,
        _ => InventedTheme.Abdomen,
    };

    private static double StillWaiting(double daysAgo) => daysAgo < 9 ? 0.5 : daysAgo < 40 ? 0.04 : 0;

    private static DateTime Truncated(DateTime time) => time.AddTicks(-(time.Ticks % TimeSpan.TicksPerMinute));
}
