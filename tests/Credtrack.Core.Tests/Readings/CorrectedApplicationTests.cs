using Credtrack.Core.Catalogue;
using Credtrack.Core.Readings;

namespace Credtrack.Core.Tests.Readings;

public sealed class CorrectedApplicationTests
{
    private readonly Cast cast = new();

    [Theory] // cardiac and lung share one question, whether there is an effusion
    [InlineData(Answer.Yes, Answer.Yes, Result.TP)]
    [InlineData(Answer.No, Answer.No, Result.TN)]
    [InlineData(Answer.Yes, Answer.No, Result.FP)]
    [InlineData(Answer.No, Answer.Yes, Result.FN)]
    [InlineData(Answer.Unclear, Answer.Yes, Result.ID)]
    [InlineData(Answer.Yes, Answer.Unclear, Result.ID)]
    public void Only_the_shared_questions_enter_the_result(Answer trainee, Answer reader, Result result)
    {
        Assert.Equal(["effusion"], cast["cardiac"].Questions.Select(q => q.Code).Intersect(cast["lung"].Questions.Select(q => q.Code)));
        foreach (var others in Enum.GetValues<Answer>())
            Assert.Equal(result, ResultOf("cardiac", But(cast["cardiac"], others, "effusion", trainee), cast["lung"], But(cast["lung"], others, "effusion", reader)));
    }

    [Fact]
    public void Without_a_shared_question_the_result_is_indeterminate()
    {
        Assert.Equal(Result.ID, ResultOf("cardiac", Alike("cardiac", Answer.Yes), cast["aorta"], Alike("aorta", Answer.Yes)));
        Assert.Equal(Result.ID, ResultOf("cardiac", Alike("cardiac", Answer.No), cast["aorta"], Alike("aorta", Answer.No)));
    }

    [Fact]
    public void The_positive_answer_is_that_of_the_readers_list()
    {
        var reversed = cast.Edited(cast["lung"], e => e with { Questions = [new("effusion", "Free of effusion?", Answer.No)] });
        Assert.Equal(Result.TN, ResultOf("cardiac", Alike("cardiac", Answer.Yes), reversed, Alike("lung", Answer.Yes)));
        Assert.Equal(Result.FP, ResultOf("cardiac", Alike("cardiac", Answer.No), reversed, Alike("lung", Answer.Yes)));
        var silent = cast.Edited(cast["lung"], e => e with { Questions = [new("effusion", "Effusion?", null)] });
        Assert.Equal(Result.ID, ResultOf("cardiac", Alike("cardiac", Answer.Yes), silent, Alike("lung", Answer.Yes)));
    }

    [Fact]
    public void A_shared_question_left_open_because_it_decided_nothing_is_unclear()
    {
        var open = new Dictionary<string, Answer> { ["solid"] = Answer.No, ["fluid"] = Answer.No };
        var deciding = cast.Edited(cast["bowel"], e => e with { Questions = [new("empty", "Empty?", Answer.No)] });
        Assert.Equal(Result.ID, ResultOf("gastric", open, deciding, new Dictionary<string, Answer> { ["empty"] = Answer.No }));
    }

    [Theory]
    [InlineData(Answer.Yes, Result.TP)]
    [InlineData(Answer.No, Result.FN)]
    [InlineData(Answer.Unclear, Result.ID)]
    public void Procedures_share_whether_the_target_was_reached(Answer reached, Result result) =>
        Assert.Equal(result, ResultOf("piv", Alike("piv", Answer.Yes), cast["cvc"], Alike("cvc", reached)));

    [Theory]
    [InlineData(Answer.Yes)]
    [InlineData(Answer.No)]
    public void A_diagnostic_scan_and_a_procedure_share_nothing(Answer answer)
    {
        Assert.Equal(Result.ID, ResultOf("soft-tissue", Alike("soft-tissue", answer), cast["joint-aspiration"], Alike("joint-aspiration", answer)));
        Assert.Equal(Result.ID, ResultOf("joint-aspiration", Alike("joint-aspiration", answer), cast["soft-tissue"], Alike("soft-tissue", answer)));
    }

    private IReadOnlyDictionary<string, Answer> Alike(string code, Answer all) => cast.Entry(code, all).Answers;

    private static Dictionary<string, Answer> But(Application application, Answer all, string code, Answer one) =>
        application.Questions.ToDictionary(q => q.Code, q => q.Code == code ? one : all);

    private Result? ResultOf(string logged, IReadOnlyDictionary<string, Answer> trainee, Application corrected, IReadOnlyDictionary<string, Answer> reader) =>
        cast.Read(cast.Entry(logged) with { Answers = trainee }, j => j with { Application = corrected, Answers = reader }).Readings[0].Result;
}
