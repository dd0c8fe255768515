using Credtrack.Core.Catalogue;

namespace Credtrack.Core.Readings;

/// <summary>One question, answered by both. Cell is its place in the 2x2 table, ID where the trainee found it unclear; null where the reader has not settled it, or where it is no diagnosis.</summary>
public sealed record Comparison(string Code, string Text, Answer? Trainee, Answer? Reader, Result? Cell)
{
    /// <summary>Question by question over those that both were asked; the positive answer is that of the reader's list.</summary>
    public static IReadOnlyList<Comparison> Of(IEnumerable<Answered> trainee, IEnumerable<Answered> reader) =>
        [.. from truth in reader
            join said in trainee on truth.Code equals said.Code
            select new Comparison(truth.Code, truth.Text, said.Given, truth.Given, Judged(said.Given, truth.Given, truth.Positive))];

    /// <summary>
    /// The result of the whole scan. A miss outweighs everything; of what is left a false alarm, then an unclear answer of the trainee, then a finding.
    /// A question that the reader finds unclear leaves the result. Of a procedure: reached is TP and not reached FN, as mere encoding.
    /// Source: a decision of ours; the four cells are those of any 2x2 table of a test against its reference.
    /// </summary>
    public static Result Together(ApplicationKind kind, IEnumerable<Answered> trainee, IEnumerable<Answered> reader)
    {
        if (kind == ApplicationKind.Procedure) return Reached(trainee, reader);
        var settled = Of(trainee, reader).Select(c => c.Cell).OfType<Result>().ToHashSet();
        Result[] strongestFirst = [Result.FN, Result.FP, Result.ID, Result.TP, Result.TN];
        return settled.Count == 0 ? Result.ID : strongestFirst.First(settled.Contains);
    }

    // Asked of both, although the reader's answer alone decides: a diagnostic scan that a reader corrects to a procedure was no try at a target.
    private static Result Reached(IEnumerable<Answered> trainee, IEnumerable<Answered> reader) => Of(trainee, reader).FirstOrDefault(c => c.Code == Question.TargetReached)?.Reader switch
    {
        Answer.Yes => Result.TP,
        Answer.No => Result.FN,
        _ => Result.ID,
    };

    private static Result? Judged(Answer? said, Answer? truth, Answer? positive) =>
          positive is null || truth is null or Answer.Unclear ? null
        : said is null or Answer.Unclear                      ? Result.ID
        : truth == positive ? (said == positive ? Result.TP : Result.FN)
        :                     (said == positive ? Result.FP : Result.TN);
}
