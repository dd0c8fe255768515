using Credtrack.Web.Plumbing.Mail;
using Microsoft.Extensions.Logging.Abstractions;

namespace Credtrack.Web.Tests.Plumbing.Mail;

/// <summary>Against a real mail server in this process.</summary>
public sealed class ServerPostTests
{
    [Fact]
    public async Task A_letter_arrives_whole_with_its_own_id()
    {
        using var server = new PostOffice();
        var letter = Letter("ruth@tests.example");
        Assert.Empty(await Post(server.Settings).Send([letter]));
        var message = Assert.Single(server.Arrived);
        Assert.Equal(("Ruth <b>&</b> Søn", "ruth@tests.example", "Choose", "Two lines,\nwith ø.", $"{letter.Id}@hospital.example"),
            (message.To.Mailboxes.Single().Name, message.To.Mailboxes.Single().Address, message.Subject, message.TextBody!.ReplaceLineEndings("\n").TrimEnd(), message.MessageId));
    }

    [Fact]
    public async Task One_that_is_refused_does_not_hold_up_the_others()
    {
        using var server = new PostOffice();
        var (bad, good) = (Letter("nobody@tests.example"), Letter("ruth@tests.example"));
        Assert.Equal([bad], await Post(server.Settings).Send([bad, good]));
        Assert.Equal("ruth@tests.example", Assert.Single(server.Arrived).To.Mailboxes.Single().Address);
    }

    [Fact]
    public async Task Where_no_server_answers_all_are_left() =>
        Assert.Single(await Post(PostOffice.SettingsFor(PostOffice.FreePort())).Send([Letter("ruth@tests.example")]));

    private static Letter Letter(string to) => new(Guid.NewGuid(), to, "Ruth <b>&</b> Søn", "Choose", "Two lines,\nwith ø.");

    private static ServerPost Post(MailSettings settings) => new(settings, NullLogger<ServerPost>.Instance);
}
