using System.Security.Cryptography;
using Credtrack.Core.People;
using Credtrack.Core.Plumbing;

namespace Credtrack.Core.Grants;

public sealed partial class Grant
{
    public string? WhyNotSign(Person by) =>
          by.Id == HolderId                             ? "Nobody signs their own privilege."
        : !by.Is(MembershipKind.Director, ProgrammeId)  ? "Only this programme's director signs."
        : State == GrantState.Proposed                  ? null
        : State == GrantState.Declined                  ? "This proposal was declined."
        : State == GrantState.Ended                     ? "This grant has ended."
        :                                                 "This privilege is already signed.";

    /// <summary>A gap never blocks: people decide. It asks for a reason, which the paper prints.</summary>
    public void Sign(Person by, Statement statement, Meaning meaning, string? gapReason, DateTime at)
    {
        RuleBroken.If(WhyNotSign(by) ?? (statement.Gaps.Count > 0 && string.IsNullOrWhiteSpace(gapReason) ? "Requirements are not met: say why you sign all the same." : FreeText.WhyNotKeep(gapReason)));
        var signature = new Signature(this, by, statement, meaning, statement.Gaps.Count > 0 ? SealedText.New(gapReason!) : null, at);
        signatures.Add(signature);
        Record(new GrantSigned(by, at, Privilege, meaning, signature.Digest, signature.Gap?.Seal));
    }

    public string? WhyNotDecline(Person by) => WhyNotSign(by) is { } why ? why.Replace("signs", "declines", StringComparison.Ordinal) : null;

    public void TurnDown(Person by, string reason, DateTime at)
    {
        RuleBroken.If(WhyNotDecline(by) ?? FreeText.WhyNotReason(reason));
        var text = SealedText.New(reason);
        (Decline, IsOpen) = (new Decline(this, by, text, at), null);
        Record(new GrantDeclined(by, at, text.Seal));
    }

    public string? WhyNotEnd(Person by) =>
          by.Id == HolderId                             ? "Nobody ends their own privilege here; ask your programme's director."
        : !by.Is(MembershipKind.Director, ProgrammeId)  ? "Only this programme's director ends a grant."
        : State == GrantState.Active                    ? null
        : State == GrantState.Ended                     ? "This grant has ended already."
        :                                                 "Only a grant that was signed can be ended.";

    public void End(Person by, string reason, DateTime at)
    {
        RuleBroken.If(WhyNotEnd(by) ?? FreeText.WhyNotReason(reason));
        var text = SealedText.New(reason);
        (Ending, IsOpen) = (new Ending(this, by, text, at), null);
        Record(new GrantEnded(by, at, text.Seal));
    }

    /// <summary>Keeps the sealed paper as it left the house. Nothing is made twice.</summary>
    public void Issue(Person by, string code, byte[] bytes, string sha256, DateTime at)
    {
        RuleBroken.If(State != GrantState.Active ? "Only a signed grant has a summary." : documents.Count > 0 ? "The summary of this grant is issued already." : null);
        documents.Add(new Document(this, code, bytes, sha256, at));
        Record(new DocumentIssued(by, at, sha256));
    }

    /// <summary>The kinds of facts that speak of a row with a text or a digest.</summary>
    public static IReadOnlyList<string> ClaimedBy { get; } = [nameof(GrantSigned), nameof(GrantDeclined), nameof(GrantEnded), nameof(DocumentIssued)];

    public override IEnumerable<RowClaim> Claims() =>
    [
        .. signatures.Select(s => new RowClaim(nameof(GrantSigned), s.SignerId, s.At, (nameof(GrantSigned.Digest), s.Digest), (nameof(GrantSigned.Digest), Statement.Hex(s.Text)), (nameof(GrantSigned.GapSeal), s.Gap?.Seal))),
        .. Decline is { } decline ? [new RowClaim(nameof(GrantDeclined), decline.ById, decline.At, (nameof(GrantDeclined.ReasonSeal), new SealedText(decline.Reason, decline.ReasonSalt).Seal))] : Array.Empty<RowClaim>(),
        .. Ending is { } ending ? [new RowClaim(nameof(GrantEnded), ending.ById, ending.At, (nameof(GrantEnded.ReasonSeal), new SealedText(ending.Reason, ending.ReasonSalt).Seal))] : Array.Empty<RowClaim>(),
        .. documents.Select(d => new RowClaim(nameof(DocumentIssued), null, d.At, (nameof(DocumentIssued.Sha256), d.Sha256), (nameof(DocumentIssued.Sha256), Convert.ToHexStringLower(SHA256.HashData(d.Bytes))))),
    ];
}
