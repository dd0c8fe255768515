using Credtrack.Web.Features.SignIn.Demo;

namespace Credtrack.Web.Features.SignIn;

public sealed record DemoPersonLine(Guid Id, string Name, string What);

public sealed record DemoPeople(string Heading, IReadOnlyList<DemoPersonLine> Lines);

/// <summary>Outside demo mode nobody is listed: who works here is nobody else's business.</summary>
public sealed record SignInPage(SignInForm Form, IReadOnlyList<DemoPeople> Demo, string? DemoPassword)
{
    public static async Task<SignInPage> Load(CredtrackDb db, Settings settings, SignInForm form)
    {
        if (!settings.Demo) return new(form, [], null);
        var rows = await db.People.SelectMany(p => p.Memberships, (p, m) => new { p.Id, p.Name, m.Kind, m.YearGroup, Programme = m.Programme.Name }).ToListAsync();
        var groups = from kind in Enum.GetValues<MembershipKind>()
                     let lines = from person in rows.Where(r => r.Kind == kind).OrderBy(r => r.YearGroup).ThenBy(r => r.Name)
                                 group person by person.Id into one
                                 select new DemoPersonLine(one.Key, one.First().Name, string.Join("; ", one.Select(r => r.YearGroup is null ? r.Programme : $"{r.YearGroup}, {r.Programme}")))
                     where lines.Any()
                     select new DemoPeople($"{kind}s", [.. lines]);
        var administrators = await db.Sites.SelectMany(s => s.Administrators).Where(a => a.EndedAt == null).Select(a => new DemoPersonLine(a.PersonId, a.Person.Name, "looks after the site, sees no scans")).ToListAsync();
        return new(form, [.. groups, new("Administrators", administrators)], DemoSite.Password);
    }
}
