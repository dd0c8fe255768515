namespace Credtrack.Core.People;

public sealed partial class Person
{
    /// <summary>A link that comes by hand or mail is looked at within days; the first administrator stands in front of the machine.</summary>
    public static TimeSpan GoodFor(InvitationKind kind) => kind == InvitationKind.Member ? TimeSpan.FromDays(7) : TimeSpan.FromHours(24);

    public string? WhyNotBeInvited(Person by, Site site, Membership membership, DateOnly today) =>
          membership.LastDay < today ? "This membership is over; nobody is invited by it."
        : site.IsAdministeredBy(by) ? null
        : WhyNotAdmit(by, site, membership.Programme, membership.Kind);

    /// <summary>Of several links the newest alone is good.</summary>
    /// <param name="digest">SHA-256 of the secret in the link</param>
    public Invitation Invite(Person by, InvitationKind kind, string digest, DateTime at)
    {
        foreach (var earlier in invitations.Where(i => i.IsOpen(at))) earlier.Replace(at);
        var invitation = new Invitation(this, kind, digest, at, GoodFor(kind));
        invitations.Add(invitation);
        Record(new PersonInvited(by, at, Name, kind));
        return invitation;
    }

    public static string? WhyNotChoosePassword(Invitation invitation, DateTime at) =>
          invitation.UsedAt is not null ? "This link has been used. It works once only."
        : !invitation.IsOpen(at) ? "This link is no longer good: its time is over, or a newer one has replaced it."
        : null;

    public void ChoosePassword(Invitation invitation, DateTime at)
    {
        RuleBroken.If(WhyNotChoosePassword(invitation, at));
        invitation.Use(at);
        Record(new PasswordChosen(this, at));
    }

    /// <summary>With the one before it, without a link.</summary>
    public void ChangePassword(DateTime at) => Record(new PasswordChosen(this, at));
}
