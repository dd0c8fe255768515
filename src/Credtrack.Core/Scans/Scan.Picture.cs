using Credtrack.Core.People;
using Credtrack.Core.Plumbing;

namespace Credtrack.Core.Scans;

public sealed partial class Scan
{
    public const int MostPictures = 12;

    public IReadOnlyList<Picture> Pictures => pictures;
    public IEnumerable<Picture> ShownPictures => pictures.Where(p => p.RemovedAt is null).OrderBy(p => p.Number);

    public string? WhyNotAttach(Person by) =>
        WhyNotChange(by) ?? (ShownPictures.Count() >= MostPictures ? $"A scan holds {MostPictures} pictures at most." : null);

    /// <summary>Whoever attaches has looked and confirms that no patient is named in the picture; the fact says so.</summary>
    public void Attach(Person by, StoredStill still, DateTime at)
    {
        RuleBroken.If(WhyNotAttach(by));
        var picture = new Picture(this, pictures.Count + 1, still, at);
        pictures.Add(picture);
        Record(new PictureAttached(by, at, picture.Number));
    }

    /// <summary>Those that others took out, each with the reason.</summary>
    public IEnumerable<Picture> TakenOutPictures => pictures.Where(p => p.RemovedBecause is not null).OrderBy(p => p.Number);

    public string? WhyNotTakeOut(Person by, Picture picture) =>
          by.Id == TraineeId               ? "Of a scan of your own, take pictures off by changing it."
        : !(by.Is(MembershipKind.Coordinator, ProgrammeId) || by.Is(MembershipKind.Reader, ProgrammeId)) ? "Only this programme's coordinators and readers take a picture out."
        : submissions.Count == 0           ? "This scan is a draft; nobody else sees it."
        : picture.RemovedAt is not null    ? "This picture is removed already."
        : null;

    /// <summary>A patient named in a picture must not stay there, whatever the state of the scan. Its bytes go once this is saved; the fact stays.</summary>
    public void TakeOut(Person by, Picture picture, string reason, DateTime at)
    {
        RuleBroken.If(WhyNotTakeOut(by, picture) ?? FreeText.WhyNotReason(reason));
        picture.Remove(by.Id, reason, at);
        Record(new PictureTakenOut(by, at, picture.Number));
    }

    private void Remove(Person by, Picture picture, DateTime at)
    {
        picture.Remove(by.Id, null, at);
        Record(new PictureRemoved(by, at, picture.Number));
    }
}
