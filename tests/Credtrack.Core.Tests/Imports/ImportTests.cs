using Credtrack.Core.Imports;
using Credtrack.Core.Measures.Standings;
using Credtrack.Core.People;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Imports;

public sealed class ImportTests
{
    private readonly Cast cast = new();
    private readonly Person coordinator;

    public ImportTests() => coordinator = cast.Enrol("Cora", MembershipKind.Coordinator);

    [Fact]
    public void Only_the_programmes_coordinators_upload_and_only_who_uploaded_confirms()
    {
        foreach (var person in new[] { cast.Trainee, cast.Reader, cast.Director, cast.Enrol("Cole", cast.Elsewhere, MembershipKind.Coordinator) })
            Refused.With("Only this programme's coordinators import scans.", () => Import.Upload(person, cast.Programme, "log.csv", [1], Cast.Noon));
        var (import, second) = (Mapped(), cast.Enrol("Cole", MembershipKind.Coordinator));
        Refused.With("Only the person who uploaded a file confirms it: its readings are attested by that person.", () => import.Confirm(second, 1, 0, Cast.Noon));
        Refused.With("Only the person who uploaded a file says what stands in it.", () => import.Map(second, "{}", Cast.Noon));
        import.ThrowAway(second, Cast.Noon);
        Assert.Equal(ImportState.ThrownAway, import.State);
    }

    [Fact]
    public void A_state_is_left_once_and_the_file_goes_with_it()
    {
        var import = Uploaded();
        Refused.With("Say first what the columns of the file mean.", () => import.Confirm(coordinator, 1, 0, Cast.Noon));
        import.Map(coordinator, "{}", Cast.Noon);
        Refused.With("Nothing of this file would be added.", () => import.Confirm(coordinator, 0, 0, Cast.Noon));
        Refused.With("Only an import that is confirmed is undone.", () => import.Undo(coordinator, [], Cast.Noon));
        import.Stage(coordinator, "{}", 0, Cast.Noon);
        Assert.Equal(ImportState.HalfStaged, import.State);
        Refused.With("Rows of this file are staged already; its mapping stays. Take it up again, or throw it away and upload it anew.", () => import.Map(coordinator, "{}", Cast.Noon));
        import.Confirm(coordinator, 1, 0, Cast.Noon);
        Assert.Null(import.File!.Content);
        Refused.With("This import is confirmed.", () => import.ThrowAway(coordinator, Cast.Noon));
        Refused.With("Scans of this import are in use since, so it is not undone as a whole.", () => import.Undo(coordinator, ["Cardiac: read here since"], Cast.Noon));
        import.Undo(coordinator, [], Cast.Noon);
        Refused.With("This import is undone.", () => import.Confirm(coordinator, 1, 0, Cast.Noon));
    }

    [Fact]
    public void Nobody_brings_in_scans_of_their_own()
    {
        var both = cast.Enrol("Twain", MembershipKind.Coordinator, MembershipKind.Trainee);
        var import = Import.Upload(both, cast.Programme, "log.csv", [1], Cast.Noon);
        import.Map(both, "{}", Cast.Noon);
        Refused.With("Nobody imports scans of their own.", () => Scan.Bring(both, both, import, Entry(), Cast.Noon));
    }

    [Fact]
    public void An_imported_scan_says_what_its_row_says_and_is_neither_corrected_nor_discarded()
    {
        var scan = Scan.Bring(coordinator, cast.Trainee, Mapped(), Entry(), Cast.Noon);
        Assert.Equal((ScanState.Read, Supervision.Direct), (scan.State, scan.CountingSupervision));
        Assert.Equal((Result.TN, 4, true), (scan.Readings[0].Result!.Value, scan.Readings[0].Quality!.Value, scan.Readings[0].IsElsewhere));
        Assert.Empty(scan.Answers);
        Assert.False(scan.IsClosedTo(cast.Reader));
        coordinator.Join(cast.Director, cast.Programme, MembershipKind.Reader, Cast.Noon);
        Assert.Equal("This reading was given elsewhere and attested with its import; it is not corrected here.", scan.WhyNotCorrect(coordinator, scan.Readings[0]));
        Assert.NotNull(scan.WhyNotDiscard(cast.Trainee));
        Assert.DoesNotContain("visit-7", scan.Encounter, StringComparison.Ordinal);
    }

    [Fact]
    public void An_unread_one_waits_for_pictures_and_answers_and_what_is_attested_is_only_lowered()
    {
        var scan = Scan.Bring(coordinator, cast.Trainee, Mapped(), Entry() with { Reading = null }, Cast.Noon);
        Assert.Equal((ScanState.Imported, Supervision.Direct), (scan.State, scan.CountingSupervision));
        Assert.Equal("This scan was imported unread; it can be read once its trainee has added pictures and answers.", scan.WhyNotRead(cast.Reader));
        Assert.NotNull(scan.WhyNotSubmit(cast.Trainee));
        scan.Attach(cast.Trainee, Cast.Still, Cast.Noon);
        scan.Change(cast.Trainee, cast.Entry() with { Supervision = Supervision.Direct, Supervisor = cast.Reader }, [], [], Cast.Noon);
        Assert.Equal(Supervision.Later, scan.CountingSupervision);
        scan.Submit(cast.Trainee, Cast.Noon);
        Assert.Null(scan.WhyNotRead(cast.Reader));
    }

    [Fact]
    public void Scans_of_one_contact_share_it_and_others_do_not()
    {
        var import = Mapped();
        var (one, same, other, none) = (Bring("visit-7"), Bring("visit-7"), Bring("visit-8"), Bring(null));
        Assert.Equal(one.Encounter, same.Encounter);
        Assert.Equal(3, new[] { one, other, none }.Select(s => s.Encounter).Distinct().Count());

        Scan Bring(string? encounter) => Scan.Bring(coordinator, cast.Trainee, import, Entry() with { Encounter = encounter }, Cast.Noon);
    }

    [Fact]
    public void Taken_back_it_is_withdrawn_and_its_key_is_free()
    {
        var scan = Scan.Bring(coordinator, cast.Trainee, Mapped(), Entry(), Cast.Noon);
        scan.TakeBack(coordinator, Cast.Noon);
        Assert.Equal(ScanState.Withdrawn, scan.State);
        Assert.Null(scan.Imported!.Key);
        Refused.With("Only an imported scan is taken back.", () => cast.Draft().TakeBack(coordinator, Cast.Noon));
    }

    private Import Uploaded() => Import.Upload(coordinator, cast.Programme, "log.csv", [1], Cast.Noon);

    private Import Mapped()
    {
        var import = Uploaded();
        import.Map(coordinator, "{}", Cast.Noon);
        return import;
    }

    private ImportEntry Entry() => new(2, "a-1", cast["cardiac"], null, Cast.Noon.AddDays(-1), "visit-7", Role.Performed, Setting.Clinical, true, Supervision.Direct, false,
        new ReadingEvidence(Cast.Noon.AddHours(-1), 4, true, Result.TN), null, null);
}
