using Credtrack.Web.Plumbing.Mail;

namespace Credtrack.Web.Features.Programmes.Invitations;

public enum Delivery { ByMail, Shown }

public sealed record LinkLine(string Name, string Address, string Link, bool IsSent);

/// <summary>The links that were made just now. They cannot be shown again: what is kept is only their digest.</summary>
public sealed record LinksPage(IReadOnlyList<LinkLine> Lines, string Back)
{
    public bool AllSent => Lines.All(l => l.IsSent);
}

/// <summary>Makes accounts and links for people, hands the links over once all is saved.</summary>
public sealed class Inviting(CredtrackDb db, IPost post, Settings settings, Me me, TimeProvider clock)
{
    private readonly List<(Person Person, Account Account, Invitation Invitation, string Link)> made = [];

    /// <summary>Who has an account under these addresses, by the folded address. Two queries.</summary>
    public async Task<Dictionary<string, (Person Person, Account Account)>> Known(params IEnumerable<string> addresses)
    {
        var folded = addresses.Select(Account.Folded).ToList();
        var accounts = await db.Users.Where(a => folded.Contains(a.NormalizedUserName!)).ToListAsync();
        var ids = accounts.Select(a => a.Id).ToList();
        var people = await db.People.Include(p => p.Memberships).Include(p => p.Invitations).AsSplitQuery().Where(p => ids.Contains(p.Id)).ToDictionaryAsync(p => p.Id);
        return accounts.ToDictionary(a => a.NormalizedUserName!, a => (people[a.Id], a));
    }

    public Person Enrol(string name)
    {
        var person = Person.Enrol(name, me.Person, clock.UtcNow());
        db.Add(person);
        return person;
    }

    public Account Open(Person person, string address) => db.Add(Account.Open(person, address, me.Person, clock.UtcNow())).Entity;

    public void Invite(Person person, Account account, InvitationKind kind)
    {
        var key = SecretKey.New();
        made.Add((person, account, person.Invite(me.Person, account.HasPassword ? InvitationKind.Reset : kind, key.Digest, clock.UtcNow()), settings.Link($"passwords/new?key={key.Text}")));
    }

    /// <summary>After the save. A link that the mail server did not take is shown instead, so that it is not lost.</summary>
    public async Task<LinksPage> Deliver(Delivery delivery, string back)
    {
        if (delivery == Delivery.Shown) await post.Send([.. made.Where(m => m.Account.HasPassword).Select(Notice)]);
        var failed = delivery == Delivery.ByMail ? (await post.Send([.. made.Select(Letter)])).Select(l => l.Id).ToHashSet() : [.. made.Select(m => m.Invitation.Id)];
        return new([.. made.Select(m => new LinkLine(m.Person.Name, m.Account.Email!, m.Link, !failed.Contains(m.Invitation.Id)))], back);
    }

    private Letter Letter((Person Person, Account Account, Invitation Invitation, string Link) made) => new(made.Invitation.Id, made.Account.Email!, made.Person.Name,
        $"Credtrack at {me.Site.Name}: choose your password", $"""
        {made.Person.Name},

        {me.Person.Name} has made this link for you. With it you choose the password with which you sign in to Credtrack at {me.Site.Name}:

        {made.Link}

        It works once, until {made.Invitation.GoodUntil.Printed(me.Zone)} ({me.Site.TimeZone}). If you do not know why you get this, leave it alone.
        """);

    // Who holds the link can sign in as this person, so the person hears of it.
    private Letter Notice((Person Person, Account Account, Invitation Invitation, string Link) made) => new(Guid.CreateVersion7(clock.GetUtcNow()), made.Account.Email!, made.Person.Name,
        $"Credtrack at {me.Site.Name}: a link for you was handed over", $"""
        {made.Person.Name},

        {me.Person.Name} has made a link with which a new password is chosen for your account, and hands it over outside of e-mail. If you did not ask for it, tell your programme's coordinator at once: whoever uses the link can sign in as you.
        """);
}
