using Credtrack.Core.Catalogue;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Readings;

public sealed class JudgementTests
{
    private readonly Cast cast = new();

    public static TheoryData<string> Codes => [.. CatalogueEntry.Shipped.Select(e => e.Code)];

    [Theory, MemberData(nameof(Codes))]
    public void A_reader_who_agrees_is_at_no_fault(string code)
    {
        var scan = cast.Waiting(cast.Entry(code));
        Assert.Empty(cast.Agreeing(scan).Faults(scan));
    }

    [Theory, MemberData(nameof(Codes))]
    public void A_reader_answers_every_question_that_decides(string code)
    {
        var scan = cast.Waiting(cast.Entry(code));
        var none = cast.Agreeing(scan) with { Answers = new Dictionary<string, Answer>() };
        var deciding = cast[code].Questions.Where(q => cast[code].Kind == ApplicationKind.Procedure ? q.Code == "target-reached" : q.Positive is not null).ToList();
        Assert.NotEmpty(deciding);
        Assert.Equal(deciding.Select(q => ($"Answers[{q.Code}]", $"Answer “{q.Text}”; Unclear is an answer too.")), none.Faults(scan));
        Assert.Throws<RuleBroken>(() => scan.Read(cast.Reader, none, Cast.Noon));
    }

    [Fact]
    public void After_a_corrected_application_its_questions_are_answered()
    {
        var scan = cast.Waiting();
        var corrected = cast.Agreeing(scan) with { Application = cast["dvt"] };
        Assert.Equal(["Answers[compresses]"], corrected.Faults(scan).Select(f => f.About));
        Assert.Empty((corrected with { Answers = new Dictionary<string, Answer> { ["compresses"] = Answer.Unclear } }).Faults(scan));
    }

    [Theory]
    [InlineData("msk", null, null)]
    [InlineData("msk", "knee", null)]
    [InlineData("msk", "radial", "Choose a part that belongs to Musculoskeletal, or none.")]
    [InlineData("dvt", "knee", "Choose a part that belongs to Leg veins, or none.")]
    public void The_part_belongs_to_the_application_that_the_reader_names(string code, string? part, string? why)
    {
        var scan = cast.Waiting(cast.Entry("msk") with { Subtype = "hip" });
        Says("Subtype", why, scan, cast.Agreeing(scan) with { Application = cast[code], Subtype = part, Answers = cast.Entry(code).Answers });
    }

    [Theory]
    [InlineData(Supervision.None, Supervision.None, false)]
    [InlineData(Supervision.None, Supervision.Later, true)]
    [InlineData(Supervision.None, Supervision.Direct, true)]
    [InlineData(Supervision.Later, Supervision.None, false)]
    [InlineData(Supervision.Later, Supervision.Later, false)]
    [InlineData(Supervision.Later, Supervision.Direct, true)]
    [InlineData(Supervision.Direct, Supervision.None, false)]
    [InlineData(Supervision.Direct, Supervision.Later, false)]
    [InlineData(Supervision.Direct, Supervision.Direct, false)]
    public void Supervision_is_lowered_never_raised(Supervision said, Supervision atMost, bool refused)
    {
        var scan = cast.Waiting(cast.Entry() with { Supervision = said, Supervisor = said == Supervision.Direct ? cast.Reader : null });
        Says("AtMost", refused ? "A reader may lower the supervision, not raise it." : null, scan, cast.Agreeing(scan) with { AtMost = atMost });
    }

    [Theory]
    [InlineData(1, null, "Score the image quality from 1 to 5.")]
    [InlineData(1, 0, "Score the image quality from 1 to 5.")]
    [InlineData(1, 1, null)]
    [InlineData(1, 5, null)]
    [InlineData(1, 6, "Score the image quality from 1 to 5.")]
    [InlineData(0, null, null)]
    [InlineData(0, 3, "Without pictures the image quality stays empty.")]
    public void Quality_is_from_1_to_5_where_there_are_pictures(int pictures, int? quality, string? why)
    {
        var scan = cast.Waiting(cast.Entry() with { Supervision = Supervision.Direct, Supervisor = cast.Reader }, pictures);
        Says("Quality", why, scan, cast.Agreeing(scan) with { Quality = quality });
    }

    [Theory]
    [InlineData(Judgement.LongestFeedback, null)]
    [InlineData(Judgement.LongestFeedback + 1, "Keep the feedback within 2000 characters.")]
    public void Feedback_has_its_length(int length, string? why)
    {
        var scan = cast.Waiting();
        Says("Feedback", why, scan, cast.Agreeing(scan) with { Feedback = new string('f', length) });
    }

    private void Says(string about, string? why, Scan scan, Judgement judgement)
    {
        Assert.Equal(why is null ? [] : [(about, why)], judgement.Faults(scan));
        if (why is not null) Refused.With(why, () => scan.Read(cast.Reader, judgement, Cast.Noon));
    }
}
