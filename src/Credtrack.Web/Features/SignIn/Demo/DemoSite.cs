using Credtrack.Core.Catalogue;
using Credtrack.Core.Rulebooks;
using Credtrack.Web.Features.Documents;
using Credtrack.Web.Features.Scans.Pictures;
using Microsoft.AspNetCore.Identity;

namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>An invented institution with two programmes and a year of scans, made from a seed through the same verbs as real ones.</summary>
public sealed class DemoSite(CredtrackDb db, PictureFiles pictures, Func<Issuing> issuing, DateTime now)
{
    public const string Password = "scan-and-read-2026";

    private readonly List<Person> people = [];
    private Person director = null!;

    public static async Task Build(IServiceProvider services)
    {
        await using var scope = services.CreateAsyncScope();
        var db = scope.ServiceProvider.GetRequiredService<CredtrackDb>();
        if (await db.People.AnyAsync()) return;
        await new DemoSite(db, scope.ServiceProvider.GetRequiredService<PictureFiles>(), scope.ServiceProvider.GetRequiredService<Issuing>, services.GetRequiredService<TimeProvider>().UtcNow()).Build();
    }

    private async Task Build()
    {
        var start = now.AddYears(-3);
        var administrator = Enrol(DemoNames.Administrator, start);
        director = Enrol("Dr Seraphine Okwuosa-Lund", start);
        var site = Site.Found(administrator, "Brindlemoor General (invented)", "Europe/Dublin", start);
        var applications = CatalogueEntry.Shipped.Select(entry => Application.List(administrator, entry, start)).ToList();
        var emergency = Programme.Found(administrator, "Emergency medicine", start);
        var medicine = Programme.Found(administrator, "Internal medicine", start);
        director.Join(director, emergency, MembershipKind.Director, start);
        Member("Dr Caspian Rothermere-Vale", medicine, MembershipKind.Director, start);
        Member("Nuala Fitzmaurice-Hart", emergency, MembershipKind.Coordinator, start);
        Member("Dr Leontyne Ashgrove-Mbeki", emergency, MembershipKind.Chair, start);
        Member("Bram Oyelaran", medicine, MembershipKind.Coordinator, start);
        foreach (var name in DemoNames.EmergencyReaders) Member(name, emergency, MembershipKind.Reader, start);
        foreach (var name in DemoNames.MedicineReaders) Member(name, medicine, MembershipKind.Reader, start);
        people.Single(p => p.Name == DemoNames.EmergencyReaders[0]).Join(director, medicine, MembershipKind.Reader, start);
        Trainees(DemoNames.EmergencyTrainees, emergency);
        Trainees(DemoNames.MedicineTrainees, medicine);
        var rulebooks = new[] { DemoRulebooks.Emergency(director, emergency, now), DemoRulebooks.Medicine(people.Single(p => p.Is(MembershipKind.Director, medicine.Id)), medicine, now) };

        db.Add(site);
        db.AddRange([emergency, medicine, .. applications, .. people, .. rulebooks]);
        db.AddRange(Accounts());
        await db.SaveChangesAsync();
        await new DemoScans(db, pictures, people, applications, now).Build([emergency, medicine]);
        await DemoCorrections.Build(db, people, now);
        // Only now: the certificate of the seal bears the name of the site.
        await DemoGrants.Build(db, issuing(), site, director, emergency, now);
    }

    private void Trainees(string[] names, Programme programme)
    {
        for (var n = 0; n < names.Length; n++)
        {
            var year = (n + 1) % 3 + 1; // the first of the list is in year 2
            var trainee = Member(names[n], programme, MembershipKind.Trainee, now.AddMonths(-4).AddYears(1 - year), $"year {year}");
            var away = DateOnly.FromDateTime(now.AddDays(-40 - 11 * n));
            if (n % 4 == 1) trainee.BeAway(director, programme, away, away.AddDays(20), now.AddDays(-60 - 11 * n));
        }
    }

    private Person Member(string name, Programme programme, MembershipKind kind, DateTime at, string? yearGroup = null)
    {
        var person = Enrol(name, at);
        person.Join(director, programme, kind, at, yearGroup);
        return person;
    }

    private Person Enrol(string name, DateTime at)
    {
        var person = Person.Enrol(name, people.FirstOrDefault(), at);
        people.Add(person);
        return person;
    }

    // One hash for all: hashing it once for each person would hold up the first start for seconds.
    private IEnumerable<Account> Accounts()
    {
        var hash = new PasswordHasher<Account>().HashPassword(new Account(), Password);
        foreach (var person in people)
        {
            var account = Account.Open(person, DemoNames.AddressOf(person.Name), director, now);
            account.PasswordHash = hash;
            yield return account;
        }
    }
}
