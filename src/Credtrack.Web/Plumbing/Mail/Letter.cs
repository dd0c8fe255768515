using MimeKit;

namespace Credtrack.Web.Plumbing.Mail;

/// <summary>One message to one person, in plain text. The same id sent again is the same message to whoever receives it.</summary>
public sealed record Letter(Guid Id, string To, string Name, string Subject, string Text)
{
    public MimeMessage From(MailSettings settings)
    {
        var from = MailboxAddress.Parse(settings.From);
        return new MimeMessage([from], [new MailboxAddress(Name, To)], Subject, new TextPart("plain") { Text = Text }) { MessageId = $"{Id}@{from.Domain}" };
    }
}

/// <summary>Takes letters off our hands. Two ways: a mail server, and a folder from which somebody else's program picks them up.</summary>
public interface IPost
{
    /// <summary>The letters that could not be handed over; empty if all went.</summary>
    Task<IReadOnlyCollection<Letter>> Send(IReadOnlyCollection<Letter> letters);
}
