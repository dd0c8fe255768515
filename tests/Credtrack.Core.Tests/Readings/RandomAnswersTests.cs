using Credtrack.Core.Catalogue;
using Credtrack.Core.Readings;

namespace Credtrack.Core.Tests.Readings;

public sealed class RandomAnswersTests
{
    private const string Answers = "ynu";

    private static readonly string[] Positives = ["", "", "-", "-", "0"];

    [Fact]
    public void The_result_is_that_of_a_second_formulation()
    {
        var chance = new Random(20260307);
        var met = new Dictionary<Result, int>();
        for (var n = 0; n < 5000; n++)
        {
            var line = Any(chance);
            var result = Answering.Of(line).Together();
            Assert.True(BySigns(line) == result, $"{line}: {result}");
            met[result] = met.GetValueOrDefault(result) + 1;
        }
        Assert.All(Enum.GetValues<Result>(), r => Assert.True(met.GetValueOrDefault(r) > 100, $"{r}: {met.GetValueOrDefault(r)}"));
    }

    [Fact]
    public void The_order_of_the_questions_never_matters()
    {
        var chance = new Random(20260308);
        for (var n = 0; n < 1000; n++)
        {
            var answers = Answering.Of(Any(chance));
            var result = answers.Together();
            var (trainee, reader) = (answers.Trainee.ToArray(), answers.Reader.ToArray());
            chance.Shuffle(trainee);
            chance.Shuffle(reader);
            Assert.Equal(result, Comparison.Together(ApplicationKind.Diagnostic, trainee, reader));
        }
    }

    [Fact]
    public void A_question_that_the_reader_leaves_unclear_changes_nothing()
    {
        var chance = new Random(20260309);
        for (var n = 0; n < 1000; n++)
        {
            var line = Any(chance);
            Assert.Equal(Answering.Of(line).Together(), Answering.Of($"{line} {Positives[chance.Next(5)]}{Answers[chance.Next(3)]}u").Together());
        }
    }

    private static string Any(Random chance) => string.Join(' ', Enumerable.Range(0, chance.Next(7)).Select(_ =>
    {
        var (trainee, reader) = (Answers[chance.Next(3)], Answers[chance.Next(3)]);
        if (chance.Next(2) == 0 && reader != 'u') trainee = reader;
        return Positives[chance.Next(5)] + chance.Next(12) switch { 0 => $"x{reader}", 1 => $"{trainee}x", _ => $"{trainee}{reader}" };
    }));

    /// <summary>Positive is 1, negative -1, unclear 0. A miss is a difference of -2 and a false alarm one of 2, between two signs.</summary>
    private static Result BySigns(string line)
    {
        var settled = from text in line.Split(' ', StringSplitOptions.RemoveEmptyEntries)
                      where text[0] != '0' && !text.Contains('x', StringComparison.Ordinal) && text[^1] != 'u'
                      let flip = text[0] == '-' ? -1 : 1
                      select (Trainee: flip * Sign(text[^2]), Truth: flip * Sign(text[^1]));
        var differences = settled.Select(s => s.Trainee == 0 ? 0.5 : s.Trainee - s.Truth).ToList();
        if (differences.Contains(-2)) return Result.FN;
        if (differences.Contains(2)) return Result.FP;
        if (differences.Count == 0 || differences.Contains(0.5)) return Result.ID;
        return settled.Max(s => s.Truth) == 1 ? Result.TP : Result.TN;
    }

    private static int Sign(char answer) => answer switch { 'y' => 1, 'n' => -1, _ => 0 };
}
