using AngleSharp.Dom;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Tests.Features.Cohorts;

/// <summary>Trainees in a world, with scans of their own, and how their sheet is read.</summary>
internal static class Cohorting
{
    public static async Task<Person> Trainee(this World world, string name, string year, DateOnly? first = null, DateOnly? last = null)
    {
        var person = await world.Another(name);
        await world.Site.Ask(async db =>
        {
            var (found, programme) = (await db.People.Include(p => p.Memberships).SingleAsync(p => p.Id == person.Id), await db.Programmes.SingleAsync(p => p.Id == world.Programme.Id));
            found.Join(world.Director, programme, new MembershipTerms(MembershipKind.Trainee, first ?? DateOnly.FromDateTime(world.Now), last, year), world.Now);
            return await db.SaveChangesAsync();
        });
        return await world.Site.Ask(db => db.People.AsNoTracking().Include(p => p.Memberships).SingleAsync(p => p.Id == person.Id));
    }

    public static Task<int> Away(this World world, Person trainee, DateOnly first, DateOnly last, bool takenBack = false) => world.Site.Ask(async db =>
    {
        var person = await db.People.Include(p => p.Memberships).ThenInclude(m => m.Leaves).SingleAsync(p => p.Id == trainee.Id);
        var programme = await db.Programmes.SingleAsync(p => p.Id == world.Programme.Id);
        person.BeAway(world.Director, programme, first, last, world.Now);
        if (takenBack) person.TakeBack(await world.Coordinator(), await db.Sites.SingleAsync(), person.Memberships[0].Leaves[0], world.Now);
        return await db.SaveChangesAsync();
    });

    /// <summary>So many at once, each with a scan that waits.</summary>
    public static Task<int> Many(this World world, int number, string year = "year 1") => world.Site.Ask(async db =>
    {
        var programme = await db.Programmes.SingleAsync(p => p.Id == world.Programme.Id);
        for (var n = 0; n < number; n++)
        {
            var person = Person.Enrol($"Trainee {n:000} {programme.Name[^6..]}", world.Director, world.Now);
            person.Join(world.Director, programme, MembershipKind.Trainee, world.Now, year);
            var scan = Scan.Log(person, programme, Guid.CreateVersion7(world.Now), world.Entry(), null, world.Now);
            scan.Attach(person, world.Site.Still, world.Now);
            scan.Submit(person, world.Now);
            db.AddRange(person, scan);
        }
        return await db.SaveChangesAsync();
    });

    /// <summary>The world as one of its other trainees has it.</summary>
    public static World For(this World world, Person trainee) => world with { Trainee = trainee };

    public static string Sheet(this World world, string more = "") => $"/cohorts?programme={world.Programme.Id}{more}";

    public static string File(this World world, string more = "") => $"/cohorts/files?programme={world.Programme.Id}{more}";

    /// <summary>The words of a row: the trainee, what stands under the columns, and what is met.</summary>
    public static IReadOnlyList<string> Row(this Visitor visitor, Person trainee)
    {
        var row = Assert.Single(visitor.Page.QuerySelectorAll(".sheet tbody tr"), r => r.QuerySelector("th a")!.TextContent == trainee.Name);
        return [Words(row.QuerySelector("th .note")!), .. row.QuerySelectorAll("td").Select(c => Words(c.QuerySelector("[aria-hidden]:not(svg)") ?? c))];
    }

    public static IReadOnlyList<string> Names(this Visitor visitor) => [.. visitor.Page.QuerySelectorAll(".sheet tbody th a").Select(a => a.TextContent)];

    /// <summary>Those who stall, each with how long.</summary>
    public static IReadOnlyList<(string Who, string Since)> Stalled(this Visitor visitor) =>
        [.. visitor.Page.QuerySelectorAll("section[aria-labelledby=stalled] li").Select(l => (l.QuerySelector(".who")!.TextContent, Words(l.Children[1])))];

    /// <summary>Cells and lines stand apart, as one reads them.</summary>
    public static string Words(IElement element) => string.Join(' ', element.Descendants<IText>().SelectMany(t => t.Data.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries)));
}
