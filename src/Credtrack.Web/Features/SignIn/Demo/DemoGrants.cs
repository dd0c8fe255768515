using Credtrack.Core.Grants;
using Credtrack.Web.Features.Documents;
using Credtrack.Web.Features.Grants;

namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>Privileges signed by the director over the evidence as it stands: met ones, one over a gap, one ended, one declined, two still proposed.</summary>
internal static class DemoGrants
{
    private sealed record Plan(string Holder, string Application, string Then, string? Reason = null);

    private static readonly Plan[] Plans =
    [
        new("Wrenna Ostholm", "efast", "sign"),
        new("Wrenna Ostholm", "ivc", "sign"),
        new("Wrenna Ostholm", "renal", "sign", "Twelve further scans were read at the hospital of the rotation before this one; their log was seen."),
        new("Wrenna Ostholm", "piv", "end", "The procedure is no longer part of this privilege list."),
        new("Wrenna Ostholm", "lung", "wait"),
        new("Tobias Achterkamp", "efast", "decline", "Three more positive scans first; we spoke about it."),
        new("Tobias Achterkamp", "ivc", "wait"),
    ];

    public static async Task Build(CredtrackDb db, Issuing issuing, Site site, Person director, Programme programme, DateTime now)
    {
        var applications = await db.Applications.AsNoTracking().ToDictionaryAsync(a => a.Code);
        foreach (var (plan, n) in Plans.Select((plan, n) => (plan, n)))
        {
            var holder = await db.People.AsNoTracking().SingleAsync(p => p.Name == plan.Holder);
            var at = now.AddDays(n - Plans.Length);
            var application = applications[plan.Application];
            var grant = Grant.Propose(director, holder, programme, application, $"{application.Name}: point-of-care ultrasound without supervision", [], at);
            db.Add(grant);
            await db.SaveChangesAsync();
            // Signed today: the seal cannot be older than the certificate, which was made just now.
            if (plan.Then == "decline") grant.TurnDown(director, plan.Reason!, at.AddHours(2));
            if (plan.Then is "sign" or "end") await Sign(db, issuing, site, director, grant, plan, now);
            if (plan.Then == "end") grant.End(director, plan.Reason!, now);
            if (plan.Then != "wait") await db.SaveChangesAsync();
            db.ChangeTracker.Clear();
        }
    }

    private static async Task Sign(CredtrackDb db, Issuing issuing, Site site, Person director, Grant grant, Plan plan, DateTime at)
    {
        var statement = (await GrantEvidence.Load(db, site, grant, at.DayIn(TimeZoneInfo.FindSystemTimeZoneById(site.TimeZone)))).Statement;
        grant.Sign(director, statement, Meaning.Granted, plan.Reason ?? "Seen at the bedside often enough to judge.", at);
        issuing.Issue(grant, statement, director, site);
    }
}
