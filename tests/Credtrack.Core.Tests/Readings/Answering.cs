using Credtrack.Core.Catalogue;
using Credtrack.Core.Readings;

namespace Credtrack.Core.Tests.Readings;

/// <summary>
/// Answers in a line: "yn -ny 0uu" are three questions a, b, c. The first letter is the trainee's answer, the second the reader's
/// (y, n, u for unclear, o for open, x for not asked); in front "-" where "no" is the positive answer, "0" where there is none.
/// </summary>
internal sealed record Answering(List<Answered> Trainee, List<Answered> Reader)
{
    public static Answering Of(string line)
    {
        var answering = new Answering([], []);
        foreach (var (number, text) in line.Split(' ', StringSplitOptions.RemoveEmptyEntries).Index())
        {
            var question = new Question($"{(char)('a' + number)}", "Seen?", text[0] switch { '-' => Answer.No, '0' => null, _ => Answer.Yes });
            if (text[^2] != 'x') answering.Trainee.Add(question.With(Letter(text[^2])));
            if (text[^1] != 'x') answering.Reader.Add(question.With(Letter(text[^1])));
        }
        return answering;
    }

    public Result Together(ApplicationKind kind = ApplicationKind.Diagnostic) => Comparison.Together(kind, Trainee, Reader);

    private static Answer? Letter(char letter) => letter switch { 'y' => Answer.Yes, 'n' => Answer.No, 'u' => Answer.Unclear, _ => null };
}
