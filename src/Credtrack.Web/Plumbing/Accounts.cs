using Credtrack.Web.Plumbing.Mail;
using Microsoft.AspNetCore.DataProtection;
using Microsoft.AspNetCore.DataProtection.KeyManagement;
using Microsoft.AspNetCore.DataProtection.Repositories;
using Microsoft.AspNetCore.Identity;

namespace Credtrack.Web.Plumbing;

/// <summary>What signing in stands on.</summary>
public static class Accounts
{
    /// <summary>PBKDF2 with SHA-512; OWASP's password storage sheet asks for 210,000 (from memory). An older hash is made anew at the next sign-in.</summary>
    public const int HashRounds = 220_000;

    public static void AddAccounts(this IServiceCollection services, Settings settings)
    {
        services.AddAuthentication(IdentityConstants.ApplicationScheme).AddIdentityCookies(cookies => cookies.ApplicationCookie!.Configure(SignInCookie.Configure(settings)));
        services.AddIdentityCore<Account>().AddEntityFrameworkStores<CredtrackDb>().AddSignInManager();
        services.Configure<PasswordHasherOptions>(options => options.IterationCount = HashRounds);
        services.AddDataProtection().SetApplicationName("Credtrack");
        // Made on the first use, so that a command which needs no keys leaves no folder behind.
        services.AddOptions<KeyManagementOptions>().Configure<ILoggerFactory>((keys, log) =>
        {
            SecretFile.Folder(settings.KeyFolder);
            keys.XmlRepository = new FileSystemXmlRepository(new DirectoryInfo(settings.KeyFolder), log);
        });
        services.AddSingleton<PasswordPace>().AddSingleton<KnownDevice>().AddSingleton(settings.Mail);
        if (settings.Mail.Host is null) services.AddSingleton<IPost, FolderPost>();
        else services.AddSingleton<IPost, ServerPost>();
    }
}
