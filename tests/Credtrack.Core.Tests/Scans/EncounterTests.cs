using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class EncounterTests
{
    private readonly Cast cast = new();

    [Fact]
    public void Each_scan_makes_an_encounter_of_its_own()
    {
        var encounters = Enumerable.Range(0, 200).Select(_ => cast.Draft().Encounter).ToList();
        Assert.Equal(200, encounters.Distinct().Count());
        Assert.All(encounters, e => Assert.Matches("^[0-9a-f]{12}$", e));
    }

    [Fact]
    public void Scans_of_one_patient_contact_share_it()
    {
        var first = cast.Draft();
        var second = Log(cast.Trainee, first);
        Assert.Equal((first.Encounter, first.Encounter), (second.Encounter, Log(cast.Trainee, second).Encounter));
    }

    [Fact]
    public void Nobody_shares_the_encounter_of_somebody_else() =>
        Refused.With("Only a scan of your own shares its patient contact.", () => Log(cast.Enrol("Tess", MembershipKind.Trainee), cast.Draft()));

    [Fact]
    public void A_change_leaves_the_encounter()
    {
        var scan = cast.Draft();
        var made = scan.Encounter;
        scan.Change(cast.Trainee, cast.Entry("lung"), [], [], Cast.Noon);
        Assert.Equal(made, scan.Encounter);
    }

    private Scan Log(Person by, Scan samePatient) => Scan.Log(by, cast.Programme, Guid.CreateVersion7(Cast.Noon), cast.Entry(), samePatient, Cast.Noon);
}
