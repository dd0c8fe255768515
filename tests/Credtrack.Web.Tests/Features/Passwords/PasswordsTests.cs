
namespace Credtrack.Web.Tests.Features.Passwords;

public sealed class PasswordsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_link_lets_its_person_choose_a_password_once()
    {
        var world = await site.NewWorld();
        var link = await world.Link(world.Reader);
        using var reader = site.Visitor();
        await reader.Opens(link);
        Assert.Contains($"For {world.Reader.Name}, who signs in as {World.AddressOf(world.Reader)}.", reader.Text, StringComparison.Ordinal);
        await reader.Chooses(Staffing.NewPassword);
        Assert.Equal("/sign-in", reader.Url);
        Assert.Contains("Your password is saved.", reader.Text, StringComparison.Ordinal);
        await reader.SignsInWith(World.AddressOf(world.Reader), Staffing.NewPassword);
        Assert.Equal("/", reader.Url);
        Assert.Equal($"{world.Reader.Name} chose a password.", (await world.Facts(world.Reader.Id))[^1]);

        await reader.Opens(link);
        Assert.Equal(HttpStatusCode.Gone, reader.Status);
        Assert.Contains("This link has been used. It works once only. Ask your programme’s coordinator for a new one.", reader.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Over_used_replaced_or_made_up_it_is_refused_and_changes_nothing()
    {
        var world = await site.NewWorld();
        using var reader = site.Visitor();
        var old = await world.Link(world.Reader);
        await reader.Opens(old);
        var replaced = await world.Link(world.Reader);
        await reader.Chooses(Staffing.NewPassword);
        Assert.Equal(HttpStatusCode.Gone, reader.Status);
        await reader.Opens(replaced);
        Assert.Equal(HttpStatusCode.OK, reader.Status);
        var now = site.Clock.Now;
        site.Clock.Now += TimeSpan.FromDays(7);
        await reader.Chooses(Staffing.NewPassword);
        site.Clock.Now = now;
        Assert.Equal(HttpStatusCode.Gone, reader.Status);
        foreach (var made in new[] { "/passwords/new", "/passwords/new?key=", "/passwords/new?key=AAAA" }) Assert.Equal(HttpStatusCode.NotFound, (await reader.Opens(made)).Status);
        await reader.SignsInWith(World.AddressOf(world.Reader), World.Password);
        Assert.Equal("/", reader.Url);
    }

    [Fact]
    public async Task Of_two_browsers_with_one_link_one_wins()
    {
        var world = await site.NewWorld();
        var link = await world.Link(world.Reader);
        using var one = site.Visitor();
        using var other = site.Visitor();
        await one.Opens(link);
        await other.Opens(link);
        site.Rival.ActsBeforeNextSave(() => other.Chooses("a stranger was faster"));
        await one.Chooses(Staffing.NewPassword);
        Assert.Equal(HttpStatusCode.Conflict, one.Status);
        await other.SignsInWith(World.AddressOf(world.Reader), "a stranger was faster");
        Assert.Equal("/", other.Url);
    }

    [Theory]
    [InlineData("too short", "too short", "Use at least 15 characters; a few words with spaces between them are fine.")]
    [InlineData("password password1", "password password2", "The two passwords differ. Type the same one twice.")]
    [InlineData("1234567890123456", "1234567890123456", "These are keys or figures in a row. Choose something less regular.")]
    [InlineData("", "", "Choose a password.")]
    public async Task A_weak_one_is_refused_beside_its_field_and_never_sent_back(string password, string repeated, string why)
    {
        var world = await site.NewWorld();
        using var reader = site.Visitor();
        await reader.Opens(await world.Link(world.Reader));
        await reader.Fills("Password", password).Fills("The same password again", repeated).Presses("Save the password");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, reader.Status);
        Assert.Equal([why], reader.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));
        Assert.Empty(reader.Typed("Password"));
        await reader.Chooses(Staffing.NewPassword); // the same page goes on
        Assert.Equal("/sign-in", reader.Url);
    }

    [Fact]
    public async Task A_new_password_by_a_link_ends_what_was_signed_in_with_the_old_one()
    {
        var world = await site.NewWorld();
        using var thief = await site.Visitor().SignsInWith(World.AddressOf(world.Reader), World.Password);
        using var reader = site.Visitor();
        await reader.Opens(await world.Link(world.Reader));
        await reader.Chooses(Staffing.NewPassword);
        Assert.StartsWith("/sign-in", (await thief.Opens("/scans")).Url, StringComparison.Ordinal);
        Assert.Equal("/sign-in", (await thief.SignsInWith(World.AddressOf(world.Reader), World.Password)).Url);
    }

    [Fact]
    public async Task Who_is_signed_in_changes_it_with_the_one_before_and_stays_in_here_alone()
    {
        var world = await site.NewWorld();
        using var here = await world.As(world.Reader);
        using var elsewhere = await world.As(world.Reader);
        await here.Opens($"/passwords/{world.Reader.Id}/edit");
        await Changes("wrong one altogether");
        Assert.Equal(["This is not your password."], here.Page.QuerySelectorAll(".notice.bad li").Select(l => l.TextContent));
        await Changes(World.Password);
        Assert.Equal("/sessions", here.Url);
        Assert.StartsWith("/sign-in", (await elsewhere.Opens("/scans")).Url, StringComparison.Ordinal);
        Assert.Equal("/", (await elsewhere.SignsInWith(World.AddressOf(world.Reader), Staffing.NewPassword)).Url);

        Task<Visitor> Changes(string current) => here.Fills("Your password now", current).Fills("New password", Staffing.NewPassword).Fills("The new password again", Staffing.NewPassword).Presses("Change the password");
    }

    [Fact]
    public async Task Nobody_changes_anothers()
    {
        var world = await site.NewWorld();
        using var director = await world.As(world.Director);
        Assert.Equal(HttpStatusCode.NotFound, (await director.Opens($"/passwords/{world.Reader.Id}/edit")).Status);
        await director.Opens($"/passwords/{world.Director.Id}/edit");
        director.Page.QuerySelector("form[action*='passwords']")!.SetAttribute("action", $"/passwords/{world.Reader.Id}");
        await director.Fills("Your password now", World.Password).Fills("New password", Staffing.NewPassword).Fills("The new password again", Staffing.NewPassword).Presses("Change the password");
        Assert.Equal(HttpStatusCode.NotFound, director.Status);
    }

    [Fact]
    public async Task What_is_kept_is_a_slow_hash_and_an_older_one_is_made_anew_at_the_next_sign_in()
    {
        var world = await site.NewWorld();
        Assert.Equal(100_000, await Rounds()); // the default of the library, with which the worlds of the tests begin
        using var reader = await site.Visitor().SignsInWith(World.AddressOf(world.Reader), World.Password);
        Assert.Equal(Web.Plumbing.Accounts.HashRounds, await Rounds());
        await reader.Opens(await world.Link(world.Reader));
        await reader.Chooses(Staffing.NewPassword);
        Assert.Equal(Web.Plumbing.Accounts.HashRounds, await Rounds());

        // Layout of the stored hash, version 3: a marker, then algorithm and rounds as four bytes each, high byte first (source of the hasher, MIT).
        async Task<int> Rounds() => System.Buffers.Binary.BinaryPrimitives.ReadInt32BigEndian(Convert.FromBase64String(await site.Ask(db => db.Users.Where(a => a.Id == world.Reader.Id).Select(a => a.PasswordHash!).SingleAsync())).AsSpan(5));
    }
}
