using System.Text.Json;
using Credtrack.Core.Catalogue;
using Credtrack.Core.People;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Readings;

public sealed class CorrectionTests
{
    private static readonly string[] Codes = ["cardiac", "lung", "msk"];

    private readonly Cast cast = new();

    [Fact]
    public void What_is_corrected_governs_and_what_was_said_before_stays()
    {
        var scan = cast.Read();
        var reading = scan.Readings[0];
        Correct(scan, j => j with { Quality = 2, Answers = cast.Entry(all: Answer.Yes).Answers, Feedback = "Look again." });
        Assert.Equal((2, Result.FN, "Look again.", Cast.Noon), (reading.Quality, reading.Result, reading.Feedback, reading.At));
        var correction = Assert.Single(reading.Corrections);
        Assert.Equal((1, Cast.Noon.AddDays(1), "Seen again."), (correction.Number, correction.At, correction.Reason));
        Assert.Equal((4, Result.TN, null), (correction.Before.Quality, correction.Before.Result, correction.Before.Feedback));
        Assert.All(correction.Before.Answers, a => Assert.Equal(Answer.No, a.Given));
    }

    [Fact]
    public void The_ledger_names_each_value_that_became_another_and_quotes_no_text()
    {
        var scan = cast.Read(cast.Entry("msk") with { Subtype = "knee", Supervision = Supervision.Direct, Supervisor = cast.Reader });
        Correct(scan, j => j with { Quality = 2, Subtype = "hip", Indicated = false, Assisted = true, AtMost = Supervision.Later, Feedback = "Quillfeather", AdequateViews = [] });
        var fact = scan.NewFacts[^1];
        Assert.StartsWith("Ruth corrected reading 1 and said why: image quality from 4 of 5 to 2 of 5; part from knee to hip; clinically indicated from yes to no; "
            + "hands-on help from no to yes; supervision at most from Direct to Later; another feedback; view ", fact.Sentence, StringComparison.Ordinal);
        Assert.Contains("from adequate to not adequate", fact.Sentence, StringComparison.Ordinal);
        Assert.DoesNotContain("Quillfeather", fact.Sentence + JsonSerializer.Serialize(fact, fact.GetType()), StringComparison.Ordinal);
    }

    [Fact]
    public void Each_correction_says_what_it_changed()
    {
        var scan = cast.Read();
        Correct(scan, j => j with { Quality = 2 });
        Correct(scan, j => j with { Quality = 3 });
        Assert.Equal(["image quality from 4 of 5 to 2 of 5", "image quality from 2 of 5 to 3 of 5"], scan.Readings[0].Changes.Select(c => c.What));
    }

    [Fact]
    public void Another_application_brings_its_own_questions_and_keeps_them_whatever_the_catalogue_becomes()
    {
        var scan = cast.Read();
        Correct(scan, j => j with { Application = cast["lung"], Answers = cast.Entry("lung").Answers });
        var edited = cast.Edited(cast["lung"], entry => entry with { Questions = [entry.Questions[0]] });
        var (reading, asked) = (scan.Readings[0], cast["lung"].Questions.Select(q => q.Code).ToList());
        Assert.Equal(asked, scan.QuestionsUnder(edited, reading).Select(q => q.Code));
        Correct(scan, j => j with { Application = edited, Answers = cast.Entry("lung").Answers, Quality = 3 });
        Assert.Equal(asked, reading.Answers.Select(a => a.Code));
        Assert.Contains("another application", scan.NewFacts[^2].Sentence, StringComparison.Ordinal);
    }

    [Fact]
    public void The_quality_is_asked_for_as_it_was_whatever_became_of_the_pictures()
    {
        var scan = cast.Read();
        scan.TakeOut(cast.Reader, scan.Pictures[0], "A name can be read.", Cast.Noon);
        Correct(scan, j => j with { Quality = 3 });
        Refused.With("Score the image quality from 1 to 5.", () => Correct(scan, j => j with { Quality = null }));
        var unpictured = cast.Waiting(cast.Entry() with { Supervision = Supervision.Direct, Supervisor = cast.Reader }, pictures: 0);
        unpictured.Read(cast.Reader, cast.Agreeing(unpictured), Cast.Noon);
        Refused.With("Without pictures the image quality stays empty.", () => Correct(unpictured, j => j with { Quality = 3 }));
    }

    [Fact]
    public void Nobody_else_corrects_a_reading()
    {
        var scan = cast.Read();
        foreach (var person in new[] { cast.Trainee, cast.Director, cast.Enrol("Rhea", MembershipKind.Reader) })
            Refused.With("Only the reader who gave a reading corrects it.", scan.WhyNotCorrect(person, scan.Readings[0]), () => Correct(scan, j => j with { Quality = 2 }, person));
    }

    [Fact]
    public void It_takes_a_reason_and_a_change_and_a_whole_judgement()
    {
        var scan = cast.Read();
        Refused.With("Give the reason.", () => Correct(scan, j => j with { Quality = 2 }, reason: " "));
        Refused.With("Nothing is changed: this is the reading as it stands.", () => Correct(scan, j => j));
        Refused.With("Answer “Pericardial effusion?”; Unclear is an answer too.", () => Correct(scan, j => j with { Answers = new Dictionary<string, Answer>() }));
        Refused.With("A reader may lower the supervision, not raise it.", () => Correct(scan, j => j with { AtMost = Supervision.Direct }));
        Assert.Empty(scan.Readings[0].Corrections);
    }

    private void Correct(Scan scan, Func<Judgement, Judgement> change, Person? by = null, string reason = "Seen again.")
    {
        var reading = scan.Readings[0];
        var now = Cast.Agreeing(scan, cast[CodeOf(reading)]) with
        {
            Subtype = reading.Subtype, Indicated = reading.Indicated, Assisted = reading.Assisted, AtMost = reading.AtMost, Quality = reading.Quality, Feedback = reading.Feedback,
            Answers = reading.Answers.ToDictionary(a => a.Code, a => a.Given!.Value), AdequateViews = [.. reading.Views.Where(v => v.Marked).Select(v => v.Code)],
        };
        scan.Correct(by ?? cast.Reader, reading, change(now), reason, Cast.Noon.AddDays(1));
    }

    private string CodeOf(Reading reading) => Codes.Single(code => cast[code].Id == reading.ApplicationId);
}
