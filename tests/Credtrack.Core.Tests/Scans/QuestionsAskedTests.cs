using Credtrack.Core.Catalogue;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class QuestionsAskedTests
{
    private readonly Cast cast = new();
    private readonly Application edited;

    public QuestionsAskedTests() => edited = cast.Edited(cast["lung"], e => e with
    {
        Questions = [new("sliding", "Lung point?", Answer.Yes), new("thrombus", "Thrombus?", Answer.Yes)],
        Views = [new("left-base", "Left base, again", ViewNeed.Optional)],
    });

    [Fact]
    public void Another_application_asks_its_own_questions_and_views()
    {
        var scan = cast.Draft();
        scan.Change(cast.Trainee, cast.Entry("lung", Answer.Unclear) with { ViewsShown = ["left-base", "plax"] }, [], [], Cast.Noon);
        Assert.Equal(cast["lung"].Id, scan.ApplicationId);
        Assert.Equal(cast["lung"].Questions.Select(q => q.With(Answer.Unclear)), scan.Answers);
        Assert.Equal(cast["lung"].Views.Select(v => v.With(v.Code == "left-base")), scan.Views);
    }

    [Fact]
    public void The_same_application_keeps_what_it_asked_whatever_the_catalogue_has_become()
    {
        var scan = cast.Draft(cast.Entry("lung"));
        var entry = Cast.Entry(edited) with { ViewsShown = ["left-base", "right-base"], Answers = new Dictionary<string, Answer> { ["sliding"] = Answer.Yes, ["thrombus"] = Answer.Yes } };
        scan.Change(cast.Trainee, entry, [], [], Cast.Noon);
        Assert.Equal(cast["lung"].Questions.Select(q => q.With(q.Code == "sliding" ? Answer.Yes : null)), scan.Answers);
        Assert.Equal(cast["lung"].Views.Select(v => v.With(v.Code is "left-base" or "right-base")), scan.Views);
    }

    [Fact]
    public void Another_application_and_back_again_asks_what_the_catalogue_asks_now()
    {
        var scan = cast.Draft(cast.Entry("lung"));
        scan.Change(cast.Trainee, cast.Entry(), [], [], Cast.Noon);
        scan.Change(cast.Trainee, Cast.Entry(edited), [], [], Cast.Noon);
        Assert.Equal(["Lung point?", "Thrombus?"], scan.Answers.Select(a => a.Text));
    }

    [Fact]
    public void A_reader_who_confirms_the_application_is_asked_what_its_trainee_was()
    {
        var scan = cast.Waiting(cast.Entry("lung"));
        Assert.Equal(cast["lung"].Questions, scan.QuestionsUnder(edited));
        Assert.Equal(cast["lung"].Views, scan.ViewsUnder(edited));
        scan.Read(cast.Reader, Cast.Agreeing(scan, edited), Cast.Noon);
        Assert.Equal(scan.Answers, scan.Readings[0].Answers);
    }

    [Fact]
    public void A_reader_who_names_another_application_is_asked_what_the_catalogue_asks_now()
    {
        var scan = cast.Waiting();
        Assert.Equal(edited.Questions, scan.QuestionsUnder(edited));
        Assert.Equal(edited.Views, scan.ViewsUnder(edited));
    }
}
