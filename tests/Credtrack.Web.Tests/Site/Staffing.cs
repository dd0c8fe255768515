using Credtrack.Core.People;
using Credtrack.Web.Plumbing;

namespace Credtrack.Web.Tests.Site;

/// <summary>Those who look after people, and links, in a world.</summary>
internal static class Staffing
{
    public const string NewPassword = "three green herons wade";

    /// <summary>Somebody who looks after the site and is in no programme.</summary>
    public static async Task<Person> Administrator(this World world, string name = "Ada")
    {
        var person = await world.Another(name);
        await world.Site.Ask(async db =>
        {
            var site = await db.Sites.SingleAsync();
            var founder = await db.People.SingleAsync(p => p.Name == "Founder");
            site.Appoint(founder, await db.People.SingleAsync(p => p.Id == person.Id), world.Now);
            return await db.SaveChangesAsync();
        });
        return person;
    }

    public static Task<Person> Coordinator(this World world) => world.Another("Cora", MembershipKind.Coordinator);

    public static string People(this World world) => $"/programmes/{world.Programme.Id}/memberships";

    /// <summary>The address of the page of a person's only membership.</summary>
    public static async Task<string> MembershipOf(this World world, Person person) =>
        $"{world.People()}/{await world.Site.Ask(db => db.People.Where(p => p.Id == person.Id).SelectMany(p => p.Memberships).Where(m => m.ProgrammeId == world.Programme.Id).Select(m => m.Id).SingleAsync())}";

    /// <summary>The address of a fresh link for a person.</summary>
    public static async Task<string> Link(this World world, Person person, InvitationKind kind = InvitationKind.Member)
    {
        var key = SecretKey.New();
        await world.Site.Ask(async db =>
        {
            var one = await db.People.Include(p => p.Invitations).SingleAsync(p => p.Id == person.Id);
            one.Invite(one, kind, key.Digest, world.Now);
            return await db.SaveChangesAsync();
        });
        return $"/passwords/new?key={key.Text}";
    }

    public static Task<Visitor> Chooses(this Visitor visitor, string password) => visitor.Fills("Password", password).Fills("The same password again", password).Presses("Save the password");

    public static async Task<Visitor> SignsInWith(this Visitor visitor, string address, string password)
    {
        await visitor.Opens("/sign-in");
        return await visitor.Fills("E-mail address", address).Fills("Password", password).Presses("Sign in");
    }

    public static Task<List<string>> Facts(this World world, Guid subject) => world.Site.Ask(db => db.LedgerEntries.Where(l => l.SubjectId == subject).OrderBy(l => l.Number).Select(l => l.Sentence).ToListAsync());
}
