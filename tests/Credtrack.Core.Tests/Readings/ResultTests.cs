using Credtrack.Core.Catalogue;
using Credtrack.Core.Readings;

namespace Credtrack.Core.Tests.Readings;

// The cells and their order are the project's own definition of the result of a scan.
public sealed class ResultTests
{
    private static readonly Dictionary<string, string> Pairs = new() { ["FN"] = "ny", ["FP"] = "yn", ["ID"] = "uy", ["TP"] = "yy", ["TN"] = "nn", ["left"] = "yu" };

    [Theory] // trainee down: yes, no, unclear, open; reader across: yes, no, unclear
    [InlineData("", "TP FP left FN TN left ID ID left ID ID left")]
    [InlineData("-", "TN FN left FP TP left ID ID left ID ID left")]
    [InlineData("0", "left left left left left left left left left left left left")]
    public void Each_question_has_its_cell(string positive, string cells)
    {
        var found = from trainee in "ynuo" from reader in "ynu" select Answering.Of($"{positive}{trainee}{reader}");
        Assert.Equal(cells.Split(' '), found.Select(a => Assert.Single(Comparison.Of(a.Trainee, a.Reader)).Cell?.ToString() ?? "left"));
    }

    [Theory] // the other question in the order FN FP ID TP TN left
    [InlineData("FN", "FN FN FN FN FN FN")]
    [InlineData("FP", "FN FP FP FP FP FP")]
    [InlineData("ID", "FN FP ID ID ID ID")]
    [InlineData("TP", "FN FP ID TP TP TP")]
    [InlineData("TN", "FN FP ID TP TN TN")]
    [InlineData("left", "FN FP ID TP TN ID")]
    public void A_miss_outweighs_a_false_alarm_outweighs_unclear_outweighs_a_finding(string one, string together) =>
        Assert.Equal(together, string.Join(' ', Pairs.Values.Select(other => Answering.Of($"{Pairs[one]} {other}").Together())));

    [Theory]
    [InlineData("", Result.ID)] // nothing asked, nothing settled
    [InlineData("yu", Result.ID)] // the reader settles nothing
    [InlineData("uu nu -yu", Result.ID)]
    [InlineData("uy", Result.ID)] // the trainee finds it unclear
    [InlineData("un", Result.ID)]
    [InlineData("uu yy", Result.TP)] // what the reader finds unclear marks nobody wrong
    [InlineData("uu nn", Result.TN)]
    [InlineData("uy ny", Result.FN)] // unclear is no way out of a miss
    [InlineData("un yn", Result.FP)]
    [InlineData("uy yy nn", Result.ID)]
    [InlineData("nn nn yy nn", Result.TP)]
    [InlineData("yy yn ny uy", Result.FN)]
    [InlineData("-nn", Result.TP)] // lung sliding: "no" is the positive answer
    [InlineData("-yy", Result.TN)]
    [InlineData("-yn", Result.FN)]
    [InlineData("-ny", Result.FP)]
    [InlineData("nn 0yn 0un", Result.TN)] // no positive answer: it never matters
    [InlineData("0yy 0ny", Result.ID)]
    [InlineData("yy xy", Result.TP)] // only what both were asked enters
    [InlineData("nx xy yy", Result.TP)]
    [InlineData("yx xy", Result.ID)]
    public void A_scan_has_one_result(string answers, Result result) => Assert.Equal(result, Answering.Of(answers).Together());

    [Fact]
    public void Per_question_answers_are_kept_in_the_readers_order()
    {
        var answers = Answering.Of("yy nx xn nu");
        answers.Reader.Reverse();
        Assert.Equal([("d", Answer.No, Answer.Unclear, null), ("a", Answer.Yes, Answer.Yes, Result.TP)],
            Comparison.Of(answers.Trainee, answers.Reader).Select(c => (c.Code, c.Trainee!.Value, c.Reader!.Value, c.Cell)));
    }

    [Theory] // trainee's and reader's answer to whether the target was reached
    [InlineData("0yy", Result.TP)]
    [InlineData("0ny", Result.TP)]
    [InlineData("0uy", Result.TP)]
    [InlineData("0oy", Result.TP)]
    [InlineData("0yn", Result.FN)]
    [InlineData("0nn", Result.FN)]
    [InlineData("0on", Result.FN)]
    [InlineData("0yu", Result.ID)]
    public void Of_a_procedure_the_reader_says_whether_the_target_was_reached(string target, Result result)
    {
        var both = Answering.Of(target);
        List<Answered> As(List<Answered> answers, Answer note) => [new("arterial", "Artery?", null, note), .. answers.Select(a => a with { Code = "target-reached" })];
        Assert.All(Enum.GetValues<Answer>(), note =>
            Assert.Equal(result, Comparison.Together(ApplicationKind.Procedure, As(both.Trainee, Answer.Yes), As(both.Reader, note))));
    }
}
