using Credtrack.Core.Catalogue;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class WaitingTests
{
    private readonly Cast cast = new();

    [Fact]
    public void A_waiting_scan_keeps_a_picture_or_its_supervisor()
    {
        var scan = cast.Waiting();
        Refused.With("Attach a picture, or name who supervised at the bedside: without pictures only that person can read the scan.",
            () => scan.Change(cast.Trainee, cast.Entry(), [scan.Pictures[0].Id], [], Cast.Noon));
    }

    [Fact]
    public void The_last_picture_is_exchanged_in_one_change()
    {
        var scan = cast.Waiting();
        scan.Change(cast.Trainee, cast.Entry(), [scan.Pictures[0].Id], [Cast.Still], Cast.Noon);
        Assert.Equal([2], scan.ShownPictures.Select(p => p.Number));
    }

    [Fact]
    public void Another_application_brings_its_answers_along() => Refused.With("Answer “Lung sliding seen on both sides?”; Unclear is an answer too.",
        () => cast.Waiting().Change(cast.Trainee, cast.Entry("lung") with { Answers = cast.Entry().Answers }, [], [], Cast.Noon));

    [Fact]
    public void No_change_makes_a_waiting_scan_incomplete()
    {
        var chance = new Random(20260306);
        var taken = 0;
        for (var n = 0; n < 1000; n++)
        {
            var scan = cast.Waiting(cast.Entry() with { Supervision = Supervision.Direct, Supervisor = cast.Reader }, pictures: chance.Next(3));
            var (entry, removed) = (Any(chance), scan.Pictures.Where(_ => chance.Next(3) > 0).Select(p => p.Id).ToList());
            var added = Enumerable.Repeat(Cast.Still, chance.Next(4) / 3).ToList();
            var answered = entry.Application.Questions.Where(q => q.Positive is not null).All(q => entry.Answers.ContainsKey(q.Code));
            var readable = scan.Pictures.Count - removed.Count + added.Count > 0 || entry.Supervisor is not null;
            void Change() => scan.Change(cast.Trainee, entry, removed, added, Cast.Noon);
            if (!answered || !readable)
            {
                Assert.Throws<RuleBroken>(Change);
                continue;
            }
            Change();
            taken++;
            Assert.Equal((ScanState.Waiting, null), (scan.State, scan.WhyIncomplete));
        }
        Assert.InRange(taken, 100, 900);
    }

    private ScanEntry Any(Random chance)
    {
        var entry = cast.Entry(chance.Next(3) switch { 0 => "cardiac", 1 => "gastric", _ => "cvc" });
        var answers = entry.Answers.Where(_ => chance.Next(8) > 0).ToDictionary(a => a.Key, _ => (Answer)chance.Next(3));
        return chance.Next(2) == 0
            ? entry with { Answers = answers }
            : entry with { Answers = answers, Supervision = Supervision.Direct, Supervisor = cast.Reader };
    }
}
