namespace Credtrack.Web.Commands;

/// <summary>Makes a link for an administrator. Whoever can run it on the server needs no other leave; it is told in the ledger.</summary>
public static class Invite
{
    public const string Usage = "usage: invite --administrator";

    /// <summary>The start of an installation in which nobody can sign in yet.</summary>
    public static async Task OfferFirstLink(IServiceProvider services, TextWriter output)
    {
        await using var scope = services.CreateAsyncScope();
        if (!await scope.ServiceProvider.GetRequiredService<CredtrackDb>().Users.AnyAsync()) await Write(scope.ServiceProvider, output);
    }

    /// <summary>Exit status 0, or 2 for wrong use.</summary>
    public static async Task<int> Run(string[] args, TextWriter output, TextWriter error, IServiceProvider services)
    {
        if (args is not ["--administrator"])
        {
            await error.WriteLineAsync(Usage);
            return 2;
        }
        await services.Migrate(); // it may be the first thing that is run here
        await using var scope = services.CreateAsyncScope();
        await Write(scope.ServiceProvider, output);
        return 0;
    }

    private static async Task Write(IServiceProvider services, TextWriter output)
    {
        var (db, at, key) = (services.GetRequiredService<CredtrackDb>(), services.GetRequiredService<TimeProvider>().UtcNow(), SecretKey.New());
        // A link that nobody used leaves a person without account behind; the next one is theirs too, and the earlier one ends.
        var person = await db.People.Include(p => p.Invitations).FirstOrDefaultAsync(p => p.Invitations.Any(i => i.Kind == InvitationKind.Administrator && i.UsedAt == null) && !db.Users.Any(a => a.Id == p.Id));
        if (person is null) db.Add(person = Person.Enrol("Invited administrator", null, at));
        var invitation = person.Invite(person, InvitationKind.Administrator, key.Digest, at);
        await db.SaveChangesAsync();
        await output.WriteLineAsync("With this link an administrator chooses name and password. It works once, and ends any earlier one:");
        await output.WriteLineAsync($"  {services.GetRequiredService<Settings>().Link($"passwords/new?key={key.Text}")}");
        await output.WriteLineAsync($"It is good until {invitation.GoodUntil:yyyy-MM-dd HH:mm} UTC.");
    }
}
