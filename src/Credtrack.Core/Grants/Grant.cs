using Credtrack.Core.Catalogue;
using Credtrack.Core.People;

namespace Credtrack.Core.Grants;

public enum GrantState { Proposed, Declined, Active, Ended }

/// <summary>A decision to allow an application without supervision. People decide; the grant keeps what they saw, who signed and what became of it.</summary>
public sealed partial class Grant : Recorded
{
    public const int LongestReason = 1000;

    private readonly List<Signature> signatures = [];
    private readonly List<Document> documents = [];

    public Guid HolderId { get; private init; }
    public Guid ProgrammeId { get; private init; }
    public Guid ApplicationId { get; private init; }

    /// <summary>What is allowed, in words.</summary>
    public string Privilege { get; private init; } = "";
    public Guid ProposedById { get; private init; }
    public DateTime ProposedAt { get; private init; }
    public Decline? Decline { get; private set; }
    public Ending? Ending { get; private set; }

    /// <summary>True while it is proposed or stands, else null: of those the database lets in one alone for a holder, application and programme.</summary>
    public bool? IsOpen { get; private set; }
    public IReadOnlyList<Signature> Signatures => signatures;
    public IReadOnlyList<Document> Documents => documents;

    // For projections only; a verb compares ids.
    public Person Holder { get; private init; } = null!;
    public Person ProposedBy { get; private init; } = null!;
    public Programme Programme { get; private init; } = null!;
    public Application Application { get; private init; } = null!;

    private Grant() { }

    public GrantState State =>
          Ending is not null     ? GrantState.Ended
        : Decline is not null    ? GrantState.Declined
        : signatures.Count > 0   ? GrantState.Active
        :                          GrantState.Proposed;

    /// <summary>Today one place: the director's. A second signer gets place 2.</summary>
    public Signature? Signature => signatures.SingleOrDefault(s => s.Place == Signature.Director);

    public static string? WhyNotPropose(Person by, Person holder, Programme programme, IEnumerable<Grant> earlier) =>
          by.Id == holder.Id                             ? "Nobody proposes a privilege for themselves."
        : !by.Is(MembershipKind.Director, programme.Id)  ? "Only this programme's director proposes a grant."
        : earlier.Any(g => g.State == GrantState.Proposed) ? "A grant of this application is already proposed."
        : earlier.Any(g => g.State == GrantState.Active) ? "This privilege is already granted."
        : null;

    /// <param name="earlier">all grants of this application to this holder in this programme</param>
    public static Grant Propose(Person by, Person holder, Programme programme, Application application, string privilege, IEnumerable<Grant> earlier, DateTime at)
    {
        RuleBroken.If(WhyNotPropose(by, holder, programme, earlier));
        var grant = new Grant
        {
            Id = Guid.CreateVersion7(at),
            HolderId = holder.Id,
            ProgrammeId = programme.Id,
            ApplicationId = application.Id,
            Privilege = privilege,
            ProposedById = by.Id,
            ProposedAt = at,
            IsOpen = true,
        };
        grant.Record(new GrantProposed(by, at, holder.Name, privilege));
        return grant;
    }
}
