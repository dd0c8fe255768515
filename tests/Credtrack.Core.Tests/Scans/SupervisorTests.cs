using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class SupervisorTests
{
    private const string NoReader = "Choose a reader of this programme.";

    private readonly Cast cast = new();

    [Fact]
    public void A_reader_of_the_programme_supervises() => Assert.Null(WhyNot(cast.Reader));

    [Fact]
    public void Direct_supervision_names_somebody() => Assert.Equal("Name the person who supervised at the bedside.", WhyNot(null));

    [Fact]
    public void Supervision_later_names_nobody() =>
        Assert.Null(Scan.WhyNotLog(cast.Trainee, cast.Programme, cast.Entry() with { Supervision = Supervision.Later }, Cast.Noon));

    [Fact]
    public void Nobody_supervises_themselves()
    {
        cast.Trainee.Join(cast.Director, cast.Programme, MembershipKind.Reader, Cast.Noon);
        Assert.Equal("Nobody supervises themselves.", WhyNot(cast.Trainee));
    }

    [Theory]
    [InlineData(MembershipKind.Trainee)]
    [InlineData(MembershipKind.Director)]
    [InlineData(MembershipKind.Coordinator)]
    [InlineData(MembershipKind.Chair)]
    public void Nobody_but_a_reader_supervises(MembershipKind kind) => Assert.Equal(NoReader, WhyNot(cast.Enrol("Olu", kind)));

    [Fact]
    public void A_reader_of_another_programme_does_not_supervise() => Assert.Equal(NoReader, WhyNot(cast.Enrol("Rhea", cast.Elsewhere, MembershipKind.Reader)));

    private string? WhyNot(Person? supervisor) =>
        Scan.WhyNotLog(cast.Trainee, cast.Programme, cast.Entry() with { Supervision = Supervision.Direct, Supervisor = supervisor }, Cast.Noon);
}
