using System.Buffers;
using System.Net.Sockets;
using Credtrack.Web.Plumbing.Mail;
using Microsoft.Extensions.Logging.Abstractions;
using MimeKit;
using SmtpServer;
using SmtpServer.ComponentModel;
using SmtpServer.Mail;
using SmtpServer.Protocol;
using SmtpServer.Storage;

namespace Credtrack.Web.Tests.Plumbing.Mail;

/// <summary>Against a real mail server in this process.</summary>
public sealed class ServerPostTests
{
    [Fact]
    public async Task A_letter_arrives_whole_with_its_own_id()
    {
        using var server = new Server();
        var letter = Letter("ruth@tests.example");
        Assert.Empty(await server.Post.Send([letter]));
        var message = Assert.Single(server.Arrived);
        Assert.Equal(("Ruth <b>&</b> Søn", "ruth@tests.example", "Choose", "Two lines,\nwith ø.", $"{letter.Id}@hospital.example"),
            (message.To.Mailboxes.Single().Name, message.To.Mailboxes.Single().Address, message.Subject, message.TextBody!.ReplaceLineEndings("\n").TrimEnd(), message.MessageId));
    }

    [Fact]
    public async Task One_that_is_refused_does_not_hold_up_the_others()
    {
        using var server = new Server();
        var (bad, good) = (Letter("nobody@tests.example"), Letter("ruth@tests.example"));
        Assert.Equal([bad], await server.Post.Send([bad, good]));
        Assert.Equal("ruth@tests.example", Assert.Single(server.Arrived).To.Mailboxes.Single().Address);
    }

    [Fact]
    public async Task Where_no_server_answers_all_are_left() =>
        Assert.Single(await new ServerPost(Settings(FreePort()), NullLogger<ServerPost>.Instance).Send([Letter("ruth@tests.example")]));

    private static Letter Letter(string to) => new(Guid.NewGuid(), to, "Ruth <b>&</b> Søn", "Choose", "Two lines,\nwith ø.");

    private static MailSettings Settings(int port) => new("127.0.0.1", port, false, null, null, "Credtrack <credtrack@hospital.example>", "");

    private static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }

    private sealed class Server : MessageStore, IDisposable
    {
        private readonly CancellationTokenSource stop = new();

        public Server()
        {
            var services = new ServiceProvider();
            services.Add(this);
            services.Add(new NobodyIsUnknown());
            var port = FreePort();
            Post = new(Settings(port), NullLogger<ServerPost>.Instance);
            _ = new SmtpServer.SmtpServer(new SmtpServerOptionsBuilder().ServerName("localhost").Port(port).Build(), services).StartAsync(stop.Token);
        }

        public ServerPost Post { get; }
        public List<MimeMessage> Arrived { get; } = [];

        public override Task<SmtpResponse> SaveAsync(ISessionContext context, IMessageTransaction transaction, ReadOnlySequence<byte> buffer, CancellationToken cancellationToken)
        {
            using var stream = new MemoryStream(buffer.ToArray());
            Arrived.Add(MimeMessage.Load(stream, cancellationToken));
            return Task.FromResult(SmtpResponse.Ok);
        }

        public void Dispose() => stop.Cancel();
    }

    private sealed class NobodyIsUnknown : MailboxFilter
    {
        public override Task<bool> CanDeliverToAsync(ISessionContext context, IMailbox to, IMailbox from, CancellationToken cancellationToken) => Task.FromResult(to.User != "nobody");
    }
}
