using MailKit;
using MailKit.Net.Smtp;
using MailKit.Security;

namespace Credtrack.Web.Plumbing.Mail;

/// <summary>By one connection to the mail server. A letter that it refuses does not hold up the others; nothing of a letter goes to the log.</summary>
public sealed class ServerPost(MailSettings settings, ILogger<ServerPost> log) : IPost
{
    private const int Patience = 10_000;

    public async Task<IReadOnlyCollection<Letter>> Send(IReadOnlyCollection<Letter> letters)
    {
        var left = letters.ToList();
        if (left.Count == 0) return left;
        try
        {
            using var server = new SmtpClient { Timeout = Patience };
            await server.ConnectAsync(settings.Host!, settings.Port, settings.IsEncryptedFromStart ? SecureSocketOptions.SslOnConnect : SecureSocketOptions.StartTlsWhenAvailable);
            if (settings.User is not null) await server.AuthenticateAsync(settings.User, settings.Password ?? "");
            foreach (var letter in letters) if (await Accepts(server, letter)) left.Remove(letter);
            await server.DisconnectAsync(quit: true);
        }
        catch (Exception fault) when (fault is IOException or System.Net.Sockets.SocketException or ProtocolException or CommandException or AuthenticationException or SslHandshakeException or ServiceNotConnectedException or OperationCanceledException or TimeoutException)
        {
            Log.MailServerFailed(log, left.Count);
        }
        return left;
    }

    private async Task<bool> Accepts(SmtpClient server, Letter letter)
    {
        try
        {
            using var message = letter.From(settings);
            await server.SendAsync(message);
            return true;
        }
        catch (SmtpCommandException refusal)
        {
            Log.LetterRefused(log, letter.Id, (int)refusal.StatusCode);
            return false;
        }
    }
}
