using Credtrack.Core.Grants;
using Credtrack.Core.People;

namespace Credtrack.Core.Tests.Grants;

public sealed class GrantTests
{
    private readonly Cast cast = new();

    private Grant Proposed() => Grant.Propose(cast.Director, cast.Trainee, cast.Programme, cast["lung"], "Lung without supervision", [], Cast.Noon);

    private Grant Signed()
    {
        var grant = Proposed();
        grant.Sign(cast.Director, Texts.Of(met: true), Meaning.Granted, null, Cast.Noon);
        return grant;
    }

    [Fact]
    public void A_director_proposes_signs_and_ends()
    {
        var grant = Proposed();
        Assert.Equal(GrantState.Proposed, grant.State);
        grant.Sign(cast.Director, Texts.Of(met: true), Meaning.Granted, null, Cast.Noon);
        Assert.Equal(GrantState.Active, grant.State);
        grant.End(cast.Director, "Left the hospital.", Cast.Noon);
        Assert.Equal(GrantState.Ended, grant.State);
        Assert.Equal(["GrantProposed", "GrantSigned", "GrantEnded"], grant.NewFacts.Select(f => f.GetType().Name));
    }

    [Fact]
    public void Only_a_director_of_the_programme_proposes_and_never_for_themselves()
    {
        foreach (var kind in new[] { MembershipKind.Reader, MembershipKind.Coordinator, MembershipKind.Chair, MembershipKind.Trainee })
            Assert.Equal("Only this programme's director proposes a grant.", Grant.WhyNotPropose(cast.Enrol("Other", kind), cast.Trainee, cast.Programme, []));
        Assert.Equal("Only this programme's director proposes a grant.", Grant.WhyNotPropose(cast.Director, cast.Trainee, cast.Elsewhere, []));
        cast.Director.Join(cast.Director, cast.Programme, MembershipKind.Trainee, Cast.Noon);
        Refused.With("Nobody proposes a privilege for themselves.", Grant.WhyNotPropose(cast.Director, cast.Director, cast.Programme, []),
            () => Grant.Propose(cast.Director, cast.Director, cast.Programme, cast["lung"], "Lung", [], Cast.Noon));
    }

    [Fact]
    public void What_is_proposed_or_stands_is_not_proposed_again_but_what_was_declined_or_ended_may_be()
    {
        var (declined, ended) = (Proposed(), Signed());
        declined.TurnDown(cast.Director, "Too early.", Cast.Noon);
        ended.End(cast.Director, "Left.", Cast.Noon);
        Assert.Equal("A grant of this application is already proposed.", Grant.WhyNotPropose(cast.Director, cast.Trainee, cast.Programme, [Proposed()]));
        Assert.Equal("This privilege is already granted.", Grant.WhyNotPropose(cast.Director, cast.Trainee, cast.Programme, [Signed()]));
        Assert.Null(Grant.WhyNotPropose(cast.Director, cast.Trainee, cast.Programme, [declined, ended]));
    }

    [Fact]
    public void Nobody_signs_for_themselves_and_only_a_director_signs()
    {
        var both = cast.Enrol("Bo", MembershipKind.Trainee, MembershipKind.Director);
        var own = Grant.Propose(cast.Director, both, cast.Programme, cast["lung"], "Lung", [], Cast.Noon);
        Refused.With("Nobody signs their own privilege.", own.WhyNotSign(both), () => own.Sign(both, Texts.Of(true), Meaning.Granted, null, Cast.Noon));
        Assert.Equal("Nobody declines their own privilege.", own.WhyNotDecline(both));
        foreach (var kind in new[] { MembershipKind.Reader, MembershipKind.Coordinator, MembershipKind.Chair, MembershipKind.Trainee })
            Assert.Equal("Only this programme's director signs.", own.WhyNotSign(cast.Enrol("Other", kind)));
    }

    [Fact]
    public void It_is_signed_once_and_not_after_it_was_declined_or_ended()
    {
        var (signed, declined) = (Signed(), Proposed());
        declined.TurnDown(cast.Director, "Too early.", Cast.Noon);
        Refused.With("This privilege is already signed.", signed.WhyNotSign(cast.Director), () => signed.Sign(cast.Director, Texts.Of(true), Meaning.Granted, null, Cast.Noon));
        Assert.Equal("This proposal was declined.", declined.WhyNotSign(cast.Director));
        Assert.Equal("Only a grant that was signed can be ended.", declined.WhyNotEnd(cast.Director));
        signed.End(cast.Director, "Left.", Cast.Noon);
        Assert.Equal("This grant has ended.", signed.WhyNotSign(cast.Director));
        Refused.With("This grant has ended already.", signed.WhyNotEnd(cast.Director), () => signed.End(cast.Director, "Again.", Cast.Noon));
    }

    [Fact]
    public void A_gap_asks_for_a_reason_and_then_does_not_block()
    {
        var grant = Proposed();
        Refused.With("Requirements are not met: say why you sign all the same.", () => grant.Sign(cast.Director, Texts.Of(met: false), Meaning.Granted, " ", Cast.Noon));
        grant.Sign(cast.Director, Texts.Of(met: false), Meaning.GrantedUnderProctoring, "Trained elsewhere.", Cast.Noon);
        Assert.Equal("Trained elsewhere.", grant.Signature!.GapReason);
    }

    [Fact]
    public void The_signature_keeps_the_text_its_digest_and_its_meaning()
    {
        var (grant, text) = (Signed(), Texts.Of(met: true));
        Assert.Equal((text.Text, text.Digest, Meaning.Granted, cast.Director.Id), (grant.Signature!.Text, grant.Signature.Digest, grant.Signature.Meaning, grant.Signature.SignerId));
    }

    [Fact]
    public void The_paper_is_issued_once_and_only_of_what_is_signed()
    {
        Refused.With("Only a signed grant has a summary.", () => Proposed().Issue(cast.Director, "code", [1], "hash", Cast.Noon));
        var grant = Signed();
        grant.Issue(cast.Director, "code", [1], "hash", Cast.Noon);
        Refused.With("The summary of this grant is issued already.", () => grant.Issue(cast.Director, "other", [2], "other", Cast.Noon));
    }

    [Fact]
    public void Reasons_are_never_quoted_in_the_ledger()
    {
        var grant = Proposed();
        grant.Sign(cast.Director, Texts.Of(met: false), Meaning.Granted, "hush-4711", Cast.Noon);
        grant.End(cast.Director, "hush-4711", Cast.Noon);
        Assert.All(grant.NewFacts, f => Assert.DoesNotContain("hush", f.Sentence, StringComparison.Ordinal));
        Assert.Equal([grant.Signature!.Gap!.Seal], grant.NewFacts.OfType<GrantSigned>().Select(f => f.GapSeal));
        Assert.Equal([new SealedText("hush-4711", grant.Ending!.ReasonSalt).Seal], grant.NewFacts.OfType<GrantEnded>().Select(f => f.ReasonSeal));
        Assert.NotEqual(grant.Signature.GapSalt, grant.Ending.ReasonSalt);
    }

    [Fact]
    public void It_is_open_until_it_is_declined_or_ended()
    {
        var (declined, signed) = (Proposed(), Signed());
        Assert.Equal((true, true), (declined.IsOpen, signed.IsOpen));
        declined.TurnDown(cast.Director, "Too early.", Cast.Noon);
        signed.End(cast.Director, "Left.", Cast.Noon);
        Assert.Equal((null, null), (declined.IsOpen, signed.IsOpen));
    }
}
