using Credtrack.Core.People;

namespace Credtrack.Data.Maps;

internal sealed class AccountMap : IEntityTypeConfiguration<Account>, IEntityTypeConfiguration<Session>
{
    public void Configure(EntityTypeBuilder<Account> account)
    {
        account.ToTable("Accounts");
        account.HasOne<Person>().WithOne().HasForeignKey<Account>(a => a.Id);
        account.Property(a => a.PasswordHash).HasMaxLength(400);
    }

    public void Configure(EntityTypeBuilder<Session> session)
    {
        session.ToTable("Sessions");
        session.HasOne<Account>().WithMany().HasForeignKey(s => s.AccountId);
        session.Property(s => s.Browser).HasMaxLength(Session.LongestBrowser);
    }
}
