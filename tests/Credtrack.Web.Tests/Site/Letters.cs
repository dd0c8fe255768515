using MimeKit;

namespace Credtrack.Web.Tests.Site;

/// <summary>Reads what lies in the pick-up folder, as a mail program would.</summary>
internal static class Letters
{
    public static MimeMessage To(RunningSite site, string address) => Assert.Single(AllTo(site, address));

    public static IEnumerable<MimeMessage> AllTo(RunningSite site, string address) =>
        Directory.Exists(site.MailFolder) ? Directory.EnumerateFiles(site.MailFolder, "*.eml").Select(file => MimeMessage.Load(file)).Where(m => m.To.Mailboxes.Any(to => to.Address == address)) : [];

    public static string LinkIn(MimeMessage letter) => new Uri(letter.TextBody!.Split('\n').Single(line => line.StartsWith("http", StringComparison.Ordinal)).Trim()).PathAndQuery;
}
