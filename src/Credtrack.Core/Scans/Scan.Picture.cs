using Credtrack.Core.People;

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

    private void Remove(Person by, Picture picture, DateTime at)
    {
        picture.Remove(by.Id, at);
        Record(new PictureRemoved(by, at, picture.Number));
    }
}
