using Credtrack.Core.People;
using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

public sealed class PictureTests
{
    private const string TooMany = "A scan holds 12 pictures at most.";

    private readonly Cast cast = new();

    [Fact]
    public void Pictures_are_numbered_as_they_come()
    {
        var scan = cast.Draft(pictures: 2);
        Assert.Equal([1, 2], scan.ShownPictures.Select(p => p.Number));
        Assert.All(scan.Pictures, p => Assert.Equal((scan.Id, Cast.Still, Cast.Noon), (p.ScanId, new StoredStill(p.Sha256, p.Width, p.Height), p.At)));
    }

    [Fact]
    public void Twelve_pictures_are_the_most()
    {
        var scan = cast.Draft(pictures: 12);
        Refused.With(TooMany, scan.WhyNotAttach(cast.Trainee), () => scan.Attach(cast.Trainee, Cast.Still, Cast.Noon));
        Refused.With(TooMany, () => scan.Change(cast.Trainee, cast.Entry(), [], [Cast.Still], Cast.Noon));
    }

    [Fact]
    public void A_removed_picture_makes_room_for_another()
    {
        var scan = cast.Draft(pictures: 12);
        scan.Change(cast.Trainee, cast.Entry(), [scan.Pictures[4].Id], [Cast.Still], Cast.Noon);
        Assert.Equal([1, 2, 3, 4, 6, 7, 8, 9, 10, 11, 12, 13], scan.ShownPictures.Select(p => p.Number));
        Assert.Equal(TooMany, scan.WhyNotAttach(cast.Trainee));
    }

    [Fact]
    public void A_removed_picture_keeps_its_row_with_who_and_when()
    {
        var scan = cast.Draft(pictures: 2);
        scan.Change(cast.Trainee, cast.Entry(), [scan.Pictures[0].Id], [], Cast.Noon.AddMinutes(5));
        Assert.Equal([(cast.Trainee.Id, Cast.Noon.AddMinutes(5)), (null, null)], scan.Pictures.Select(p => (p.RemovedById, p.RemovedAt)));
        Assert.Equal([2], scan.ShownPictures.Select(p => p.Number));
    }

    [Fact]
    public void A_picture_is_removed_once_and_from_its_own_scan_alone()
    {
        var (scan, other) = (cast.Draft(pictures: 2), cast.Draft());
        scan.Change(cast.Trainee, cast.Entry(), [scan.Pictures[0].Id], [], Cast.Noon);
        scan.TakeFacts();
        scan.Change(cast.Trainee, cast.Entry(), [scan.Pictures[0].Id, other.Pictures[0].Id], [], Cast.Noon.AddMinutes(5));
        Assert.Empty(scan.NewFacts);
        Assert.Equal(Cast.Noon, scan.Pictures[0].RemovedAt);
        Assert.Single(other.ShownPictures);
    }

    [Fact]
    public void Only_the_trainee_attaches_and_nobody_after_the_reading()
    {
        foreach (var person in new[] { cast.Reader, cast.Director, cast.Enrol("Tess", MembershipKind.Trainee) })
            IsRefused("Only the person who logged a scan changes it.", cast.Draft(), person);
        IsRefused("This scan has been read; what was read stays as it is.", cast.Read(), cast.Trainee);
        IsRefused("This scan is withdrawn.", cast.Discarded(), cast.Trainee);
    }

    private static void IsRefused(string why, Scan scan, Person by) => Refused.With(why, scan.WhyNotAttach(by), () => scan.Attach(by, Cast.Still, Cast.Noon));
}
