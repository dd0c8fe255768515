using System.Buffers;
using System.Collections.Concurrent;
using System.Net.Sockets;
using Credtrack.Web.Plumbing.Mail;
using MimeKit;
using SmtpServer;
using SmtpServer.ComponentModel;
using SmtpServer.Mail;
using SmtpServer.Protocol;
using SmtpServer.Storage;

namespace Credtrack.Web.Tests.Site;

/// <summary>A real mail server in this process. It knows everybody but those whom a test makes unknown to it.</summary>
public sealed class PostOffice : IDisposable
{
    private readonly CancellationTokenSource stop = new();

    public PostOffice()
    {
        var services = new ServiceProvider();
        services.Add(new Box(Arrived));
        services.Add(new Doorman(this));
        _ = new SmtpServer.SmtpServer(new SmtpServerOptionsBuilder().ServerName("localhost").Port(Port).Build(), services).StartAsync(stop.Token);
    }

    public int Port { get; } = FreePort();
    public MailSettings Settings => SettingsFor(Port);
    public ConcurrentQueue<MimeMessage> Arrived { get; } = [];

    /// <summary>The parts before the @ that it refuses.</summary>
    public ISet<string> Unknown { get; } = new HashSet<string> { "nobody" };

    public IReadOnlyList<MimeMessage> For(string address) => [.. Arrived.Where(m => m.To.Mailboxes.Single().Address == address)];

    public static MailSettings SettingsFor(int port) => new("127.0.0.1", port, false, null, null, "Credtrack <credtrack@hospital.example>", "");

    public static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }

    public void Dispose() => stop.Cancel();

    private sealed class Doorman(PostOffice office) : MailboxFilter
    {
        public override Task<bool> CanDeliverToAsync(ISessionContext context, IMailbox to, IMailbox from, CancellationToken cancellationToken) => Task.FromResult(!office.Unknown.Contains(to.User));
    }

    // Apart from the office, because the server disposes of it after each letter.
    private sealed class Box(ConcurrentQueue<MimeMessage> arrived) : MessageStore
    {
        public override Task<SmtpResponse> SaveAsync(ISessionContext context, IMessageTransaction transaction, ReadOnlySequence<byte> buffer, CancellationToken cancellationToken)
        {
            using var stream = new MemoryStream(buffer.ToArray());
            arrived.Enqueue(MimeMessage.Load(stream, cancellationToken));
            return Task.FromResult(SmtpResponse.Ok);
        }
    }
}
