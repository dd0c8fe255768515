using Credtrack.Core.Catalogue;
using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class SubmissionTests
{
    private const string NoPicture = "Attach a picture, or name who supervised at the bedside: without pictures only that person can read the scan.";

    private readonly Cast cast = new();

    public static TheoryData<string> Codes => [.. CatalogueEntry.Shipped.Select(e => e.Code)];

    [Fact]
    public void A_submitted_scan_waits_from_that_moment()
    {
        var scan = cast.Draft();
        scan.Submit(cast.Trainee, Cast.Noon.AddMinutes(3));
        Assert.Equal((ScanState.Waiting, Cast.Noon.AddMinutes(3)), (scan.State, scan.WaitsSince));
        Assert.Equal([1], scan.Submissions.Select(s => s.Number));
    }

    [Fact]
    public void Nobody_submits_for_somebody_else()
    {
        foreach (var person in new[] { cast.Reader, cast.Director, cast.Enrol("Tess", MembershipKind.Trainee) })
            IsRefused("Only the person who logged a scan submits it.", cast.Draft(), person);
    }

    [Fact]
    public void A_scan_is_not_submitted_while_it_waits_or_after_it_was_read_or_withdrawn()
    {
        IsRefused("This scan is already submitted.", cast.Waiting());
        IsRefused("This scan has been read; what was read stays as it is.", cast.Read());
        IsRefused("This scan is withdrawn.", cast.Discarded());
    }

    [Theory, MemberData(nameof(Codes))]
    public void Every_question_that_can_be_positive_needs_an_answer_and_no_other(string code)
    {
        foreach (var question in cast[code].Questions)
        {
            var open = cast.Draft(cast.Entry(code) with { Answers = cast.Entry(code).Answers.Where(a => a.Key != question.Code).ToDictionary() });
            if (question.Positive is null) Assert.Null(open.WhyNotSubmit(cast.Trainee));
            else IsRefused($"Answer “{question.Text}”; Unclear is an answer too.", open);
        }
    }

    [Fact]
    public void Unclear_is_an_answer() => Assert.Null(cast.Draft(cast.Entry(all: Answer.Unclear)).WhyNotSubmit(cast.Trainee));

    [Fact]
    public void A_scan_without_pictures_needs_a_named_direct_supervisor()
    {
        var direct = cast.Entry() with { Supervision = Supervision.Direct, Supervisor = cast.Reader };
        Assert.Null(cast.Draft(direct, pictures: 0).WhyNotSubmit(cast.Trainee));
        IsRefused(NoPicture, cast.Draft(pictures: 0));
        IsRefused(NoPicture, cast.Draft(direct with { Supervision = Supervision.Later }, pictures: 0));
    }

    [Fact]
    public void All_that_is_missing_is_told_at_once_with_the_value_it_is_about() => Assert.Equal(["Answers[collapsing]", "Answers[plethoric]", "Pictures"],
        Scan.Missing(cast["ivc"].Questions.Select(q => q.With(null)), pictures: 0, supervised: false).Select(m => m.About));

    [Fact]
    public void A_draft_may_be_as_incomplete_as_it_likes() =>
        Assert.Equal(ScanState.Draft, cast.Draft(cast.Entry() with { Answers = new Dictionary<string, Answer>(), ViewsShown = [] }, pictures: 0).State);

    private void IsRefused(string why, Scan scan, Person? by = null) => Refused.With(why, scan.WhyNotSubmit(by ?? cast.Trainee), () => scan.Submit(by ?? cast.Trainee, Cast.Noon));
}
